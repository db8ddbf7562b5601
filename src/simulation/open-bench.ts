import type { StoreApi } from 'zustand/vanilla';
import type { BenchState } from '../../shared/bench/bench-state.ts';
import type { RecordedEvent, WireEvent } from '../../shared/bench/event.ts';
import { makeSetup, type Setup } from '../../shared/bench/setup.ts';
import { verify } from '../../shared/bench/verify.ts';
import type { Attempt } from '../../shared/contracts/attempts.ts';
import type { OvenLayout } from '../../shared/oven/layout.ts';
import type { BenchThread } from './bench-thread.ts';
import { benchClock } from './bench-clock.ts';
import type { BenchServer } from './bench-server.ts';
import { benchStore, type BenchStore } from './bench-store.ts';
import { foldFromCheckpoint, keepCheckpoints } from './checkpoints.ts';
import { outbox, type Outbox } from './outbox.ts';
import type { OutboxStore } from './outbox-store.ts';
import type { SaveState } from './save-state.ts';
import { waitingSteps } from './waiting-steps.ts';
import { wholeDecisions } from './whole-decisions.ts';
import type { WriterLock } from './writer-lock.ts';

export interface OpenBenchOptions {
  attempt: string;
  /** uuid of this tab */ writer: string;
  server: BenchServer;
  store: OutboxStore;
  /** where runs of the oven are worked out */ thread: (setup: Setup) => BenchThread;
  /** null: another tab of this browser writes */ lock: () => Promise<WriterLock | null>;
  /** ms, monotonic */ realNow: () => number;
  /** ms since 1970 */ now: () => number;
}

export interface OpenedBench {
  kind: 'open';
  attempt: Attempt;
  layout: OvenLayout;
  bench: StoreApi<BenchStore>;
  /** null: this tab only reads */ outbox: Outbox | null;
  /** why steps made on this device earlier are not on the bench; null: all are */ setAside:
    string | null;
  /** Moves the steps that the record refuses out of the way, kept apart. */ setStepsAside: () => Promise<void>;
  close: () => void;
}

/** `closed`: handed in, or somebody else's: nothing to do on a bench. */
export type Opened = OpenedBench | { kind: 'closed'; attempt: Attempt };

/**
 * Puts an attempt on the bench where it stood: the record, then what this device kept of it.
 * Rejects with a Problem when the server cannot give it.
 */
export async function openBench(options: OpenBenchOptions): Promise<Opened> {
  const { server } = options;
  const attempt = await server.attempt(options.attempt);
  if (!attempt.isOwn || attempt.status === 'handed in') return { kind: 'closed', attempt };
  const { definition, layout } = await server.oven(attempt.content.oven);
  const setup = makeSetup({ ...attempt.content, definition, seed: attempt.seed });
  const lock = await options.lock();
  try {
    return await onTheBench(options, { attempt, layout, setup, lock });
  } catch (problem) {
    lock?.release();
    throw problem;
  }
}

interface Found {
  attempt: Attempt;
  layout: OvenLayout;
  setup: Setup;
  lock: WriterLock | null;
}

async function onTheBench(options: OpenBenchOptions, found: Found): Promise<OpenedBench> {
  const { server, writer } = options;
  const { attempt, layout, setup, lock } = found;
  const epoch = lock ? (await server.takeOver(attempt.id, writer)).epoch : null;
  // After the take-over: nobody else adds to the record from here on.
  const record = await server.events(attempt.id);
  const start = await standing(options, setup, record, epoch !== null);
  const clock = benchClock(start.state.benchMs, options.realNow);
  const thread = options.thread(setup);
  const bench = benchStore({
    setup,
    clock,
    thread,
    condition: attempt.content.condition,
    state: start.state,
    events: [...record.map(withoutRecord), ...start.waiting],
    save: start.save,
    onEvents: (events) => out?.add(events),
  });
  const out =
    epoch === null || start.save.kind === 'refused'
      ? null
      : outbox({
          attempt: attempt.id,
          next: record.length,
          waiting: wholeDecisions(start.waiting),
          store: options.store,
          send: server.send(attempt.id, writer, epoch),
          onState: (save) => bench.getState().setSave(save),
          now: options.now,
        });
  const forget = out
    ? keepCheckpoints(bench, { attempt: attempt.id, store: options.store })
    : () => undefined;
  void out?.flush();
  void lock?.lost.then(() => {
    out?.stop();
    bench.getState().setSave({ kind: 'read-only', why: elsewhere });
  });
  return {
    kind: 'open',
    attempt,
    layout,
    bench,
    outbox: out,
    setAside: start.setAside,
    setStepsAside: () => options.store.setAside(attempt.id, whyClosed(bench.getState().save)),
    close: () => {
      thread.stop();
      forget();
      out?.stop();
      lock?.release();
    },
  };
}

const elsewhere = 'This job is open in another tab, which records it.';

const whyClosed = (save: SaveState): string => ('why' in save ? save.why : '');

interface Standing {
  state: BenchState;
  waiting: readonly WireEvent[];
  save: SaveState;
  setAside: string | null;
}

/** The bench after the record, and after the steps that this device kept, if they follow from it. */
async function standing(
  { attempt, store }: OpenBenchOptions,
  setup: Setup,
  record: readonly RecordedEvent[],
  isWriter: boolean,
): Promise<Standing> {
  const state = await foldFromCheckpoint(setup, record.map(withoutRecord), { attempt, store });
  const last = record.at(-1);
  const saved: SaveState = { kind: 'saved', at: last ? Date.parse(last.recordedAt) : null };
  const only = { state, waiting: [], setAside: null };
  if (!isWriter) return { ...only, save: { kind: 'read-only', why: elsewhere } };
  const kept = await store.load(attempt);
  const waiting = waitingSteps(record.map(withoutRecord), kept);
  if (waiting.kind === 'astray') {
    await store.setAside(attempt, waiting.why);
    return { ...only, save: saved, setAside: waiting.why };
  }
  await store.acknowledge(attempt, record.length);
  const judged = verify(setup, state, waiting.events);
  if (judged.ok)
    return { state: judged.state, waiting: waiting.events, save: saved, setAside: null };
  const steps = waiting.events.length;
  return { ...only, save: { kind: 'refused', steps, why: judged.message } };
}

const withoutRecord = ({ type, version, data, benchMs }: RecordedEvent): WireEvent => ({
  type,
  version,
  data,
  benchMs,
});
