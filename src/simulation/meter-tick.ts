import type { StoreApi } from 'zustand/vanilla';
import type { MeterView } from '../../shared/bench/reading.ts';
import { meterAt, readingPeriod } from '../../shared/bench/reading.ts';
import { autoRange } from '../../shared/instruments/auto-range.ts';
import type { BenchStore } from './bench-store.ts';
import { isClosedTo } from './save-state.ts';

/**
 * The live display: three readings a second, each from the circuit as it is by then, and at once when
 * something changes. A reading that stands still goes on record once, until something about it changes.
 * Returns what stops it.
 */
export function meterTick(bench: StoreApi<BenchStore>): () => void {
  let taken = '';
  const tick = (): void => {
    const { state, clock, setup, show } = bench.getState();
    const at = Math.floor(Math.floor(clock.now() / readingPeriod) * readingPeriod);
    const atMs = Math.max(at, state.benchMs);
    const view = meterAt(setup, state, atMs);
    show(view);
    if (!view || !mayRecord(bench.getState())) return;
    if (changeRange(bench.getState(), view, atMs)) return;
    const key = readingKey(bench.getState(), view);
    if (!view.isSettled || key === taken) return;
    taken = key;
    bench.getState().run({ type: 'TakeReading', data: {} }, atMs);
  };
  tick();
  const timer = setInterval(tick, readingPeriod);
  const stop = bench.subscribe((now, before) => {
    if (now.state !== before.state) tick();
  });
  return () => {
    clearInterval(timer);
    stop();
  };
}

const mayRecord = ({ state, save }: BenchStore): boolean =>
  !isClosedTo(save) &&
  !state.isHandedIn &&
  state.probes.red !== null &&
  state.probes.black !== null;

/** REL holds the range, as a number of one range means nothing to another. */
function changeRange({ setup, state, run }: BenchStore, view: MeterView, atMs: number): boolean {
  if (state.meter.relative !== null || view.reading.isWarning) return false;
  const setting = autoRange(setup.meter, state.meter.setting, view.reading);
  return setting !== state.meter.setting && run({ type: 'SetMeter', data: { setting } }, atMs);
}

/** Two displays a few counts apart are one reading: the last digit dithers. */
function readingKey({ state }: BenchStore, { reading }: MeterView): string {
  const counts = reading.isOverRange ? 'OL' : Math.round((reading.counts ?? 0) / 4);
  const { probes, meter, oven, replaced } = state;
  return JSON.stringify([
    probes,
    meter.setting,
    meter.relative,
    counts,
    oven.leadEnds,
    oven,
    replaced,
  ]);
}
