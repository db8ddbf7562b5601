import { useEffect } from 'react';
import { useBenchApi } from './bench-context.ts';
import { benchThread } from './bench-thread.ts';
import { meterTick } from './meter-tick.ts';

/** Keeps the display live while the bench is open. */
export function useMeterTick(): void {
  const bench = useBenchApi();
  useEffect(() => meterTick(bench, benchThread(bench.getState().setup)), [bench]);
}
