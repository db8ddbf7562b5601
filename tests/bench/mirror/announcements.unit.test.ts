import { describe, expect, it } from 'vitest';
import { announcementsFor } from '../../../src/bench/mirror/announcements.ts';
import type { BenchStore } from '../../../src/simulation/bench-store.ts';
import { benchOnPage, openBenchOnPage, type BenchOnPage } from '../../support/bench-on-page.ts';

const saidBy = ({ bench }: BenchOnPage, act: (store: BenchStore) => void): string[] => {
  const said: string[] = [];
  const stop = bench.subscribe((now, before) => said.push(...announcementsFor(before, now)));
  act(bench.getState());
  stop();
  return said;
};

describe('what the bench says aloud', () => {
  it('is what was done, and what is in the hand now', () => {
    const page = openBenchOnPage();
    expect(saidBy(page, ({ take }) => take({ kind: 'probe', probe: 'red' }))).toEqual([
      'red probe in hand',
    ]);
    expect(saidBy(page, ({ tap }) => tap('C1.1'))).toEqual([
      'red probe on C1.1',
      'black probe in hand',
    ]);
  });

  it('is why not, each time it is refused', () => {
    const page = benchOnPage();
    const why = 'The cord is in. Pull it before you take the cover off.';
    const remove = ({ run }: BenchStore) => run({ type: 'RemoveCover', data: {} });
    expect(saidBy(page, remove)).toEqual([why]);
    expect(saidBy(page, remove)).toEqual([why]);
  });

  it('is a hazard before anything else', () => {
    const said = saidBy(openBenchOnPage(), ({ run }) => run({ type: 'PlugCord', data: {} }));
    expect(said[0]).toMatch(/^Hazard\. Mains within reach\./);
    expect(said.slice(1)).toEqual([expect.stringMatching(/cord/)]);
  });

  it('is a reading in words', () => {
    const page = openBenchOnPage();
    const { run } = page.bench.getState();
    run({ type: 'SetMeter', data: { setting: 'ohms-20M' } });
    run({ type: 'PlaceProbe', data: { probe: 'red', target: 'BAT.neg' } });
    run({ type: 'PlaceProbe', data: { probe: 'black', target: 'CH.1' } });
    page.pass(3000);
    expect(saidBy(page, () => run({ type: 'TakeReading', data: {} }))).toEqual(['over range']);
    run({ type: 'SetMeter', data: { setting: 'dc-20' } });
    run({ type: 'PlaceProbe', data: { probe: 'black', target: 'BAT.pos' } });
    page.pass(500);
    expect(saidBy(page, () => run({ type: 'CaptureReading', data: {} }))).toEqual([
      expect.stringMatching(/^-12\.\d+ volts, written on the job sheet$/),
    ]);
  });

  it('is when steps are not saved, and when they are again', () => {
    const page = benchOnPage();
    const why = 'The server cannot be reached.';
    expect(
      saidBy(page, ({ setSave }) => setSave({ kind: 'waiting', steps: 2, why, isKept: true })),
    ).toEqual([`Not saved: kept on this device. ${why}`]);
    expect(
      saidBy(page, ({ setSave }) => setSave({ kind: 'waiting', steps: 3, why, isKept: true })),
    ).toEqual([]);
    expect(saidBy(page, ({ setSave }) => setSave({ kind: 'saved', at: 0 }))).toEqual([
      'Saved again',
    ]);
  });
});
