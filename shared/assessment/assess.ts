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
  const found = isCauseFound(attempt) ? 'You found the cause' : 'The cause is not what you wrote';
  const hazards = attempt.end.hazards.length;
  if (hazards === 0) return `${found}, and nobody was put at risk.`;
  const times = hazards === 1 ? 'one hazard' : `${hazards} hazards`;
  return `${found}, but ${times} happened on the way.`;
}
