import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { experts } from '../../server/demo/experts/experts.ts';
import { recording } from '../../server/demo/recording.ts';
import { assess } from '../../shared/assessment/assess.ts';
import { begin } from '../../shared/bench/begin.ts';
import { verify } from '../../shared/bench/verify.ts';
import type { OvenDefinition } from '../../shared/oven/oven.ts';
import { recorded } from './bench.ts';
import { jobs, jobSetup } from './jobs.ts';

const eventsOf = (job: string) => {
  const file = readFileSync(`scenarios/expert-recordings/${job}.json`, 'utf8');
  return recording.parse(JSON.parse(file));
};

/** Holds the recorded experts on an oven against the rules, the circuit and the assessment. */
export function checkExperts(definition: OvenDefinition): void {
  const mine = jobs.filter(({ content }) => content.oven === definition.id);

  it('every job of the oven has its expert', () => {
    const known = experts.map(({ job }) => job);
    expect(mine.filter(({ job }) => !known.includes(job))).toEqual([]);
    expect(mine.length).toBeGreaterThan(0);
  });

  describe.each(mine)('the expert on $job', ({ job }) => {
    const { seed, events } = eventsOf(job);
    const setup = jobSetup(job, definition, seed);

    it('did what the rules and the circuit still give, and hurt nobody', () => {
      expect(verify(setup, begin(setup).state, events.slice(1))).toMatchObject({
        ok: true,
        state: { isHandedIn: true, isCoverOn: true, hazards: [] },
      });
    }, 60_000);

    it('found every cause, left nothing astray, and saw it run well at the end', () => {
      const debrief = assess(setup, recorded(events));
      expect(debrief).toMatchObject({ isCauseFound: true, isSafe: true });
      const repair = debrief.skills.find(({ skill }) => skill === 'repair and verify');
      expect(repair).toMatchObject({ score: 100 });
      if (setup.faults.length > 0) expect(debrief.score).toBeGreaterThanOrEqual(95);
      expect(events.findLast(({ type }) => type === 'OvenRun')?.data).toMatchObject({
        isLampLit: true,
        isFanTurning: true,
        isTurntableTurning: true,
        hum: 'normal',
        opened: [],
      });
    });
  });
}
