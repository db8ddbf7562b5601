import type { StoreApi } from 'zustand/vanilla';
import type { BenchState } from '../../shared/bench/bench-state.ts';
import type { WireEvent } from '../../shared/bench/event.ts';
import { untouched } from '../../shared/bench/fold.ts';
import type { Setup } from '../../shared/bench/setup.ts';
import { sameThread } from '../../src/simulation/bench-thread.ts';
import { benchClock, type BenchClock } from '../../src/simulation/bench-clock.ts';
import {
  benchStore,
  type BenchStore,
  type BenchStoreOptions,
} from '../../src/simulation/bench-store.ts';
import { setupWith } from './bench.ts';

export interface BenchOnPage {
  bench: StoreApi<BenchStore>;
  /** what the outbox was given */ added: WireEvent[][];
  /** moves real time, ms */ pass: (ms: number) => void;
  clock: BenchClock;
}

/** A bench store as the page has it, its time in the test's hands: an oven that nobody has touched, nothing stored in it. */
export function benchOnPage(
  setup: Setup = setupWith(),
  about: Partial<BenchState> = {},
  more: Partial<BenchStoreOptions> = {},
): BenchOnPage {
  let real = 0;
  const added: WireEvent[][] = [];
  const clock = benchClock(0, () => real);
  const bench = benchStore({
    setup,
    condition: 'guided',
    state: { ...untouched(setup), ...about },
    events: [],
    clock,
    save: { kind: 'saved', at: null },
    thread: sameThread(setup),
    onEvents: (events) => added.push([...events]),
    ...more,
  });
  return { bench, added, clock, pass: (ms) => (real += ms) };
}

/** The same oven open on the bench, cord out. */
export const openBenchOnPage = (
  faults: Parameters<typeof setupWith>[0] = [],
  more: Parameters<typeof setupWith>[1] = {},
): BenchOnPage => benchOnPage(setupWith(faults, more), { isCordIn: false, isCoverOn: false });
