import { useEffect } from 'react';
import { useBenchApi } from './bench-context.ts';
import { meterTick } from './meter-tick.ts';

/** Keeps the display live while the bench is open. */
export function useMeterTick(): void {
  const bench = useBenchApi();
  useEffect(() => meterTick(bench), [bench]);
}
