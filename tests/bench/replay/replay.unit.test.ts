import { describe, expect, it } from 'vitest';
import type { RecordedEvent } from '../../../shared/bench/event.ts';
import { fold } from '../../../shared/bench/fold.ts';
import { longestPause, pauseBefore } from '../../../src/bench/replay/playing.ts';
import { replay } from '../../../src/bench/replay/replay.ts';
import { shownThen } from '../../../src/bench/replay/shown-then.ts';
import { handsOn, opened, reads, recorded, setupWith } from '../../support/bench.ts';

const setup = setupWith();

/** `n` steps, a second apart: door open, door closed, and every third one a verdict. */
const steps = (n: number): RecordedEvent[] =>
  recorded(
    Array.from({ length: n }, (_, i) => ({
      type: i % 3 === 2 ? 'VerdictGiven' : i % 2 === 0 ? 'DoorOpened' : 'DoorClosed',
      version: 1 as const,
      data: i % 3 === 2 ? { part: 'F1', verdict: i % 2 === 0 ? 'good' : 'faulty' } : {},
      benchMs: i * 1000,
    })),
  );

describe('seeking', () => {
  const events = steps(437);
  const { stateAt, last, sequenceAt } = replay(setup, events);

  it.each([436, 0, 99, 100, 101, 250, 249, 436, 3, 300])(
    'gives at %i what folding from the beginning gives',
    (at) => {
      expect(stateAt(at)).toEqual(fold(setup, events.slice(0, at + 1)));
    },
  );

  it('gives the whole picture of a bench on which charge flowed, without running its circuit', () => {
    const hands = opened(handsOn(setupWith()));
    hands.does('FitDischargeClip', { target: 'CH.2' });
    hands.does('TouchDischargeTip', { target: 'C1.1' });
    reads(hands, 'ohms-20k', 'C1.1', 'C1.2');
    hands.does('LiftLead', { end: 'W24/a' });
    const events = recorded(hands.events());
    const { storage: _stored, meter, ...picture } = hands.state();
    const {
      storage: _replayed,
      meter: replayedMeter,
      ...replayed
    } = replay(hands.setup, events).stateAt(events.length - 1);
    expect(replayed).toEqual(picture);
    expect(replayedMeter).toEqual({ ...meter, lag: null });
  });

  it('seeks anywhere in 10,000 events within 100 ms (PRODUCT section 10)', () => {
    const long = replay(setup, steps(10_000));
    long.stateAt(9999);
    const moments = [5, 9999, 4321, 150, 7777, 7700, 99, 9001, 2500, 6049];
    const took = moments.map((at) => {
      const began = process.cpuUsage();
      long.stateAt(at);
      const { user, system } = process.cpuUsage(began);
      return (user + system) / 1000;
    });
    expect(Math.max(...took)).toBeLessThan(100);
  });

  it('stays within the record', () => {
    expect(last).toBe(436);
    expect(stateAt(9999)).toEqual(stateAt(436));
    expect(stateAt(-1).benchMs).toBe(0);
  });

  it('finds the last event that had happened by a moment', () => {
    expect(sequenceAt(0)).toBe(0);
    expect(sequenceAt(10_999)).toBe(10);
    expect(sequenceAt(1e9)).toBe(436);
  });
});

describe('the display of the replay', () => {
  const shown = (display: string, black = 'T1.2') => ({
    red: 'T1.1',
    black,
    setting: 'ohms-200',
    display,
    unit: 'Ω',
    value: 0.7,
    isSettled: true,
    isBeeping: false,
    isRelative: false,
  });
  const events = recorded(
    [
      ['MeterSet', { setting: 'ohms-200' }],
      ['ProbePlaced', { probe: 'red', target: 'T1.1' }],
      ['ProbePlaced', { probe: 'black', target: 'T1.2' }],
      ['ReadingTaken', shown('0.7')],
      ['VerdictGiven', { part: 'T1', verdict: 'good' }],
      ['LeadLabelled', { end: 'W1/a', text: 'x' }],
      ['ReadingCaptured', shown('0.8')],
      ['ProbeRemoved', { probe: 'red' }],
    ].map(([type, data], i) => ({
      type: type as string,
      version: 1 as const,
      data: data as Record<string, unknown>,
      benchMs: i * 100,
    })),
  );
  const state = (at: number) => ({
    ...replay(setup, []).stateAt(0),
    probes: { red: at < 7 ? 'T1.1' : null, black: 'T1.2' },
    meter: { setting: 'ohms-200', relative: null, isDestroyed: false, lag: null },
  });
  const displayAt = (at: number) => shownThen(events, at, state(at))?.display ?? null;

  it('is what was recorded, and stands until something changes', () => {
    expect([3, 4, 5, 6].map(displayAt)).toEqual(['0.7', '0.7', '0.7', '0.8']);
  });

  it('is empty where nothing was recorded: none is made up', () => {
    expect([0, 1, 2, 7].map(displayAt)).toEqual([null, null, null, null]);
  });
});

describe('playing', () => {
  it('keeps the pace of bench time, faster when asked, and shortens long pauses', () => {
    expect(pauseBefore({ benchMs: 1000 }, { benchMs: 2500 }, 1)).toBe(1500);
    expect(pauseBefore({ benchMs: 1000 }, { benchMs: 2500 }, 4)).toBe(375);
    expect(pauseBefore({ benchMs: 0 }, { benchMs: 300_000 }, 1)).toBe(longestPause);
    expect(pauseBefore({ benchMs: 0 }, { benchMs: 300_000 }, 16)).toBe(longestPause / 16);
    expect(pauseBefore({ benchMs: 0 }, undefined, 1)).toBe(0);
  });
});
