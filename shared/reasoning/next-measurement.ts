import type { OvenDefinition, ServiceMeasurement } from '../oven/oven.ts';
import type { AtBench } from './bench-work.ts';
import { isSafe, secondsTo } from './bench-work.ts';
import type { Outcomes } from './outcomes.ts';
import { expectedFall } from './posterior.ts';

export interface NextMeasurement {
  /** place of its line */ readonly line: number;
  /** bits expected */ readonly bits: number;
  /** s of bench work */ readonly seconds: number;
}

export interface Knowledge {
  readonly definition: OvenDefinition;
  readonly lines: readonly ServiceMeasurement[];
  readonly outcomes: readonly Outcomes[];
}

/** bits; less is not worth a hand's move. */
const WORTH = 0.01;

const nothing: ReadonlySet<number> = new Set();

/** Every measurement that is safe now and expected to tell something, the most told per second first; those `done` tell it no more. */
export function rankedMeasurements(
  { definition, lines, outcomes }: Knowledge,
  weights: readonly number[],
  at: AtBench,
  done: ReadonlySet<number> = nothing,
): NextMeasurement[] {
  return lines
    .map((line, place) => ({
      line: place,
      bits:
        !done.has(place) && isSafe(definition, at, line)
          ? expectedFall(weights, outcomes[place]!)
          : 0,
      seconds: secondsTo(at, line),
    }))
    .filter(({ bits }) => bits > WORTH)
    .sort((p, q) => q.bits / q.seconds - p.bits / p.seconds);
}

/** The largest expected fall in entropy per second of bench work; null: nothing safe tells more. */
export const nextMeasurement = (
  knowledge: Knowledge,
  weights: readonly number[],
  at: AtBench,
): NextMeasurement | null => rankedMeasurements(knowledge, weights, at)[0] ?? null;
