import { faultsOf } from '../oven/check-faults.ts';
import type { AppliedFault } from '../oven/fault.ts';
import type { OvenDefinition, PartKindName } from '../oven/oven.ts';
import type { Candidate } from './candidate.ts';
import { noFault } from './candidate.ts';
import { singleFaults } from './single-faults.ts';

export interface Weighed {
  readonly candidate: Candidate;
  /** prior probability; all of a list sum to 1 */ readonly prior: number;
}

/**
 * How often a part is what is wrong, against the others; the weights of its own faults share it.
 * Common practice, no source: read off the relative frequencies of FACTS section 9.
 */
const partWeights: Partial<Record<PartKindName, number>> = {
  fuse: 6,
  'door-switch': 10,
  magnetron: 14,
  'hv-diode': 9,
  'hv-capacitor': 8,
  'hv-transformer': 6,
  'cut-out': 4,
  relay: 4,
  'control-board': 6,
  'board-transformer': 3,
};
const otherPart = 2;
const lead = 0.4;
/** Prior of an oven with nothing wrong, and of all pairs together. Judgement. */
const NO_FAULT = 0.03;
const PAIRS = 0.05;
/** Share of a part's fault that has blown the fuse before the oven came in. Judgement. */
const BLOWN = 0.3;

function weightOf(definition: OvenDefinition, { on, fault }: AppliedFault): number {
  const kinds = faultsOf(definition, on) ?? [];
  const sum = kinds.reduce((total, { weight }) => total + weight, 0);
  const own = kinds.find(({ id }) => id === fault)?.weight ?? 0;
  const part = definition.parts.find(({ ref }) => ref === on);
  return ((part ? (partWeights[part.kind] ?? otherPart) : lead) * own) / Math.max(sum, 1e-9);
}

/**
 * No fault, every single fault, each part's fault once more with the line fuse it may have blown, and
 * the `pairs` likeliest pairs of faults on different parts.
 */
export function weighedCandidates(definition: OvenDefinition, pairs = 20): Weighed[] {
  const fuses = definition.parts.filter(({ kind }) => kind === 'fuse').map(({ ref }) => ref);
  const isPart = (on: string): boolean => definition.parts.some(({ ref }) => ref === on);
  const singles = singleFaults(definition).map((fault) => ({
    fault,
    weight: weightOf(definition, fault),
  }));
  const single = singles.flatMap(({ fault, weight }): Weighed[] => {
    const alone = { faults: [fault], opened: [] };
    if (fuses.length === 0 || fuses.includes(fault.on) || !isPart(fault.on))
      return [{ candidate: alone, prior: weight }];
    return [
      { candidate: alone, prior: (1 - BLOWN) * weight },
      { candidate: { ...alone, opened: fuses }, prior: BLOWN * weight },
    ];
  });
  return [
    { candidate: noFault, prior: NO_FAULT },
    ...scaled(single, 1 - NO_FAULT - (pairs > 0 ? PAIRS : 0)),
    ...scaled(likeliestPairs(singles, pairs), PAIRS),
  ];
}

function likeliestPairs(
  singles: readonly { fault: AppliedFault; weight: number }[],
  count: number,
): Weighed[] {
  // The likeliest pairs are among the likeliest singles.
  const likely = [...singles].sort((p, q) => q.weight - p.weight).slice(0, 2 * count);
  return likely
    .flatMap((first, at) =>
      likely
        .slice(at + 1)
        .filter((second) => second.fault.on !== first.fault.on)
        .map((second) => ({
          candidate: { faults: [first.fault, second.fault], opened: [] },
          prior: first.weight * second.weight,
        })),
    )
    .sort((p, q) => q.prior - p.prior)
    .slice(0, count);
}

function scaled(all: readonly Weighed[], to: number): Weighed[] {
  const sum = all.reduce((total, { prior }) => total + prior, 0);
  return all.map(({ candidate, prior }) => ({ candidate, prior: (to * prior) / sum }));
}
