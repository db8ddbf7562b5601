import { describe, expect, it } from 'vitest';
import { begin } from '../../shared/bench/begin.ts';
import { poweredRun, standing } from '../../shared/bench/powered-run/powered-run.ts';
import type { RunOutcome } from '../../shared/bench/record.ts';
import { checkFaults } from '../../shared/oven/check-faults.ts';
import { asFitted } from '../../shared/oven/initial-state.ts';
import { loadOven } from '../oven/oven-on-bench.ts';
import { jobs as allJobs, jobSetup } from '../support/jobs.ts';

const tk23 = loadOven('tarnwick-tk-23');
const jobs = allJobs.filter(({ content }) => content.oven === tk23.id);
const setupOf = (job: string, seed: number) => jobSetup(job, tk23, seed);

const healthy = {
  isTimerRunning: true,
  isLampLit: true,
  isFanTurning: true,
  isTurntableTurning: true,
};
const dead = { isTimerRunning: false, isLampLit: false, isFanTurning: false, hum: 'none' };

/** What the customer and the colleague at site say of a run, read from each ticket by hand. */
const claims: Record<string, { run: Partial<RunOutcome>; water: 'cold' | 'lukewarm' | 'hot' }> = {
  'timer-dead-after-popcorn': { run: dead as Partial<RunOutcome>, water: 'cold' },
  'timer-silent-no-heat': { run: { ...healthy, hum: 'none', opened: [] }, water: 'cold' },
  'timer-takes-for-ever': { run: { ...healthy, hum: 'normal', opened: [] }, water: 'hot' },
  'timer-second-high-voltage-fuse': {
    run: { ...healthy, hum: 'quiet', opened: [] },
    water: 'cold',
  },
  'timer-bang-at-the-door': { run: { ...healthy, hum: 'normal', opened: [] }, water: 'hot' },
  'timer-yearly-check': { run: { ...healthy, hum: 'normal', opened: [] }, water: 'hot' },
  'timer-fuse-after-neighbour': { run: dead as Partial<RunOutcome>, water: 'cold' },
  'timer-growls-and-smells': { run: { ...healthy, hum: 'loud', opened: [] }, water: 'lukewarm' },
  'timer-knob-stays': {
    run: { ...healthy, isTimerRunning: false, hum: 'normal', opened: [] },
    water: 'hot',
  },
};
/** K in a litre after one minute. 800 W give 11.5 K (FACTS 9). */
const warmth = { cold: [0, 0.1], lukewarm: [0.2, 3], hot: [9, 14] } as const;

describe('the jobs on the TK-23', () => {
  it('are at least eight, of levels 1 to 5, with one safety fault alone and one with no fault', () => {
    expect(jobs.map(({ job }) => job).sort()).toEqual(Object.keys(claims).sort());
    expect(jobs.length).toBeGreaterThanOrEqual(8);
    expect(new Set(jobs.map(({ content }) => content.level))).toEqual(new Set([1, 2, 3, 4, 5]));
    expect(jobs.filter(({ content }) => content.faults.length === 0)).toHaveLength(1);
    expect(jobs.filter(({ content }) => content.faults.length === 2)).toHaveLength(3);
    const safety = jobs.find(({ job }) => job === 'timer-yearly-check');
    expect(safety?.content.faults).toEqual([{ on: 'R1', fault: 'open' }]);
  });

  it.each(jobs)('$job names only faults that its oven can have', ({ content }) => {
    expect(checkFaults(tk23, content.faults)).toEqual([]);
  });

  it.each(jobs.map(({ job }) => job))(
    '%s runs as its ticket says, in three drawn ovens',
    (job) => {
      for (const seed of [11, 12, 13]) {
        const setup = setupOf(job, seed);
        const { state } = begin(setup);
        const outcome = poweredRun(setup.oven, state.oven, 60);
        const { run, water } = claims[job]!;
        expect(outcome).toMatchObject(run);
        const [low, high] = warmth[water];
        expect(outcome.waterRise).toBeGreaterThanOrEqual(low);
        expect(outcome.waterRise).toBeLessThanOrEqual(high);
      }
    },
    60_000,
  );

  it('bang at the door: a fuse goes when it opens, and none with a sound switch', () => {
    const { oven, faults } = setupOf('timer-bang-at-the-door', 11);
    const open = { ...asFitted(tk23, faults), isDoorClosed: false };
    expect(standing(oven, open).opened).toEqual(['F1']);
    expect(standing(oven, { ...open, faults: [] }).opened).toBeUndefined();
  });

  it('fuse after the neighbour: it goes as the door shuts with the plug in, and holds with it open', () => {
    const { oven, faults } = setupOf('timer-fuse-after-neighbour', 11);
    const shut = asFitted(tk23, faults);
    expect(standing(oven, shut).opened).toEqual(['F1']);
    expect(standing(oven, { ...shut, isDoorClosed: false }).opened).toBeUndefined();
  });

  it('second high-voltage fuse: a new fuse alone growls for a second or two and goes again', () => {
    const { oven, faults } = setupOf('timer-second-high-voltage-fuse', 11);
    const renewed = asFitted(
      tk23,
      faults.filter(({ on }) => on !== 'F4'),
    );
    const outcome = poweredRun(oven, renewed, 60);
    expect(outcome).toMatchObject({ hum: 'quiet', opened: ['F4'] });
    expect(outcome.atFirst?.hum).toBe('loud');
    expect(outcome.atFirst?.seconds).toBeLessThan(3);
  });
});
