import type { BenchState } from '../../shared/bench/bench-state.ts';
import type { MeterView } from '../../shared/bench/reading.ts';
import { meterAt } from '../../shared/bench/reading.ts';
import type { Setup } from '../../shared/bench/setup.ts';

/** Works out what the display shows at `atMs`, counted from the last event. */
export interface MeterReader {
  read: (state: BenchState, atMs: number) => Promise<MeterView | null>;
  stop: () => void;
}

/** In this thread: for tests, and where a browser has no workers. */
export const directReader = (setup: Setup): MeterReader => ({
  read: (state, atMs) => Promise.resolve(meterAt(setup, state, atMs)),
  stop: () => undefined,
});

export interface MeterQuestion {
  id: number;
  state: BenchState;
  atMs: number;
}

export interface MeterAnswer {
  id: number;
  view: MeterView | null;
}

/** In a thread of its own, begun at the first question: running the whole oven through time must not hold up a pointer. */
export function workerReader(setup: Setup, makeWorker: () => Worker): MeterReader {
  const waiting = new Map<number, Waiting>();
  let worker: Worker | null = null;
  let last = 0;
  const begin = (): Worker => {
    const begun = makeWorker();
    begun.addEventListener('message', ({ data }: MessageEvent<MeterAnswer>) => {
      waiting.get(data.id)?.resolve(data.view);
      waiting.delete(data.id);
    });
    begun.addEventListener('error', (event) => {
      for (const { reject } of waiting.values()) reject(new Error(event.message));
      waiting.clear();
    });
    begun.postMessage(setup);
    return begun;
  };
  return {
    read: (state, atMs) =>
      new Promise((resolve, reject) => {
        worker ??= begin();
        last += 1;
        waiting.set(last, { resolve, reject });
        // A display asks nothing of the way back, and copying it takes time.
        const asked = { ...state, wayBack: null };
        worker.postMessage({ id: last, state: asked, atMs } satisfies MeterQuestion);
      }),
    stop: () => worker?.terminate(),
  };
}

interface Waiting {
  resolve: (view: MeterView | null) => void;
  reject: (why: unknown) => void;
}
