import { useEffect } from 'react';
import { useBenchApi } from './bench-context.ts';
import { directReader, workerReader } from './meter-reader.ts';
import { meterTick } from './meter-tick.ts';

const makeWorker = (): Worker =>
  new Worker(new URL('./meter-worker.ts', import.meta.url), { type: 'module' });

/** Keeps the display live while the bench is open. */
export function useMeterTick(): void {
  const bench = useBenchApi();
  useEffect(() => {
    const { setup } = bench.getState();
    const reader =
      typeof Worker === 'undefined' ? directReader(setup) : workerReader(setup, makeWorker);
    return meterTick(bench, reader);
  }, [bench]);
}
