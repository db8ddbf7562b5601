import { advance } from '../engine/analyses/advance.ts';
import type { Circuit, Storage } from '../engine/circuit/circuit.ts';
import { lagAlong } from '../instruments/lag.ts';
import type { Trace } from '../instruments/meter.ts';
import { assemble, nodeOf } from '../oven/assemble.ts';
import type { BenchBranch } from '../oven/oven-state.ts';
import type { BenchState } from './bench-state.ts';
import { branches } from './branches.ts';
import { afterClosing, nextClosing } from './cooling.ts';
import type { Setup } from './setup.ts';

/** V; below this everywhere, and with nothing that drives, the circuit is dead and stays so. */
const deadVolts = 1e-6;

export interface Passed {
  state: BenchState;
  /** V between the red and the black tip since the last event; empty when a probe is off */
  trace: Trace;
}

/** The oven and all that is connected to it, as a circuit. */
export const circuitOf = (
  setup: Setup,
  state: BenchState,
  extra: readonly BenchBranch[] = [],
): Circuit => assemble(setup.oven, state.oven, [...branches(setup, state), ...extra]);

/** The last answer for a state: deciding and then recording ask for the same moment. */
const remembered = new WeakMap<BenchState, { setup: Setup; untilMs: number; passed: Passed }>();

/** Lets bench time run to `untilMs` with nothing touched: the circuit is integrated from event to event. */
export function passTime(setup: Setup, state: BenchState, untilMs: number): Passed {
  const known = remembered.get(state);
  if (known?.setup === setup && known.untilMs === untilMs) return known.passed;
  const passed = throughClosings(setup, state, untilMs);
  remembered.set(state, { setup, untilMs, passed });
  return passed;
}

/** Cut-outs that cooled enough close on the way: each closing makes another circuit. */
function throughClosings(setup: Setup, state: BenchState, untilMs: number): Passed {
  const next = nextClosing(state, untilMs);
  if (!next) return integrateTo(setup, state, untilMs);
  const first = integrateTo(setup, state, Math.max(next.atMs, state.benchMs));
  const rest = throughClosings(setup, afterClosing(setup, first.state, next), untilMs);
  return { state: rest.state, trace: joined(first.trace, rest.trace) };
}

const joined = (a: Trace, b: Trace): Trace => {
  const until = a.time.at(-1) ?? 0;
  return {
    time: [...a.time, ...b.time.map((at) => until + at)],
    volts: [...a.volts, ...b.volts],
  };
};

function integrateTo(setup: Setup, state: BenchState, untilMs: number): Passed {
  const duration = (untilMs - state.benchMs) / 1000;
  const connected = branches(setup, state);
  const { red, black } = state.probes;
  const isDead = !connected.some((branch) => branch.volts !== 0) && isDischarged(state.storage);
  const isBatteryOn = state.battery.neg !== null || state.battery.oneK !== null;
  const isOnBattery = [red, black].some((target) => target?.startsWith('BAT.'));
  if (duration < 0 || (isDead && !isBatteryOn && !isOnBattery)) {
    const flat = red && black ? { time: [0, Math.max(duration, 0)], volts: [0, 0] } : noTrace;
    return { state: { ...state, benchMs: untilMs }, trace: flat };
  }
  const tips = red && black ? pairOf(state, red, black) : null;
  const observe = tips ? [tips] : [];
  const result = integrate(circuitOf(setup, state), state.storage, duration, observe);
  const volts = result.samples.values[0];
  const trace = volts ? { time: result.samples.time, volts } : noTrace;
  // No time has passed: a record folded event by event must not drift from the bench it came from.
  if (duration === 0) return { state, trace };
  const lag = volts
    ? lagAlong(setup.meter, state.meter.setting, trace, state.meter.lag)
    : state.meter.lag;
  return {
    state: {
      ...state,
      benchMs: untilMs,
      storage: result.storage,
      meter: { ...state.meter, lag },
    },
    trace,
  };
}

/** The nodes under two targets. */
export const pairOf = (state: BenchState, a: string, b: string): readonly [string, string] => [
  nodeOf(state.oven, a),
  nodeOf(state.oven, b),
];

/**
 * Integrates or throws: any legal oven state makes a circuit that can be solved (a property test
 * holds it), so a failure here is a bug and not an outcome.
 */
export function integrate(
  circuit: Circuit,
  storage: Storage,
  duration: number,
  observe: readonly (readonly [string, string])[],
) {
  const result = advance(circuit, storage, Math.max(duration, 1e-9), { observe });
  if (!result.ok) throw new Error(`bench circuit: ${result.failure.message}`);
  return result.value;
}

const noTrace: Trace = { time: [], volts: [] };

const isDischarged = (storage: Storage): boolean =>
  [...Object.values(storage.voltages), ...Object.values(storage.currents)].every(
    (held) => Math.abs(held) < deadVolts,
  );
