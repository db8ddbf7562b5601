import { describe, expect, it } from 'vitest';
import { experts } from '../../server/demo/experts/experts.ts';
import { poweredRun } from '../../shared/bench/powered-run/powered-run.ts';
import { symptom } from '../../shared/scenario/scenario.ts';
import { asFitted } from '../../shared/oven/initial-state.ts';
import { loadOven } from '../oven/oven-on-bench.ts';
import { jobs, jobSetup } from '../support/jobs.ts';

const sound = jobs.filter(({ content }) => content.faults.length === 0);
const safetyOnly = jobs.filter(({ content }) => content.symptom === 'no complaint, safety check');

// What the library has to offer: PRODUCT 6 and 8, FACTS 9.
describe('the library of jobs', () => {
  it('has at least 24, on three ovens, of five levels, over every row of symptoms', () => {
    expect(jobs.length).toBeGreaterThanOrEqual(24);
    const ovens = new Set(jobs.map(({ content }) => content.oven));
    expect(ovens).toEqual(new Set(['larkfield-lc-28', 'tarnwick-tk-23', 'brackwell-or-16']));
    const levels = new Set(jobs.map(({ content }) => content.level));
    expect(levels).toEqual(new Set([1, 2, 3, 4, 5]));
    const rows = new Set(jobs.map(({ content }) => content.symptom));
    expect([...rows].sort()).toEqual([...symptom.options].sort());
  });

  it('has single and double faults, and ovens with none', () => {
    expect(new Set(jobs.map(({ content }) => content.faults.length))).toEqual(new Set([0, 1, 2]));
    expect(sound.length).toBeGreaterThanOrEqual(2);
    expect(safetyOnly.length).toBeGreaterThanOrEqual(3);
  });

  it('has titles and complaints of its own', () => {
    expect(new Set(jobs.map(({ content }) => content.title)).size).toBe(jobs.length);
    expect(new Set(jobs.map(({ content }) => content.ticket.complaint)).size).toBe(jobs.length);
  });

  it.each([...sound, ...safetyOnly])(
    '$job has nothing that a run would show',
    ({ job, content }) => {
      const definition = loadOven(content.oven);
      const { oven, faults } = jobSetup(job, definition, 77);
      const outcome = poweredRun(oven, asFitted(definition, faults), 60);
      expect(outcome).toMatchObject({ hum: 'normal', isLampLit: true, opened: [] });
      expect(outcome.waterRise).toBeGreaterThan(9);
    },
    30_000,
  );

  it('has an expert for each', () => {
    expect(experts.map(({ job }) => job).sort()).toEqual(jobs.map(({ job }) => job).sort());
  });
});
