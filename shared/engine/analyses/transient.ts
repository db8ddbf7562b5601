import type {
  Circuit,
  EngineFailure,
  NodeName,
  OperatingPoint,
  Result,
  Storage,
} from '../circuit/circuit.ts';
import { esdirk4 } from '../integration/esdirk-4.ts';
import { trBdf2 } from '../integration/tr-bdf2.ts';
import { createIntegrator, type Integrator } from './integrator.ts';
import { createMachine, type EngineOptions, type Machine } from './machine.ts';
import { march, type Watch } from './march.ts';
import { forget } from './operating-point.ts';
import type { Plan } from './plan.ts';
import { readPoint } from './read-point.ts';
import { sampleGrid } from './sample-grid.ts';
import { startFromPoint } from './start-from-point.ts';
import { loadStorage, readStorage } from './storage.ts';
import { summarise, type Observe, type Summary } from './summarise.ts';

export interface TransientOptions extends EngineOptions {
  /** s between samples; none are kept without it */ step?: number;
  /** s */ stop: number;
  /** s of the first sample kept; 0 unless told */ start?: number;
  /** s; `step` unless told to be less */ maxStep?: number;
  /** start from initial voltages and currents instead of the operating point at t = 0 */
  useInitialConditions?: boolean;
  /** V of nodes held while the starting point is found, or giving capacitors their start */
  initialVoltages?: Readonly<Record<NodeName, number>>;
  /** what capacitors and inductors start with, by name; then no operating point is sought */
  storage?: Storage;
  /** means, rms and peaks over a window, gathered without keeping samples */ observe?: Observe;
  /** error of one step, as a share of each capacitor's voltage and inductor's current */
  relativeTolerance?: number;
}

export interface Transient {
  /** s, multiples of the step */ time: number[];
  /** V by node */ voltages: Record<NodeName, number[]>;
  /** A by name, of every voltage source and inductor */ currents: Record<string, number[]>;
  summary?: Summary;
  storage: Storage;
  final: OperatingPoint;
}

/** Samples are compared one by one; means over many steps forgive more. */
const SAMPLED_TOLERANCE = 1e-5;
const SUMMARY_TOLERANCE = 6e-4;

/**
 * The circuit through time from t = 0. Samples fall on steps' ends, never between them.
 * Fails with bad-element, voltage-loop, floating-node, or not-converged with the time.
 */
export function transient(circuit: Circuit, options: TransientOptions): Result<Transient> {
  const made = createMachine(circuit, 'moving', options);
  if (!made.ok) return made;
  const fault = badOptions(options);
  if (fault !== undefined) return { ok: false, failure: fault };
  const machine = made.value;
  forget(machine);
  const integrator = createIntegrator(machine, options.step === undefined ? esdirk4 : trBdf2);
  const unfit = start(integrator, circuit, options);
  if (unfit !== undefined) return { ok: false, failure: unfit };
  const grid = sampleGrid(machine, options.step ?? 0, options.start ?? 0);
  if (isFromPoint(options)) grid.begin();
  const observe = options.observe;
  const window = observe && { from: observe.from ?? 0, to: observe.to ?? options.stop };
  const gatherer = observe && window && summarise(integrator, observe, window);
  const failure = march(integrator, planOf(options, window), both(grid.watch, gatherer?.watch));
  if (failure !== undefined) return { ok: false, failure };
  return {
    ok: true,
    value: {
      ...grid.samples,
      ...(gatherer ? { summary: gatherer.summary() } : {}),
      storage: readStorage(integrator),
      final: readPoint(machine),
    },
  };
}

function badOptions({ step, stop, start, maxStep }: TransientOptions): EngineFailure | undefined {
  const isSound = [step ?? 1, stop, maxStep ?? 1].every((value) => value > 0) && (start ?? 0) >= 0;
  if (isSound && Number.isFinite(stop) && !Number.isNaN(step)) return undefined;
  const message = `no transient of step ${step}, stop ${stop}, start ${start}, longest step ${maxStep}`;
  return { code: 'bad-element', element: 'transient', message };
}

function start(
  integrator: Integrator,
  circuit: Circuit,
  options: TransientOptions,
): EngineFailure | undefined {
  if (isFromPoint(options)) return startFromPoint(integrator, circuit, options);
  const { storage, initialVoltages } = options;
  loadStorage(integrator, withNodeVoltages(integrator.machine, storage, initialVoltages ?? {}));
  return undefined;
}

const isFromPoint = ({ storage, useInitialConditions }: TransientOptions): boolean =>
  storage === undefined && !useInitialConditions;

/** A capacitor with no initial voltage of its own takes that between its nodes, where both are told. */
function withNodeVoltages(
  { netlist, capacitors }: Machine,
  storage: Storage | undefined,
  initial: Readonly<Record<NodeName, number>>,
): Storage {
  const voltages: Record<string, number> = {};
  for (const { branch } of capacitors) {
    const element = netlist.branches[branch]!;
    if (element.kind !== 'capacitor' || element.initialVoltage !== undefined) continue;
    const [a, b] = element.nodes;
    voltages[element.name] = (initial[a] ?? 0) - (initial[b] ?? 0);
  }
  return { voltages: { ...voltages, ...storage?.voltages }, currents: { ...storage?.currents } };
}

function planOf(options: TransientOptions, window: { from: number; to: number } | undefined): Plan {
  const { step, stop, maxStep } = options;
  return {
    from: 0,
    to: stop,
    breaks: window ? [window.from, window.to] : [],
    grid: step ?? 0,
    maxStep: Math.min(maxStep ?? Infinity, step ?? stop / 50),
    patience: 0,
    relativeTolerance:
      options.relativeTolerance ?? (step === undefined ? SUMMARY_TOLERANCE : SAMPLED_TOLERANCE),
  };
}

const both = (first: Watch, second: Watch | undefined): Watch => ({
  onMoment: (time) => {
    first.onMoment?.(time);
    second?.onMoment?.(time);
  },
  onStep: (base, offset, length) => {
    first.onStep?.(base, offset, length);
    second?.onStep?.(base, offset, length);
  },
});
