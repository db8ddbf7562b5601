import type { BenchState } from '../../shared/bench/bench-state.ts';
import type { BenchCommand } from '../../shared/bench/catalogue.ts';
import type { MeterView } from '../../shared/bench/reading.ts';
import { meterAt } from '../../shared/bench/reading.ts';
import { runCommand, type Ran } from '../../shared/bench/run-command.ts';
import type { Setup } from '../../shared/bench/setup.ts';

/** Works out what takes longer than a frame: circuits run through time. */
export interface BenchThread {
  /** What the display shows at `atMs`, counted from the last event. */
  read: (state: BenchState, atMs: number) => Promise<MeterView | null>;
  /** What a command at `atMs` makes happen. */
  run: (state: BenchState, command: BenchCommand, atMs: number) => Promise<Ran>;
  stop: () => void;
}

/** In this thread: for tests, and where a browser has no workers. */
export const sameThread = (setup: Setup): BenchThread => ({
  read: (state, atMs) => Promise.resolve(meterAt(setup, state, atMs)),
  run: (state, command, atMs) => Promise.resolve(runCommand(setup, state, command, atMs)),
  stop: () => undefined,
});

export type Question =
  | { kind: 'begin'; setup: Setup }
  | { kind: 'read'; id: number; state: BenchState; atMs: number }
  | { kind: 'run'; id: number; state: BenchState; command: BenchCommand; atMs: number };

type Asked = Exclude<Question, { kind: 'begin' }>;

export interface Answer {
  id: number;
  value: MeterView | null | Ran;
}

/** In a thread of its own, begun at the first question: no pointer waits for a circuit. */
export function ownThread(setup: Setup, makeWorker: () => Worker): BenchThread {
  const waiting = new Map<number, Waiting>();
  let worker: Worker | null = null;
  let last = 0;
  const begin = (): Worker => {
    const begun = makeWorker();
    begun.addEventListener('message', ({ data }: MessageEvent<Answer>) => {
      waiting.get(data.id)?.resolve(data.value);
      waiting.delete(data.id);
    });
    begun.addEventListener('error', (event) => {
      for (const { reject } of waiting.values()) reject(new Error(event.message));
      waiting.clear();
    });
    begun.postMessage({ kind: 'begin', setup } satisfies Question);
    return begun;
  };
  const ask = <Value extends Answer['value']>(question: (id: number) => Asked): Promise<Value> =>
    new Promise((resolve, reject) => {
      worker ??= begin();
      last += 1;
      waiting.set(last, { resolve: (value) => resolve(value as Value), reject });
      worker.postMessage(question(last));
    });
  return {
    // A display asks nothing of the way back, and copying it takes time.
    read: (state, atMs) =>
      ask((id) => ({ kind: 'read', id, state: { ...state, wayBack: null }, atMs })),
    run: (state, command, atMs) => ask((id) => ({ kind: 'run', id, state, command, atMs })),
    stop: () => worker?.terminate(),
  };
}

interface Waiting {
  resolve: (value: Answer['value']) => void;
  reject: (why: unknown) => void;
}

/** One thread for the display, or for runs, where there can be one. */
export const benchThread = (setup: Setup): BenchThread =>
  typeof Worker === 'undefined'
    ? sameThread(setup)
    : ownThread(
        setup,
        () => new Worker(new URL('./bench-worker.ts', import.meta.url), { type: 'module' }),
      );
