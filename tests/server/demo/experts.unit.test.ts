import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { experts } from '../../../server/demo/experts/experts.ts';
import { recording } from '../../../server/demo/recording.ts';
import { assess } from '../../../shared/assessment/assess.ts';
import { begin } from '../../../shared/bench/begin.ts';
import { makeSetup, type Setup } from '../../../shared/bench/setup.ts';
import type { WireEvent } from '../../../shared/bench/event.ts';
import { verify } from '../../../shared/bench/verify.ts';
import { ovenDefinition } from '../../../shared/oven/oven.ts';
import { scenarioContent } from '../../../shared/scenario/scenario.ts';
import { recorded } from '../../support/bench.ts';

const read = (path: string): unknown => JSON.parse(readFileSync(`scenarios/${path}`, 'utf8'));

function played(job: string): { setup: Setup; events: readonly WireEvent[] } {
  const content = scenarioContent.parse(read(`jobs/${job}.json`));
  const definition = ovenDefinition.parse(read(`ovens/${content.oven}.json`));
  const { seed, events } = recording.parse(read(`expert-recordings/${job}.json`));
  return { setup: makeSetup({ ...content, definition, seed }), events };
}

describe.each(experts.map(({ job }) => job))('the expert on %s', (job) => {
  const { setup, events } = played(job);

  it('did what the rules and the circuit still give', () => {
    expect(verify(setup, begin(setup).state, events.slice(1))).toMatchObject({
      ok: true,
      state: { isHandedIn: true, isCoverOn: true, hazards: [] },
    });
  }, 60_000);

  it('found every cause, safely, and left nothing astray', () => {
    const debrief = assess(setup, recorded(events));
    expect(debrief).toMatchObject({ isCauseFound: true, isSafe: true });
    const repair = debrief.skills.find(({ skill }) => skill === 'repair and verify');
    expect(repair?.marks.filter(({ points }) => points < 0)).toEqual([]);
    if (setup.faults.length > 0) expect(repair?.score).toBe(100);
  }, 60_000);
});
