import type { RecordedEvent } from '../bench/event.ts';
import type { Setup } from '../bench/setup.ts';
import type { Debrief } from './debrief.ts';
import type { Attempt } from './moments.ts';
import { toMoments } from './moments.ts';
import { isolate } from './skills/isolate.ts';
import { makeSafe } from './skills/make-safe.ts';
import { measure } from './skills/measure.ts';
import { isCauseFound, reason } from './skills/reason.ts';
import { record } from './skills/record.ts';
import { repairAndVerify } from './skills/repair-and-verify.ts';

const skills = [makeSafe, isolate, measure, reason, repairAndVerify, record];

/** Judges a whole attempt. Pure: the same record gets the same debrief. */
export function assess(setup: Setup, events: readonly RecordedEvent[]): Debrief {
  const attempt = toMoments(setup, events);
  const results = skills.map((skill) => skill.judge(attempt));
  const scores = results.flatMap(({ score }) => (score === null ? [] : [score]));
  return {
    outcome: outcome(attempt),
    isCauseFound: isCauseFound(attempt),
    isSafe: attempt.end.hazards.length === 0,
    score: Math.round(scores.reduce((sum, one) => sum + one, 0) / Math.max(scores.length, 1)),
    skills: results,
    faults: [...setup.faults],
  };
}

/** One sentence, the first thing a trainee reads. */
function outcome(attempt: Attempt): string {
  const { faults } = attempt.setup;
  const named = faults.filter((fault) =>
    attempt.end.sheet.causes.some((one) => one.on === fault.on && one.fault === fault.fault),
  ).length;
  const isFound = isCauseFound(attempt);
  const partly =
    named > 0 ? `You named ${named} of ${faults.length} causes` : 'The cause is not on your sheet';
  const hazards = attempt.end.hazards.length;
  if (hazards === 0)
    return `${isFound ? 'You found the cause' : partly}, and nobody was put at risk.`;
  const times = hazards === 1 ? 'one hazard' : `${hazards} hazards`;
  return `${isFound ? 'You found the cause, but' : `${partly}, and`} ${times} happened on the way.`;
}
