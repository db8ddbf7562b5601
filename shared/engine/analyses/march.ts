import type { EngineFailure } from '../circuit/circuit.ts';
import { fitStep, nextStep } from '../integration/step-control.ts';
import { firstStep } from './first-step.ts';
import type { Integrator } from './integrator.ts';
import { notConverged } from './newton.ts';
import { landing, longestStep, segmentEnds, type Plan } from './plan.ts';
import { stepError } from './step-error.ts';
import { INSTANT, acceptStep, hasJunctionTurned, refuseStep, settle, tryStep } from './steps.ts';
import { overdrives, turningAt } from './switch-turns.ts';

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
    const length = fitStep(
      walk.wanted,
      landing(plan, walk.base, walk.end, walk.offset) - walk.offset,
    );
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
  const at = walk.base + walk.offset;
  if (!tryStep(integrator, at, length, middle, plan.relativeTolerance)) {
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
  walk.wanted = Math.min(walk.longest, Math.max(shortest, next));
  if (turn <= 1) return 'turning';
  if (!hasTurned || walk.offset >= walk.end) return 'accepted';
  return settle(integrator, walk.base + walk.offset) ?? 'accepted';
}

function refuse(integrator: Integrator, walk: Walk, wanted: number): 'refused' {
  refuseStep(integrator);
  walk.refusals += 1;
  walk.wanted = Math.max(INSTANT, wanted);
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
