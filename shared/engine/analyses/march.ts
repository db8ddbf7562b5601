import type { EngineFailure } from '../circuit/circuit.ts';
import { waveCorners, waveStepLimit } from '../circuit/wave-value.ts';
import { switchOverdrive } from '../devices/switch.ts';
import { fitStep, nextStep } from '../integration/step-control.ts';
import {
  ABSOLUTE_AMPERES,
  ABSOLUTE_VOLTS,
  INSTANT,
  acceptStep,
  hasJunctionTurned,
  refuseStep,
  settle,
  stepError,
  tryStep,
  type Integrator,
} from './integrator.ts';
import type { Machine } from './machine.ts';
import { notConverged } from './newton.ts';

/** Where to go and how carefully. Times in s, on the sources' clock. */
export interface Plan {
  readonly from: number;
  readonly to: number;
  /** moments at which something jumps that the sources do not know of */
  readonly breaks: readonly number[];
  /** every multiple of this is landed on; 0 for none */ readonly grid: number;
  readonly maxStep: number;
  /**
   * Share of the time since the last break below which no step is forced, for the sake of rings that
   * nobody will see: they are then damped, charge and flux being kept. 0 to follow everything.
   */
  readonly patience: number;
  /** of each capacitor's voltage and inductor's current, in one step */
  readonly relativeTolerance: number;
}

/** Who watches: the machine holds the solution of the moment spoken of. */
export interface Watch {
  /** the moment just after a break or the start */ onMoment?(time: number): void;
  /** a step has ended `offset` s after the break at `base`, and was `length` long */
  onStep?(base: number, offset: number, length: number): void;
}

interface Segment {
  base: number;
  length: number;
}

const MOST_STEPS = 3_000_000;
/** Turns of switches without the clock moving. */
const MOST_TURNS = 200;

/**
 * Integrates from break to break. Within a segment time counts from the break, so that a nanosecond
 * after bench time 1000 s is still a nanosecond. Step control sees nothing but the plan and the state.
 */
export function march(integrator: Integrator, plan: Plan, watch: Watch): EngineFailure | undefined {
  const ends = segmentEnds(integrator.machine, plan);
  const budget = { steps: MOST_STEPS };
  let base = plan.from;
  let turns = 0;
  for (let at = 0; ;) {
    const failure = settle(integrator, base);
    if (failure !== undefined) return failure;
    watch.onMoment?.(base);
    const end = ends[at];
    if (end === undefined) return undefined;
    const segment = { base, length: end - base };
    const reached = marchSegment(integrator, plan, segment, watch, budget);
    if (typeof reached === 'object') return reached;
    if (reached >= segment.length) {
      at += 1;
      if (at === ends.length) return undefined;
      base = segment.base + segment.length;
      turns = 0;
      continue;
    }
    turns = reached > 0 && base + reached > base ? 0 : turns + 1;
    base += reached;
    if (turns > MOST_TURNS) return notConverged(integrator.machine, turns, base);
  }
}

function segmentEnds({ sources }: Machine, plan: Plan): number[] {
  const { from, to } = plan;
  const inside = plan.breaks.filter((time) => time > from && time < to);
  for (const { element, fixed } of sources) {
    if (fixed === undefined) inside.push(...waveCorners(element.wave, from, to));
  }
  inside.sort((p, q) => p - q);
  const ends: number[] = [];
  let last = from;
  for (const time of [...inside, to]) {
    // corners that rounding alone keeps apart are one
    if (time - last <= 1e-12 * Math.abs(time)) {
      if (ends.length > 0) ends[ends.length - 1] = last = time;
      continue;
    }
    ends.push(time);
    last = time;
  }
  return ends;
}

/** Where a segment stands. Offsets and lengths in s. */
interface Walk {
  readonly base: number;
  readonly end: number;
  readonly longest: number;
  offset: number;
  wanted: number;
  overdrive: number[];
  refusals: number;
}

/** Offset reached: the segment's length, or less when a switch must turn there. */
function marchSegment(
  integrator: Integrator,
  plan: Plan,
  segment: Segment,
  watch: Watch,
  budget: { steps: number },
): number | EngineFailure {
  const { machine } = integrator;
  const longest = longestStep(machine, plan);
  const walk: Walk = {
    base: segment.base,
    end: segment.length,
    longest,
    offset: 0,
    wanted: Math.min(longest, firstStep(integrator)),
    overdrive: overdrives(machine),
    refusals: 0,
  };
  while (walk.offset < walk.end) {
    const length = fitStep(walk.wanted, landing(plan, segment, walk.offset) - walk.offset);
    budget.steps -= 1;
    const outcome = walkStep(integrator, plan, walk, length);
    if (outcome === 'unsolved' || budget.steps < 0) {
      return notConverged(machine, MOST_STEPS - budget.steps, walk.base + walk.offset);
    }
    if (typeof outcome === 'object') return outcome;
    if (outcome === 'refused') continue;
    watch.onStep?.(walk.base, walk.offset, length);
    if (outcome === 'turning') return walk.offset;
  }
  return walk.end;
}

type StepOutcome = 'accepted' | 'turning' | 'refused' | 'unsolved' | EngineFailure;

/** Tries one step and moves the walk on, or shortens what it wants next. */
function walkStep(integrator: Integrator, plan: Plan, walk: Walk, length: number): StepOutcome {
  const { machine, tableau } = integrator;
  if (walk.refusals === KINK) return startAfresh(integrator, walk, length) ?? 'refused';
  const shortest = Math.max(INSTANT, 4 * Number.EPSILON * walk.offset);
  const middle = walk.base + walk.end / 2;
  if (!tryStep(integrator, walk.base + walk.offset, length, middle)) {
    return length <= shortest ? 'unsolved' : refuse(integrator, walk, length / 8);
  }
  const error = stepError(integrator, length, plan.relativeTolerance);
  const enough = Math.max(shortest, plan.patience * walk.offset);
  if (error > 1 && length > enough) {
    return refuse(integrator, walk, nextStep(length, error, tableau.errorPower));
  }
  const overdrive = overdrives(machine);
  const turn = turningAt(walk.overdrive, overdrive);
  if (turn < 1 - TURN_PRECISION && length * turn > shortest) {
    walk.refusals = 0;
    return refuse(integrator, walk, length * Math.max(0.01, turn * (1 + TURN_PRECISION / 2)));
  }
  const hasTurned = hasJunctionTurned(integrator);
  acceptStep(integrator);
  walk.refusals = 0;
  walk.overdrive = overdrive;
  const left = walk.end - walk.offset - length;
  walk.offset = left <= shortest ? walk.end : walk.offset + length;
  // a step cut short by a landing says little against the one that was wanted
  const basis = Math.max(length, Math.min(walk.wanted, 2 * length));
  const next = Math.max(nextStep(basis, error, tableau.errorPower), plan.patience * walk.offset);
  walk.wanted = Math.min(walk.longest, next);
  if (turn <= 1) return 'turning';
  if (!hasTurned || walk.offset >= walk.end) return 'accepted';
  return settle(integrator, walk.base + walk.offset) ?? 'accepted';
}

function refuse(integrator: Integrator, walk: Walk, wanted: number): 'refused' {
  refuseStep(integrator);
  walk.refusals += 1;
  walk.wanted = wanted;
  return 'refused';
}

/** The rates at the start were those of a circuit that had just turned a corner: finds them anew. */
function startAfresh(
  integrator: Integrator,
  walk: Walk,
  length: number,
): EngineFailure | undefined {
  const failure = settle(integrator, walk.base + walk.offset);
  walk.overdrive = overdrives(integrator.machine);
  walk.wanted = Math.min(length, firstStep(integrator));
  walk.refusals += 1;
  return failure;
}

/** So many refusals at one place are no longer a matter of the step's length. */
const KINK = 4;

/** A switch turns within this share of the step in which its control crosses. */
const TURN_PRECISION = 1e-4;

const overdrives = ({ system, switches }: Machine): number[] =>
  switches.map((state) => switchOverdrive(system, state));

/** Share of the step at which the first control crosses; Infinity when none does. */
function turningAt(before: readonly number[], after: readonly number[]): number {
  let first = Infinity;
  after.forEach((late, at) => {
    const early = Math.min(0, before[at]!);
    if (late > 0) first = Math.min(first, early / (early - late));
  });
  return first;
}

function landing(plan: Plan, segment: Segment, offset: number): number {
  if (plan.grid <= 0) return segment.length;
  const next = Math.floor((segment.base + offset) / plan.grid + 1 + 1e-6) * plan.grid;
  return Math.min(segment.length, next - segment.base);
}

function longestStep({ sources }: Machine, plan: Plan): number {
  let longest = plan.maxStep;
  for (const { element, fixed } of sources) {
    if (fixed === undefined) longest = Math.min(longest, waveStepLimit(element.wave));
  }
  return longest;
}

/** A step in which no state moves by more than a twentieth of itself, at the rates of the start. */
function firstStep({ machine, state, rates }: Integrator): number {
  const { capacitors, inductors } = machine;
  let length = Infinity;
  state.forEach((value, j) => {
    const inductor = inductors[j - capacitors.length];
    const least = inductor === undefined ? ABSOLUTE_VOLTS : ABSOLUTE_AMPERES * inductor.value;
    const rate = Math.abs(rates[0]![j]!);
    if (rate > 0) length = Math.min(length, (0.05 * (Math.abs(value) + 1e6 * least)) / rate);
  });
  return Math.max(10 * INSTANT, length);
}
