import type { MeterDefinition } from '../instruments/meter.ts';
import type { AppliedFault } from '../oven/fault.ts';
import type { OvenDefinition } from '../oven/oven.ts';
import type { Candidate } from './candidate.ts';
import type { Weighed } from './candidates.ts';
import { MAKE_SAFE_SECONDS } from './bench-work.ts';
import { partition } from './partition.ts';
import { shortestRoute } from './route.ts';
import { studyOf } from './study.ts';

/** What an author wants to know of a scenario's faults before it is published. */
export interface ToldApart {
  /** faults that no line of the service data tells from the scenario's own */
  readonly alike: readonly (readonly AppliedFault[])[];
  /** all groups of faults and how many there are */ readonly groups: number;
  readonly candidates: number;
  readonly makeSafeSeconds: number;
  readonly route: readonly {
    readonly label: string;
    readonly seconds: number;
    readonly left: number;
  }[];
  /** s */ readonly seconds: number;
  /** whether the route ends at the scenario's faults or what cannot be told from them */
  readonly isFound: boolean;
}

/** Probability given to an author's own set of faults where it is none of the usual candidates. */
const OWN = 1e-4;

/** Finds what can be told apart by service data from these faults, and the shortest safe route to them. */
export function toldApart(
  definition: OvenDefinition,
  meter: MeterDefinition,
  faults: readonly AppliedFault[],
): ToldApart {
  const own: Weighed = { candidate: { faults, opened: [] }, prior: OWN };
  const { weighed, priors, knowledge } = studyOf(definition, meter, [], [own]);
  const truth = weighed.length - 1;
  const group = partition(knowledge.outcomes, weighed.length);
  const isSought = (candidate: number): boolean => group[candidate] === group[truth];
  const keys = weighed.map(({ candidate }) => keyOf(candidate.faults));
  const count = (candidates: ReadonlySet<number>): number =>
    new Set([...candidates].map((c) => keys[c])).size;
  const route = shortestRoute(knowledge, priors, truth, isSought, count);
  const { steps, seconds, certainty } = route;
  const alike = weighed.filter((_, c) => isSought(c)).map(({ candidate }) => candidate);
  return {
    alike: distinct(alike, faults),
    groups: new Set(group).size,
    candidates: new Set(keys).size,
    makeSafeSeconds: MAKE_SAFE_SECONDS,
    route: steps.map(({ line, seconds: takes, left }) => ({
      label: knowledge.lines[line]!.label,
      seconds: takes,
      left,
    })),
    seconds,
    isFound: certainty >= 0.95,
  };
}

/** Where a fault is and which it is; its values do not matter here. */
const keyOf = (faults: readonly AppliedFault[]): string =>
  faults
    .map(({ on, fault }) => `${on} ${fault}`)
    .sort()
    .join(' + ');

function distinct(
  candidates: readonly Candidate[],
  own: readonly AppliedFault[],
): (readonly AppliedFault[])[] {
  const met = new Set([keyOf(own)]);
  return candidates.flatMap(({ faults }) => {
    const key = keyOf(faults);
    if (met.has(key)) return [];
    met.add(key);
    return [faults];
  });
}
