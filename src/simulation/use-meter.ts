import { useEffect, useRef, useState } from 'react';
import type { MeterView } from '../../shared/bench/reading.ts';
import { meterAt, readingPeriod } from '../../shared/bench/reading.ts';
import type { BenchStore } from './bench-store.ts';
import { useBenchApi } from './bench-context.ts';

/** The live display: three readings a second, each from the circuit as it is by then; null: nothing shown. */
export function useMeter(): MeterView | null {
  const api = useBenchApi();
  const [view, setView] = useState<MeterView | null>(null);
  const taken = useRef<string>('');

  useEffect(() => {
    const show = (): void => {
      const store = api.getState();
      const { state, clock, setup } = store;
      const tick = Math.floor(Math.floor(clock.now() / readingPeriod) * readingPeriod);
      const atMs = Math.max(tick, state.benchMs);
      const next = meterAt(setup, state, atMs);
      setView(next);
      if (next?.isSettled) takeOnce(store, next, taken, atMs);
    };
    show();
    const timer = setInterval(show, readingPeriod);
    const stop = api.subscribe((now, before) => {
      if (now.state !== before.state) show();
    });
    return () => {
      clearInterval(timer);
      stop();
    };
  }, [api]);

  return view;
}

/** A reading that stands goes on record once, until something about it changes. */
function takeOnce(
  store: BenchStore,
  { reading }: MeterView,
  taken: { current: string },
  atMs: number,
): void {
  const { probes, meter, oven } = store.state;
  if (store.save.kind === 'read-only' || store.state.isHandedIn || !probes.red || !probes.black) return;
  // Two displays a count apart are one reading: the last digit dithers.
  const counts = reading.isOverRange ? 'OL' : Math.round((reading.counts ?? 0) / 4);
  const key = [probes.red, probes.black, meter.setting, meter.relative, counts, JSON.stringify(oven)].join('|');
  if (key === taken.current) return;
  taken.current = key;
  store.run({ type: 'TakeReading', data: {} }, atMs);
}
