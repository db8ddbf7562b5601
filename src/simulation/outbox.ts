import type { WireEvent } from '../../shared/bench/event.ts';
import type { OutboxStore } from './outbox-store.ts';

/** What the trainee is told about their record. */
export type SaveState =
  | { kind: 'saved' }
  | { kind: 'saving' }
  /** kept on this device, tried again */ | { kind: 'waiting'; steps: number; why: string }
  /** another tab writes now */ | { kind: 'read-only'; why: string }
  /** the server refuses a step; nothing is thrown away */
  | { kind: 'refused'; steps: number; why: string };

/** How one batch fared at the server. */
export type Sent =
  | { kind: 'stored'; next: number }
  | { kind: 'gap'; expected: number }
  | { kind: 'another-writer'; why: string }
  | { kind: 'refused'; why: string }
  | { kind: 'away'; why: string };

export interface Outbox {
  /** events of whole decisions, in order */ add: (events: readonly WireEvent[]) => void;
  /** resolves when nothing waits, or when it cannot go on */ flush: () => Promise<SaveState>;
  stop: () => void;
}

export interface OutboxOptions {
  attempt: string;
  /** sequence number the server expects next */ next: number;
  waiting: readonly (readonly WireEvent[])[];
  store: OutboxStore;
  send: (from: number, events: readonly WireEvent[]) => Promise<Sent>;
  onState: (state: SaveState) => void;
  /** ms before trying again; grows to ten times */ retryMs?: number;
}

/**
 * Sends steps in order, one batch at a time. A batch is frozen when first sent, so that a repeat can
 * be recognised, and a step is forgotten only when the server says that it is stored.
 */
export function outbox(options: OutboxOptions): Outbox {
  const retry = options.retryMs ?? 1500;
  let queue: (readonly WireEvent[])[] = [...options.waiting];
  let next = options.next;
  let frozen: readonly WireEvent[] | null = null;
  let working: Promise<SaveState> | null = null;
  let wait = retry;
  let isStopped = false;
  let timer: ReturnType<typeof setTimeout> | undefined;

  const steps = (): number =>
    (frozen?.length ?? 0) + queue.reduce((sum, decision) => sum + decision.length, 0);
  const tell = (state: SaveState): SaveState => {
    options.onState(state);
    return state;
  };

  const freeze = (): readonly WireEvent[] => {
    const batch: WireEvent[] = [];
    while (queue[0] && batch.length + queue[0].length <= 200) batch.push(...(queue.shift() ?? []));
    return batch;
  };

  const sendAll = async (): Promise<SaveState> => {
    while (!isStopped && (frozen || queue.length > 0)) {
      frozen ??= freeze();
      tell({ kind: 'saving' });
      const sent = await options.send(next, frozen);
      switch (sent.kind) {
        case 'stored':
          next = sent.next;
          frozen = null;
          wait = retry;
          await options.store.acknowledge(options.attempt, next);
          break;
        case 'gap': {
          const missing = next - sent.expected;
          // The server has all or part of the frozen batch already: only the rest is still to go.
          if (missing > 0 || sent.expected > next + frozen.length) {
            return tell({
              kind: 'refused',
              steps: steps(),
              why: `The record expects step ${sent.expected}, this device is at ${next}.`,
            });
          }
          frozen = frozen.slice(-missing);
          next = sent.expected;
          if (frozen.length === 0) frozen = null;
          break;
        }
        case 'another-writer':
          isStopped = true;
          return tell({ kind: 'read-only', why: sent.why });
        case 'refused':
          isStopped = true;
          return tell({ kind: 'refused', steps: steps(), why: sent.why });
        case 'away':
          timer = setTimeout(() => void flush(), wait);
          wait = Math.min(wait * 2, 10 * retry);
          return tell({ kind: 'waiting', steps: steps(), why: sent.why });
      }
    }
    return tell({ kind: 'saved' });
  };

  const flush = (): Promise<SaveState> => {
    clearTimeout(timer);
    working ??= sendAll().finally(() => {
      working = null;
    });
    return working;
  };

  return {
    add: (events) => {
      const from = next + steps();
      queue = [...queue, events];
      void options.store.add(options.attempt, from, events).then(flush, flush);
    },
    flush,
    stop: () => {
      isStopped = true;
      clearTimeout(timer);
    },
  };
}
