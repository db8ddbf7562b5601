import type { WireEvent } from '../../shared/bench/event.ts';
import type { OutboxStore } from './outbox-store.ts';
import type { SaveState } from './save-state.ts';
import { stepQueue, type Sent, type Stop } from './step-queue.ts';

export interface Outbox {
  /** events of whole decisions, in order */ add: (events: readonly WireEvent[]) => void;
  /** resolves when nothing waits, or when it cannot go on now */ flush: () => Promise<SaveState>;
  stop: () => void;
}

export interface OutboxOptions {
  attempt: string;
  /** sequence number the server expects next */ next: number;
  /** whole decisions kept on this device, first `next` */ waiting: readonly (readonly WireEvent[])[];
  store: OutboxStore;
  send: (from: number, events: readonly WireEvent[]) => Promise<Sent>;
  onState: (state: SaveState) => void;
  /** ms since 1970 */ now: () => number;
  /** ms before trying again; doubles up to ten times this */ retryMs?: number;
}

/** Sends steps in order, one batch at a time, and keeps on this device what the server has not confirmed. */
export function outbox(options: OutboxOptions): Outbox {
  const { attempt, store, retryMs: retry = 1500 } = options;
  const queue = stepQueue(options.next, options.waiting);
  let working: Promise<SaveState> | null = null;
  let wait = retry;
  let last: SaveState = { kind: 'saved', at: null };
  let isStopped = false;
  let timer: ReturnType<typeof setTimeout> | undefined;

  const tell = (state: SaveState): SaveState => {
    last = state;
    options.onState(state);
    return state;
  };
  const halt = ({ kind, why }: Stop): SaveState => {
    const steps = queue.steps();
    if (kind === 'waiting') {
      timer = setTimeout(() => void flush(), wait);
      wait = Math.min(wait * 2, 10 * retry);
      return tell({ kind, why, steps, isKept: store.isKept });
    }
    isStopped = true;
    return tell(kind === 'refused' ? { kind, why, steps } : { kind, why });
  };
  const sendAll = async (): Promise<SaveState> => {
    const isAny = queue.steps() > 0;
    try {
      while (!isStopped && queue.steps() > 0) {
        tell({ kind: 'saving', steps: queue.steps() });
        const stop = queue.settle(await options.send(queue.next(), queue.batch()));
        if (stop) return isStopped ? last : halt(stop);
        wait = retry;
        // Steps that stay kept although the server has them are compared and dropped at the next opening.
        await store.acknowledge(attempt, queue.next()).catch(() => undefined);
      }
      return isStopped || !isAny ? last : tell({ kind: 'saved', at: options.now() });
    } finally {
      // No await after the last look at the queue: a step added from now on starts a new round.
      working = null;
    }
  };
  const flush = (): Promise<SaveState> => {
    clearTimeout(timer);
    if (working) return working;
    const round = sendAll();
    // A round that had nothing to wait for is over already.
    if (queue.steps() > 0 && !isStopped) working = round;
    return round;
  };
  return {
    add: (events) => {
      const kept = store.add(attempt, queue.next() + queue.steps(), events);
      queue.add(events);
      if (last.kind !== 'waiting') void kept.then(flush, flush);
      else tell({ ...last, steps: queue.steps() });
    },
    flush,
    stop: () => {
      isStopped = true;
      clearTimeout(timer);
    },
  };
}
