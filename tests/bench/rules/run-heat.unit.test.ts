import { beforeAll, describe, expect, it } from 'vitest';
import type { RunOutcome } from '../../../shared/bench/record.ts';
import { fold } from '../../../shared/bench/fold.ts';
import { handsOn, reads, setupWith, type Hands } from '../../support/bench.ts';

// ENGINE 4.3: slow states in seconds. FACTS 8: the magnetron cut-out opens at 138 °C, closes at 82 °C.
describe('a run with the fan seized', () => {
  let hands: Hands;
  let outcome: RunOutcome;
  beforeAll(() => {
    hands = handsOn(setupWith([{ on: 'M1', fault: 'seized' }]));
    const [ran] = hands.does('RunOven', { ordered: 300 }, 300);
    outcome = ran?.data as RunOutcome;
  }, 60_000);

  it('heats until the cut-out opens after some minutes, and goes dark', () => {
    expect(outcome.seconds).toBeGreaterThan(120);
    expect(outcome.seconds).toBeLessThan(240);
    expect(outcome).toMatchObject({
      hum: 'normal',
      opened: ['F2'],
      isDisplayLit: true,
      heat: { open: ['F2'], moves: [{ part: 'F2', isOpen: true }] },
    });
    expect(hands.state().isDisplayLit).toBe(false);
  });

  it('gives back the display when it has cooled, after minutes and not before', () => {
    const [closing] = hands.state().warmth?.closings ?? [];
    expect(closing?.part).toBe('F2');
    const wait = ((closing?.atMs ?? 0) - hands.state().benchMs) / 1000;
    expect(wait).toBeGreaterThan(60);
    hands.does('PullCord', {}, 3);
    hands.does('RemoveCover', {}, 10);
    expect(reads(hands, 'ohms-200', 'F2.1', 'F2.2').display).toBe('OL');
    hands.does('Wait', { ms: 300_000 }, 300);
    expect(hands.state().oven.opened).toEqual([]);
    hands.does('TakeReading', {}, 2);
    expect(reads(hands, 'beep', 'F2.1', 'F2.2').isBeeping).toBe(true);
  }, 60_000);
});

describe('a second run', () => {
  it('trips sooner, because the magnetron is still warm', () => {
    const hands = handsOn(setupWith([{ on: 'M1', fault: 'seized' }]));
    const run = () => hands.does('RunOven', { ordered: 120 }, 120)[0]?.data as RunOutcome;
    expect(run().heat?.moves).toEqual([]);
    expect(run().seconds).toBeLessThan(90);
  }, 60_000);
});

describe('a run of before heat was reckoned', () => {
  it('is still understood: what it opened stays open, and the display is dark', () => {
    const hands = handsOn(setupWith([{ on: 'C1', fault: 'shorted' }]));
    const [ran] = hands.does('RunOven', { ordered: 30 }, 30);
    const { heat, ...old } = ran?.data as RunOutcome;
    expect(heat).toBeDefined();
    const state = fold(hands.setup, [hands.events()[0]!, { ...ran!, data: old }]);
    expect(state).toMatchObject({ isDisplayLit: false, oven: { opened: ['F1'] } });
    expect(state.warmth).toBeUndefined();
  }, 60_000);
});
