import { describe, expect, it } from 'vitest';
import { benchOnPage, openBenchOnPage } from '../../support/bench-on-page.ts';

const typesOf = (events: readonly { type: string }[]) => events.map(({ type }) => type);

describe('what is done on the bench', () => {
  it('goes on record with its bench time, as one decision', () => {
    const { bench, added, pass } = benchOnPage();
    pass(1500);
    expect(bench.getState().run({ type: 'OpenDoor', data: {} })).toBe(true);
    expect(added).toEqual([[{ type: 'DoorOpened', version: 1, data: {}, benchMs: 1500 }]]);
    expect(bench.getState().events.at(-1)?.type).toBe('DoorOpened');
  });

  it('is refused in one sentence, changes nothing and records nothing', () => {
    const { bench, added } = benchOnPage();
    const before = bench.getState().state;
    expect(bench.getState().run({ type: 'RemoveCover', data: {} })).toBe(false);
    expect(bench.getState().notice).toMatchObject({
      kind: 'refusal',
      text: 'The cord is in. Pull it before you take the cover off.',
    });
    expect(bench.getState().state).toBe(before);
    expect(added).toEqual([]);
  });

  it('clears the refusal when the next thing goes well', () => {
    const { bench } = benchOnPage();
    bench.getState().run({ type: 'RemoveCover', data: {} });
    bench.getState().run({ type: 'OpenDoor', data: {} });
    expect(bench.getState().notice).toBeNull();
  });

  it('brings a hazard before the trainee and keeps it there while readings go on', () => {
    const { bench, added } = openBenchOnPage();
    bench.getState().run({ type: 'PlugCord', data: {} });
    expect(typesOf(added[0] ?? [])).toEqual(['CordPlugged', 'HazardHappened']);
    expect(bench.getState().notice).toMatchObject({
      kind: 'hazard',
      event: { type: 'HazardHappened' },
    });
    bench.getState().dismiss();
    expect(bench.getState().notice).toBeNull();
  });

  it('passes bench time by waiting, and not when waiting is refused', () => {
    const { bench, clock, added } = benchOnPage();
    bench.getState().wait(60_000);
    expect(clock.now()).toBe(60_000);
    expect(added[0]?.[0]).toMatchObject({ type: 'TimePassed', benchMs: 60_000 });
    bench.getState().setSave({ kind: 'read-only', why: 'elsewhere' });
    bench.getState().wait(60_000);
    expect(clock.now()).toBe(60_000);
  });

  it('runs the oven aside: meanwhile nothing else is done, and then it is one step at the end of the run', async () => {
    const { bench, clock, added } = benchOnPage();
    const running = bench.getState().operate({ type: 'RunOven', data: { ordered: 10 } });
    expect(bench.getState().running).toBe(10);
    expect(bench.getState().run({ type: 'OpenDoor', data: {} })).toBe(false);
    await running;
    expect(bench.getState().running).toBeNull();
    expect(clock.now()).toBe(10_000);
    expect(added).toEqual([[expect.objectContaining({ type: 'OvenRun', benchMs: 10_000 })]]);
    expect(bench.getState().state.runs).toHaveLength(1);
  });

  it('says so when a run could not be worked out, and lets no time pass', async () => {
    const { bench, clock, added } = benchOnPage(undefined, undefined, {
      thread: { run: () => Promise.reject(new Error('out of memory')) },
    });
    await bench.getState().operate({ type: 'RunOven', data: { ordered: 10 } });
    expect(bench.getState()).toMatchObject({ running: null, notice: { kind: 'refusal' } });
    expect(clock.now()).toBe(0);
    expect(added).toEqual([]);
  });

  it.each(['read-only', 'refused'] as const)('does nothing while the record is %s', (kind) => {
    const { bench, added } = benchOnPage();
    bench
      .getState()
      .setSave(
        kind === 'refused' ? { kind, steps: 1, why: 'not taken' } : { kind, why: 'elsewhere' },
      );
    expect(bench.getState().run({ type: 'OpenDoor', data: {} })).toBe(false);
    expect(added).toEqual([]);
  });
});

describe('the hand', () => {
  it('places one probe after the other by tapping', () => {
    const { bench } = openBenchOnPage();
    bench.getState().take({ kind: 'probe', probe: 'red' });
    bench.getState().tap('T1.1');
    expect(bench.getState().hand).toEqual({ kind: 'probe', probe: 'black' });
    bench.getState().tap('T1.2');
    expect(bench.getState().state.probes).toEqual({ red: 'T1.1', black: 'T1.2' });
    expect(bench.getState().hand).toEqual({ kind: 'empty' });
  });

  it('picks out what it taps while it is empty', () => {
    const { bench, added } = openBenchOnPage();
    bench.getState().tap('C1.1');
    expect(bench.getState().selection).toEqual({ kind: 'target', ref: 'C1.1' });
    expect(added).toEqual([]);
  });

  it('takes a placed probe off before it carries it', () => {
    const { bench, added } = openBenchOnPage();
    bench.getState().run({ type: 'PlaceProbe', data: { probe: 'red', target: 'T1.1' } });
    bench.getState().take({ kind: 'probe', probe: 'red' });
    expect(bench.getState().state.probes.red).toBeNull();
    expect(typesOf(added.flat())).toEqual(['ProbePlaced', 'ProbeRemoved']);
  });

  it('keeps what it holds when the place is refused', () => {
    const { bench } = benchOnPage();
    bench.getState().take({ kind: 'probe', probe: 'red' });
    bench.getState().tap('T1.1');
    expect(bench.getState().hand).toEqual({ kind: 'probe', probe: 'red' });
    expect(bench.getState().notice).toMatchObject({ text: 'The cover is on. Take it off first.' });
  });

  it('holds the discharge tip on a terminal until it is put down', () => {
    const { bench, added } = openBenchOnPage();
    bench.getState().take({ kind: 'discharge-clip' });
    bench.getState().tap('CH.2');
    bench.getState().tap('C1.1');
    bench.getState().tap('C1.2');
    expect(bench.getState().state.discharge).toEqual({ clip: 'CH.2', tip: 'C1.2' });
    expect(bench.getState().hand).toEqual({ kind: 'discharge-tip' });
    bench.getState().putDown();
    expect(bench.getState().state.discharge).toEqual({ clip: 'CH.2', tip: null });
    expect(typesOf(added.flat()).at(-1)).toBe('DischargeTipLifted');
  });

  it('fits a lifted end where it is tapped, also on a wrong terminal', () => {
    const { bench } = openBenchOnPage();
    bench.getState().run({ type: 'LiftLead', data: { end: 'W23/a' } });
    bench.getState().take({ kind: 'lead', end: 'W23/a' });
    bench.getState().tap('T1.H1');
    expect(bench.getState().state.oven.leadEnds['W23/a']).toBe('T1.H1');
    expect(bench.getState().hand).toEqual({ kind: 'empty' });
  });

  it('bridges two places with the screwdriver, cleans a spot with the pad', () => {
    const { bench, added } = openBenchOnPage();
    bench.getState().take({ kind: 'screwdriver', from: null });
    bench.getState().tap('C1.1');
    bench.getState().tap('C1.2');
    bench.getState().take({ kind: 'pad' });
    bench.getState().tap('T1.core');
    expect(typesOf(added.flat())).toEqual(['ScrewdriverShorted', 'SpotCleaned']);
  });

  it('labels the leads of a terminal one after the other with its name', () => {
    const { bench } = openBenchOnPage();
    bench.getState().take({ kind: 'label' });
    bench.getState().tap('C1.2');
    bench.getState().tap('C1.2');
    bench.getState().tap('C1.2');
    expect(bench.getState().state.labels).toEqual({ 'W24/a': 'C1.2', 'W27/a': 'C1.2' });
  });

  it('clips both leads of the battery', () => {
    const { bench } = openBenchOnPage();
    bench.getState().take({ kind: 'battery-clip', clip: 'neg' });
    bench.getState().tap('D1.k');
    bench.getState().tap('D1.a');
    expect(bench.getState().state.battery).toEqual({ neg: 'D1.k', oneK: 'D1.a' });
  });

  it('lets a dragged probe go: over a terminal it stays there, over nothing it is put down', () => {
    const { bench } = openBenchOnPage();
    bench.getState().take({ kind: 'probe', probe: 'red' });
    bench.getState().drop('T1.1');
    expect(bench.getState().state.probes.red).toBe('T1.1');
    expect(bench.getState().hand).toEqual({ kind: 'empty' });
    bench.getState().take({ kind: 'probe', probe: 'red' });
    bench.getState().drop(null);
    expect(bench.getState().state.probes.red).toBeNull();
    expect(bench.getState().hand).toEqual({ kind: 'empty' });
  });
});
