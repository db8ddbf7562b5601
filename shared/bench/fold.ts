import { hasDisplay } from '../oven/has-display.ts';
import { asFitted } from '../oven/initial-state.ts';
import type { BenchState } from './bench-state.ts';
import type { WireEvent } from './event.ts';
import { passTime } from './pass-time.ts';
import { apply } from './run-command.ts';
import type { Setup } from './setup.ts';
import { byHandle } from './test-leads.ts';

/** The bench before its first event: a closed oven, plugged in, the meter off. */
export const untouched = (setup: Setup): BenchState => ({
  benchMs: 0,
  skippedMs: 0,
  isCordIn: true,
  isCoverOn: true,
  isDisplayLit: hasDisplay(setup.oven.definition) ? false : null,
  runsByItself: false,
  oven: asFitted(setup.oven.definition, setup.faults),
  labels: {},
  probes: { red: null, black: null },
  holds: byHandle,
  meter: { setting: 'off', relative: null, isDestroyed: false, lag: null },
  discharge: { clip: null, tip: null },
  battery: { neg: null, oneK: null },
  storage: { voltages: {}, currents: {} },
  replaced: [],
  inspected: [],
  sheet: { readings: [], verdicts: {}, causes: [], report: { repair: '', customer: '' } },
  runs: [],
  hazards: [],
  isHandedIn: false,
  wayBack: null,
});

/** One event further: time first, then what happened. */
export const evolve = (setup: Setup, state: BenchState, event: WireEvent): BenchState =>
  apply(setup, passTime(setup, state, event.benchMs).state, event);

/** The bench after these events, from the beginning or from a checkpoint. */
export const fold = (
  setup: Setup,
  events: readonly WireEvent[],
  from: BenchState = untouched(setup),
): BenchState => events.reduce((state, event) => evolve(setup, state, event), from);
