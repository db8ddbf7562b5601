import type { RecordedEvent } from '../bench/event.ts';
import { evolve, untouched } from '../bench/fold.ts';
import type { BenchState } from '../bench/bench-state.ts';
import type { Setup } from '../bench/setup.ts';
import { undonePlaces } from '../bench/undone.ts';
import type { SkillResult, Mark, SkillName } from './debrief.ts';

/** An event with the bench just before and just after it: what the rules of assessment read. */
export interface Moment {
  event: RecordedEvent;
  before: BenchState;
  after: BenchState;
  /** taken back by a step back */ isUndone: boolean;
}

export interface Attempt {
  setup: Setup;
  moments: readonly Moment[];
  /** the bench at the end */ end: BenchState;
}

/** A skill is judged by reading the moments of an attempt; every mark points at one. */
export interface Skill {
  name: SkillName;
  judge: (attempt: Attempt) => SkillResult;
}

export function toMoments(setup: Setup, events: readonly RecordedEvent[]): Attempt {
  const undone = undonePlaces(events);
  let before = untouched(setup);
  const moments = events.map((event, place) => {
    const after = evolve(setup, before, event);
    const moment = { event, before, after, isUndone: undone.has(place) };
    before = after;
    return moment;
  });
  return { setup, moments, end: before };
}

/** What was done and stands; a hazard is never taken back. */
export const ofType = (attempt: Attempt, ...types: string[]): Moment[] =>
  attempt.moments.filter(({ event, isUndone }) => !isUndone && types.includes(event.type));

/** A mark for a moment; without one, for something never done. */
export const mark = (points: number, why: string, moment?: Moment): Mark => ({
  points,
  why,
  sequence: moment?.event.sequence ?? null,
});

/** Gained over gainable, less what was lost; 0 to 100. Null when nothing was judged. */
export function result(skill: SkillName, marks: readonly Mark[], gainable: number): SkillResult {
  if (gainable === 0) return { skill, score: null, marks: [...marks] };
  const sum = marks.reduce((total, one) => total + one.points, 0);
  const score = Math.round((100 * Math.max(0, Math.min(gainable, sum))) / gainable);
  return { skill, score, marks: [...marks] };
}
