import type { StoreApi } from 'zustand/vanilla';
import type { BenchState } from '../../shared/bench/bench-state.ts';
import type { MeterView } from '../../shared/bench/reading.ts';
import { readingPeriod, readMeter } from '../../shared/bench/reading.ts';
import type { Setup } from '../../shared/bench/setup.ts';
import { autoRange } from '../../shared/instruments/auto-range.ts';
import type { BenchStore } from './bench-store.ts';
import type { BenchThread } from './bench-thread.ts';
import { isClosedTo } from './save-state.ts';

/**
 * The live display: three readings a second, each from the circuit as it is by then, and at once when
 * something changes. A reading that stands still goes on record once, until something about it changes.
 * Returns what stops it.
 */
export function meterTick(
  bench: StoreApi<BenchStore>,
  reader: Pick<BenchThread, 'read' | 'stop'>,
): () => void {
  let taken = '';
  let isReading = false;
  let isOver = false;
  const hasChanged = (since: BenchState): boolean => !isSameCircuit(since, bench.getState().state);

  const arrive = (view: MeterView | null, atMs: number): void => {
    bench.getState().show(view);
    if (!view || !mayRecord(bench.getState())) return;
    if (changeRange(bench.getState(), view, atMs)) return;
    const key = readingKey(bench.getState(), view);
    if (!view.isSettled || key === taken) return;
    taken = key;
    bench.getState().run({ type: 'TakeReading', data: {} }, atMs);
  };
  const tick = async (): Promise<void> => {
    const { state, clock, setup } = bench.getState();
    const at = Math.floor(Math.floor(clock.now() / readingPeriod) * readingPeriod);
    const atMs = Math.max(at, state.benchMs);
    const isDriven = isConnected(state);
    if (!isDriven) return arrive(loose(setup, state, atMs), atMs);
    if (isReading) return;
    isReading = true;
    try {
      const view = await reader.read(state, atMs);
      if (isOver) return;
      if (!hasChanged(state)) arrive(view, Math.max(atMs, bench.getState().state.benchMs));
    } finally {
      isReading = false;
    }
    // What the bench has become meanwhile is read at once, not a third of a second later.
    if (hasChanged(state) && isConnected(bench.getState().state)) await tick();
  };
  void tick();
  const timer = setInterval(() => void tick(), readingPeriod);
  const stop = bench.subscribe((now, before) => {
    if (now.state !== before.state && hasChanged(before.state)) void tick();
  });
  return () => {
    isOver = true;
    clearInterval(timer);
    stop();
    reader.stop();
  };
}

/** A reading written down, a verdict given: nothing about them is news to the display. */
const isSameCircuit = (a: BenchState, b: BenchState): boolean =>
  a.probes === b.probes &&
  a.holds === b.holds &&
  a.meter.setting === b.meter.setting &&
  a.meter.relative === b.meter.relative &&
  a.oven === b.oven &&
  a.discharge === b.discharge &&
  a.battery === b.battery &&
  a.isCordIn === b.isCordIn &&
  a.isHandedIn === b.isHandedIn;

const isConnected = ({ probes, meter }: BenchState): boolean =>
  meter.setting !== 'off' && !meter.isDestroyed && probes.red !== null && probes.black !== null;

/** Off, dead, or a tip in the air: nothing of the circuit is shown. */
const loose = (setup: Setup, state: BenchState, atMs: number): MeterView | null =>
  readMeter(setup, state, { state: { ...state, benchMs: atMs }, trace: { time: [], volts: [] } });

const mayRecord = ({ state, save, running }: BenchStore): boolean =>
  running === null && !isClosedTo(save) && !state.isHandedIn && isConnected(state);

/** REL holds the range, as a number of one range means nothing to another. */
function changeRange({ setup, state, run }: BenchStore, view: MeterView, atMs: number): boolean {
  if (state.meter.relative !== null || view.reading.isWarning) return false;
  const setting = autoRange(setup.meter, state.meter.setting, view.reading);
  return setting !== state.meter.setting && run({ type: 'SetMeter', data: { setting } }, atMs);
}

/** Two displays a few counts apart are one reading: the last digit dithers. */
function readingKey({ state }: BenchStore, { reading }: MeterView): string {
  const counts = reading.isOverRange ? 'OL' : Math.round((reading.counts ?? 0) / 4);
  const { probes, holds, meter, oven, replaced } = state;
  return JSON.stringify([probes, holds, meter.setting, meter.relative, counts, oven, replaced]);
}
