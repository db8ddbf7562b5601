import type { StoreApi } from 'zustand/vanilla';
import type { BenchState } from '../../shared/bench/bench-state.ts';
import type { WireEvent } from '../../shared/bench/event.ts';
import { fold } from '../../shared/bench/fold.ts';
import { engineVersion, type Setup } from '../../shared/bench/setup.ts';
import type { BenchStore } from './bench-store.ts';
import { isSameStep } from './is-same-step.ts';
import type { OutboxStore } from './outbox-store.ts';

/** Running the circuit from step to step takes milliseconds each: a long attempt is not folded from its beginning at every opening. */
const every = 25;

/** The bench after a record, from the checkpoint kept on this device if it belongs to this record. */
export async function foldFromCheckpoint(
  setup: Setup,
  record: readonly WireEvent[],
  { attempt, store }: { attempt: string; store: OutboxStore },
): Promise<BenchState> {
  const kept = await store.checkpoint(attempt).catch(() => null);
  const isGood =
    kept !== null &&
    kept.engine === engineVersion &&
    kept.sequence <= record.length &&
    isSameStep(record[kept.sequence - 1], kept.last);
  return isGood ? fold(setup, record.slice(kept.sequence), kept.state) : fold(setup, record);
}

/** Keeps the bench on this device from time to time, when the server has all of its steps. */
export function keepCheckpoints(
  bench: StoreApi<BenchStore>,
  { attempt, store }: { attempt: string; store: OutboxStore },
): () => void {
  let last = bench.getState().events.length;
  return bench.subscribe(({ save, events, state }, before) => {
    const event = events.at(-1);
    if (save === before.save || save.kind !== 'saved' || !event) return;
    if (events.length - last < every) return;
    last = events.length;
    const checkpoint = { engine: engineVersion, sequence: events.length, last: event, state };
    // A cache: where it cannot be kept, opening takes longer.
    void store.keepCheckpoint(attempt, checkpoint).catch(() => undefined);
  });
}
