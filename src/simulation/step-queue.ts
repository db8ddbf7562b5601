import type { WireEvent } from '../../shared/bench/event.ts';

/** How one batch fared at the server. */
export type Sent =
  | { kind: 'stored'; next: number }
  | { kind: 'gap'; expected: number }
  | { kind: 'another-writer'; why: string }
  | { kind: 'refused'; why: string }
  | { kind: 'away'; why: string };

/** Why sending cannot go on: for now (away), or for good. */
export interface Stop {
  kind: 'waiting' | 'read-only' | 'refused';
  why: string;
}

/** The server takes at most this many events at once. */
const mostAtOnce = 200;

/** Steps in order, not yet acknowledged. */
export interface StepQueue {
  /** sequence number of the first step that the server does not have */ next: () => number;
  /** how many wait */ steps: () => number;
  add: (decision: readonly WireEvent[]) => void;
  /** What is to be sent now. The same batch again and again until it is settled, so that a repeat can be recognised. */
  batch: () => readonly WireEvent[];
  /** Takes the server's answer to the batch; a step leaves only when the server has it. */
  settle: (sent: Sent) => Stop | null;
}

/** `waiting`: whole decisions; they are never split between batches. */
export function stepQueue(from: number, waiting: readonly (readonly WireEvent[])[]): StepQueue {
  let queue = [...waiting];
  let next = from;
  let frozen: readonly WireEvent[] = [];
  const drop = (upTo: number): null => {
    frozen = frozen.slice(upTo - next);
    next = upTo;
    return null;
  };
  return {
    next: () => next,
    steps: () => frozen.length + queue.reduce((sum, decision) => sum + decision.length, 0),
    add: (decision) => {
      queue = [...queue, decision];
    },
    batch: () => {
      if (frozen.length > 0) return frozen;
      const taken = decisionsIn(queue);
      frozen = queue.slice(0, taken).flat();
      queue = queue.slice(taken);
      return frozen;
    },
    settle: (sent) => {
      switch (sent.kind) {
        case 'stored':
          return drop(sent.next);
        case 'gap':
          // The server may have the beginning of the batch already: then only the rest is still to go.
          if (sent.expected > next && sent.expected <= next + frozen.length)
            return drop(sent.expected);
          return {
            kind: 'refused',
            why: `The record goes on at step ${sent.expected}, this device at step ${next}.`,
          };
        case 'another-writer':
          return { kind: 'read-only', why: sent.why };
        case 'refused':
          return { kind: 'refused', why: sent.why };
        case 'away':
          return { kind: 'waiting', why: sent.why };
      }
    },
  };
}

/** How many of the first decisions go in one batch: as many as fit whole, at least one. */
function decisionsIn(queue: readonly (readonly WireEvent[])[]): number {
  let events = 0;
  const tooMany = queue.findIndex((decision) => (events += decision.length) > mostAtOnce);
  return tooMany < 0 ? queue.length : Math.max(1, tooMany);
}
