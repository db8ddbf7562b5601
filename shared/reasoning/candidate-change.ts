import type { CircuitChange } from '../engine/circuit/circuit-change.ts';
import { bothChanges, changeAtRest, noChange } from '../engine/circuit/circuit-change.ts';
import { leadElements, mounting, partElements } from '../oven/assemble.ts';
import type { OvenDefinition, OvenPart } from '../oven/oven.ts';
import type { DrawnOven, OvenState } from '../oven/oven-state.ts';

/**
 * What turns the parts' share of the circuit from one state into another: of parts that a fault is
 * on, that something has opened, or that a hand presses.
 */
export const changeOfParts = (
  oven: DrawnOven,
  from: OvenState,
  to: OvenState,
): CircuitChange | null =>
  oven.definition.parts
    .filter(({ ref }) => isFaulty(to, ref) || to.opened.includes(ref) || to.pressed.includes(ref))
    .map((part) => changeOfPart(part, oven, from, to))
    .reduce(joined, noChange);

export const changeOfPart = (
  part: OvenPart,
  oven: DrawnOven,
  from: OvenState,
  to: OvenState,
): CircuitChange | null =>
  changeAtRest(partElements(part, oven, from), partElements(part, oven, to));

/** The leads' share and the spots cleaned, which are the same for every drawn oven. */
export const changeOfLeads = (
  { leads, parts }: OvenDefinition,
  from: OvenState,
  to: OvenState,
): CircuitChange | null => {
  const moved = movedLeads(from, to);
  const ofLeads = leads
    .filter(({ ref }) => isFaulty(to, ref) || moved.includes(ref))
    .map((lead) => changeAtRest(leadElements(lead, from), leadElements(lead, to)));
  const ofSpots = parts
    .filter(({ ref }) => to.cleaned.some((spot) => spot.startsWith(`${ref}.`)))
    .map((part) => changeAtRest(mounting(part, from), mounting(part, to)));
  return [...ofLeads, ...ofSpots].reduce(joined, noChange);
};

const isFaulty = ({ faults }: OvenState, ref: string): boolean =>
  faults.some(({ on }) => on === ref);

/** Leads of which an end sits elsewhere. */
const movedLeads = (from: OvenState, to: OvenState): string[] =>
  Object.keys(to.leadEnds)
    .filter((end) => from.leadEnds[end] !== to.leadEnds[end])
    .map((end) => end.slice(0, -2));

export const joined = (
  first: CircuitChange | null,
  second: CircuitChange | null,
): CircuitChange | null => first && second && bothChanges(first, second);
