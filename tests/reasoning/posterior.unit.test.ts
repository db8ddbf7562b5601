import { describe, expect, it } from 'vitest';
import { atTheStart, isSafe, secondsTo } from '../../shared/reasoning/bench-work.ts';
import { exactCost, greedyCost } from '../../shared/reasoning/exact-route.ts';
import { OVER_RANGE } from '../../shared/reasoning/fault-table.ts';
import { nextMeasurement } from '../../shared/reasoning/next-measurement.ts';
import { classesOf } from '../../shared/reasoning/outcomes.ts';
import { partition } from '../../shared/reasoning/partition.ts';
import { entropy, expectedFall, FLOOR, posterior } from '../../shared/reasoning/posterior.ts';
import { seededUniform } from '../../shared/engine/quantities/seeded-uniform.ts';
import { lc28 } from '../support/bench.ts';

/** Shares by candidate, each a row over the classes. */
const told = (...rows: number[][]) => ({
  classes: rows[0]!.length,
  shares: Float64Array.from(rows.flat()),
  classOf: () => 0,
});

describe('classes of readings', () => {
  it('cut where neighbours lie further apart than both errors, OL by itself', () => {
    // error 1 each: 10, 11, 12 hang together, 20 stands apart
    const classes = classesOf([10, 11, 12, 20, OVER_RANGE], () => 1);
    expect(classes.count).toBe(3);
    expect([10, 12, 15, 17, 20].map(classes.of)).toEqual([0, 0, 0, 1, 1]);
    expect(classes.of(OVER_RANGE)).toBe(2);
  });
});

describe('probabilities after a reading', () => {
  it('by hand: 0.5, 0.3 and 0.2, seen what the first two give in 1 and 1/2 of the draws', () => {
    const outcomes = told([1, 0], [0.5, 0.5], [0, 1]);
    const after = posterior([0.5, 0.3, 0.2], outcomes, 0);
    // with the floor f: 0.5, 0.3 (f + (1 - f) / 2), 0.2 f, over their sum
    const raw = [0.5, 0.3 * (FLOOR + (1 - FLOOR) / 2), 0.2 * FLOOR];
    const sum = raw[0]! + raw[1]! + raw[2]!;
    after.forEach((p, c) => expect(p).toBeCloseTo(raw[c]! / sum, 12));
    expect(after[2]).toBeGreaterThan(0);
  });

  it('four alike are 2 bits, and halving them tells 1 bit', () => {
    const even = [0.25, 0.25, 0.25, 0.25];
    expect(entropy(even)).toBeCloseTo(2, 12);
    expect(expectedFall(even, told([1, 0], [1, 0], [0, 1], [0, 1]))).toBeCloseTo(1, 9);
    expect(expectedFall(even, told([1, 0], [1, 0], [1, 0], [1, 0]))).toBeCloseTo(0, 9);
    expect(expectedFall(even, told([0.5, 0.5], [0.5, 0.5], [0.5, 0.5], [0.5, 0.5]))).toBeCloseTo(
      0,
      9,
    );
  });
});

describe('what can be told apart', () => {
  it('groups candidates that no measurement separates', () => {
    const first = told([1, 0], [1, 0], [0, 1], [0, 1]);
    const second = told([1, 0], [1, 0], [1, 0], [0, 1]);
    expect(partition([first, second], 4)).toEqual([0, 0, 1, 2]);
    // half and half overlaps both sides and holds them together
    expect(partition([told([1, 0], [0.5, 0.5], [0, 1])], 3)).toEqual([0, 0, 0]);
  });
});

describe('bench work', () => {
  const fuse = lc28.serviceData.find(({ id }) => id === 'fuse')!;
  const earth = lc28.serviceData.find(({ id }) => id === 'earth')!;

  it('a lead 15 s, a tip 4 s each: the fuse from nothing 23 s, again 4 s', () => {
    expect(secondsTo(atTheStart, fuse)).toBe(15 + 2 * 4);
    const there = { ...atTheStart, position: { lifted: fuse.lift, cleaned: [], pressed: [] } };
    expect(secondsTo({ ...there, tips: fuse.between }, fuse)).toBe(4);
  });

  it('offers nothing under the cover before the oven is made safe', () => {
    expect(isSafe(lc28, atTheStart, fuse)).toBe(false);
    expect(isSafe(lc28, atTheStart, earth)).toBe(false);
    expect(isSafe(lc28, { ...atTheStart, isMadeSafe: true }, fuse)).toBe(true);
    const knowledge = { definition: lc28, lines: [fuse], outcomes: [told([1, 0], [0, 1])] };
    expect(nextMeasurement(knowledge, [0.5, 0.5], atTheStart)).toBeNull();
    const safe = { ...atTheStart, isMadeSafe: true };
    expect(nextMeasurement(knowledge, [0.5, 0.5], safe)).toMatchObject({ line: 0, seconds: 23 });
  });

  it('takes what tells most per second, not what tells most', () => {
    // lines of the same work: 1 bit beats 0.81 bit; with three leads more to lift it does not
    const long = { ...fuse, lift: ['W4/a', 'W5/a', 'W6/a', 'W7/a'] };
    const outcomes = [told([1, 0], [1, 0], [0, 1], [0, 1]), told([1, 0], [0, 1], [0, 1], [0, 1])];
    const even = [0.25, 0.25, 0.25, 0.25];
    const safe = { ...atTheStart, isMadeSafe: true };
    const pick = (lines: (typeof fuse)[]) =>
      nextMeasurement({ definition: lc28, lines, outcomes }, even, safe)?.line;
    expect(pick([fuse, fuse])).toBe(0);
    expect(pick([long, fuse])).toBe(1);
  });
});

describe('the shortest route', () => {
  // three candidates 1/2, 1/4, 1/4; A tells the first from the others, B the second from the third
  const problem = {
    weights: [0.5, 0.25, 0.25],
    tests: [
      { seconds: 10, outcomes: [0, 1, 1] },
      { seconds: 10, outcomes: [0, 0, 1] },
    ],
  };

  it('by hand: A first and B half of the time, 15 s', () => {
    expect(exactCost(problem)).toBeCloseTo(15, 12);
    expect(greedyCost(problem)).toBeCloseTo(15, 12);
  });

  it('is never beaten by greedy with one look ahead, which stays within a fifth on average', () => {
    let exact = 0;
    let greedy = 0;
    for (let seed = 0; seed < 60; seed += 1) {
      const draw = (key: string) => seededUniform(seed, key);
      const count = 6;
      const made = {
        weights: Array.from({ length: count }, (_, c) => 0.05 + draw(`w${c}`)),
        tests: Array.from({ length: 7 }, (_, t) => ({
          seconds: 4 + Math.floor(40 * draw(`s${t}`)),
          outcomes: Array.from({ length: count }, (_, c) => Math.floor(3 * draw(`o${t} ${c}`))),
        })),
      };
      const least = exactCost(made);
      const found = greedyCost(made);
      expect(found).toBeGreaterThanOrEqual(least - 1e-9);
      exact += least;
      greedy += found;
    }
    expect(greedy / exact).toBeLessThan(1.2);
  });
});
