import type { BenchState } from '../../../shared/bench/bench-state.ts';
import type { RecordedEvent } from '../../../shared/bench/event.ts';
import { untouched } from '../../../shared/bench/fold.ts';
import { apply } from '../../../shared/bench/run-command.ts';
import type { Setup } from '../../../shared/bench/setup.ts';

export interface Replay {
  /** sequence number of the last event */ last: number;
  /** The bench just after an event; before the first one: untouched. */ stateAt: (
    sequence: number,
  ) => BenchState;
  /** The last event that had happened by then; ms of bench time. */ sequenceAt: (
    benchMs: number,
  ) => number;
}

/** How many events lie between two kept states: a moment is at most this many steps away. */
export const checkpointEvery = 100;

/**
 * An attempt as it was recorded, any moment of it. The circuit is not run through time again: what was
 * read and what happened stands in the record, and the picture asks for nothing else. So the states
 * are right but for what is stored in capacitors. They are kept every 100 events as they are reached,
 * and never change what is on record: throw them away and the same ones come back.
 */
export function replay(setup: Setup, events: readonly RecordedEvent[]): Replay {
  const kept = new Map<number, BenchState>([[0, untouched(setup)]]);
  let near: { done: number; state: BenchState } = { done: 0, state: untouched(setup) };

  /** the bench after the first `done` events */
  const after = (done: number): BenchState => {
    const start = nearest(done);
    let { state } = start;
    for (let i = start.done; i < done; i += 1) {
      const event = events[i];
      if (event) state = apply(setup, { ...state, benchMs: event.benchMs }, event);
      if ((i + 1) % checkpointEvery === 0) kept.set(i + 1, state);
    }
    near = { done, state };
    return state;
  };
  const nearest = (done: number): { done: number; state: BenchState } => {
    let at = Math.floor(done / checkpointEvery) * checkpointEvery;
    while (at > 0 && !kept.has(at)) at -= checkpointEvery;
    const state = kept.get(at) ?? untouched(setup);
    return near.done <= done && near.done >= at ? near : { done: at, state };
  };
  const last = events.length - 1;
  return {
    last,
    stateAt: (sequence) => after(Math.max(0, Math.min(sequence, last) + 1)),
    sequenceAt: (benchMs) =>
      Math.max(
        0,
        events.findLastIndex((event) => event.benchMs <= benchMs),
      ),
  };
}
