import type { RecordedEvent } from '../bench/event.ts';
import type { MeterDefinition } from '../instruments/meter.ts';
import type { OvenDefinition } from '../oven/oven.ts';
import type { AtBench } from './bench-work.ts';
import { atTheStart } from './bench-work.ts';
import { nextMeasurement } from './next-measurement.ts';
import { observations, type Observation } from './observations.ts';
import { positionOf } from './position.ts';
import { entropy, isConsistent, posterior } from './posterior.ts';
import { studyOf } from './study.ts';

/** What one captured reading left, beside what could have been measured in its place. */
export interface CurveStep {
  readonly sequence: number;
  readonly benchMs: number;
  readonly reading: Observation['reading'];
  /** faults, single or paired, that explain every reading so far */ readonly left: number;
  /** bits by which it lowered the doubt */ readonly bits: number;
  /** the measurement expected to tell most per second then; null: none worth it */
  readonly best: {
    readonly label: string;
    readonly bits: number;
    readonly seconds: number;
    /** faults it would have left on average */ readonly left: number;
  } | null;
}

export interface StepCurve {
  readonly start: number;
  readonly steps: readonly CurveStep[];
}

/** The faults left after each reading an attempt captured. */
export function stepCurve(
  definition: OvenDefinition,
  meter: MeterDefinition,
  events: readonly RecordedEvent[],
): StepCurve {
  const seen = observations(definition, meter, events);
  const study = studyOf(
    definition,
    meter,
    seen.map(({ measured }) => measured),
  );
  const keys = study.weighed.map(({ candidate: { faults } }) => JSON.stringify(faults));
  const count = (places: Iterable<number>): number =>
    new Set([...places].map((place) => keys[place])).size;
  let weights = study.priors;
  let consistent = [...keys.keys()];
  let at: AtBench = { ...atTheStart, isMadeSafe: true };
  const start = count(consistent);
  const steps = seen.map((one, place): CurveStep => {
    const outcomes = study.further[place]!;
    const found = outcomes.classOf(one.counts);
    const next = nextMeasurement(study.knowledge, weights, at);
    const could = next && study.knowledge.outcomes[next.line]!;
    const best = next && {
      label: study.knowledge.lines[next.line]!.label,
      bits: next.bits,
      seconds: next.seconds,
      left: could ? expectedLeft(weights, could, consistent, count) : 0,
    };
    const after = posterior(weights, outcomes, found);
    const bits = entropy(weights) - entropy(after);
    weights = after;
    consistent = consistent.filter((c) => isConsistent(outcomes, c, found));
    at = { ...at, position: positionOf(one.measured), tips: one.measured.between };
    const { sequence, benchMs, reading } = one;
    return { sequence, benchMs, reading, left: count(consistent), bits, best };
  });
  return { start, steps };
}

function expectedLeft(
  weights: readonly number[],
  outcomes: { shares: Float64Array; classes: number },
  consistent: readonly number[],
  count: (places: Iterable<number>) => number,
): number {
  let sum = 0;
  for (let seen = 0; seen < outcomes.classes; seen += 1) {
    const chance = weights.reduce(
      (total, weight, c) => total + weight * outcomes.shares[c * outcomes.classes + seen]!,
      0,
    );
    if (chance > 0)
      sum += chance * count(consistent.filter((c) => isConsistent(outcomes, c, seen)));
  }
  return sum;
}
