import type {
  Circuit,
  EngineFailure,
  NodeName,
  OperatingPoint,
  Result,
  Storage,
} from '../circuit/circuit.ts';
import { esdirk4 } from '../integration/esdirk-4.ts';
import { createIntegrator } from './integrator.ts';
import { createMachine, type EngineOptions } from './machine.ts';
import { march } from './march.ts';
import { forget } from './operating-point.ts';
import { readPoint } from './read-point.ts';
import { recordPairs, type Trace } from './record-pairs.ts';
import { loadStorage, readStorage } from './storage.ts';

export interface AdvanceOptions extends EngineOptions {
  /** s on the clock of the sources' waves at which this begins; 0 unless told */
  startTime?: number;
  /** pairs (a, b) whose V(a) - V(b) is sampled */
  observe?: readonly (readonly [NodeName, NodeName])[];
  /** s */ maxStep?: number;
  /** error of one step, as a share of each capacitor's voltage and inductor's current */
  relativeTolerance?: number;
  /** moments on the sources' clock (s) at which a step must end and start afresh */
  breakpoints?: readonly number[];
}

export interface Advanced {
  /** of this circuit's capacitors (V) and inductors (A), at the end */ storage: Storage;
  /**
   * `time` s since the start, first 0 (just after what was changed), last the duration; a jump has
   * two samples at one time. Dense enough to be joined by straight lines to 1e-4 of the value.
   */
  samples: Trace;
  /** mean over the duration of each observed pair, V */ means: number[];
  final: OperatingPoint;
}

/** A displayed 2000-count reading is then right to 0.2 count after many steps. */
const RELATIVE_TOLERANCE = 1e-6;

/**
 * With nothing driving, whatever still rings after some ten of its periods is damped rather than
 * followed: a winding with picofarads on it would ring for thousands. Judgement: a meter of three
 * readings a second does not show it.
 */
const PATIENCE = 1 / 400;

/**
 * Lets `duration` (s) of bench time pass. Capacitors and inductors start from `storage` by name, or
 * from their own initial values, or from nothing. The answer depends on the arguments alone.
 *
 * Fails with bad-element, voltage-loop (voltage sources only: here inductors hold their current),
 * floating-node or not-converged with the time.
 */
export function advance(
  circuit: Circuit,
  storage: Storage,
  duration: number,
  options: AdvanceOptions = {},
): Result<Advanced> {
  const made = createMachine(circuit, 'moving', options);
  if (!made.ok) return made;
  const machine = made.value;
  const fault = badDuration(duration);
  if (fault !== undefined) return { ok: false, failure: fault };
  forget(machine);
  const integrator = createIntegrator(machine, esdirk4);
  loadStorage(integrator, storage);
  const from = options.startTime ?? 0;
  const recorder = recordPairs(integrator, options.observe ?? [], from);
  const isDriven = machine.sources.some(({ element }) => element.wave.shape !== 'dc');
  const plan = {
    from,
    to: from + duration,
    breaks: options.breakpoints ?? [],
    grid: 0,
    maxStep: options.maxStep ?? Infinity,
    patience: isDriven ? 0 : PATIENCE,
    relativeTolerance: options.relativeTolerance ?? RELATIVE_TOLERANCE,
  };
  const failure = march(integrator, plan, recorder.watch);
  if (failure !== undefined) return { ok: false, failure };
  return {
    ok: true,
    value: {
      storage: readStorage(integrator),
      samples: recorder.trace,
      means: recorder.means(duration),
      final: readPoint(machine),
    },
  };
}

function badDuration(duration: number): EngineFailure | undefined {
  if (duration >= 0 && Number.isFinite(duration)) return undefined;
  const message = `a duration of ${duration} s cannot pass`;
  return { code: 'bad-element', element: 'duration', message };
}
