import { actionByEvent } from '../../shared/bench/catalogue.ts';
import type { WireEvent } from '../../shared/bench/event.ts';
import { pinnedOf } from './judge-task.ts';
import type { Judge } from './judge.ts';
import type { JudgingThread } from './judging-thread.ts';

/** Some of them make the circuit run on mains. */
const isLong = (events: readonly WireEvent[]): boolean =>
  events.some(({ type }) => actionByEvent.get(type)?.runsMains === true);

/**
 * Judges what is quick here and what is long in other threads, so that nobody's next step waits
 * for somebody else's oven.
 */
export function threadedJudge(here: Judge, threads: readonly JudgingThread[]): Judge {
  const idlest = (): JudgingThread => {
    const [first, ...others] = threads;
    if (!first) throw new Error('a threaded judge needs a thread');
    return others.reduce((best, one) => (one.load < best.load ? one : best), first);
  };
  return {
    begin: (bench) => idlest().ask<'begin'>({ kind: 'begin', pinned: pinnedOf(bench) }),
    verify: (bench, state, events) =>
      isLong(events)
        ? idlest().ask<'verify'>({ kind: 'verify', pinned: pinnedOf(bench), state, events })
        : here.verify(bench, state, events),
    assess: (bench, events) =>
      idlest().ask<'assess'>({ kind: 'assess', pinned: pinnedOf(bench), events }),
  };
}
