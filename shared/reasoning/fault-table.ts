import type { CircuitChange } from '../engine/circuit/circuit-change.ts';
import { noChange } from '../engine/circuit/circuit-change.ts';
import { drawMeter } from '../instruments/draw-meter.ts';
import type { MeterDefinition } from '../instruments/meter.ts';
import { drawOven } from '../oven/draw.ts';
import type { OvenDefinition, OvenPart, ServiceMeasurement } from '../oven/oven.ts';
import type { DrawnOven, OvenState } from '../oven/oven-state.ts';
import type { Candidate } from './candidate.ts';
import { noFault } from './candidate.ts';
import { changeOfLeads, changeOfPart, joined } from './candidate-change.ts';
import type { Position } from './position.ts';
import { fitted, inPosition, positionKey, positionOf } from './position.ts';
import type { Probing } from './prediction.ts';
import { predict, predictionBase, probingOf } from './prediction.ts';

/** What `counts` holds where the display shows OL. */
export const OVER_RANGE = 0x7fffffff;

/** A line of service data, or what somebody measured somewhere else. */
export type Measured = Pick<ServiceMeasurement, 'between' | 'setting' | 'lift' | 'clean' | 'press'>;

/** The settled reading of every candidate at every measurement in every drawn oven. */
export interface FaultTable {
  readonly candidates: readonly Candidate[];
  readonly lines: readonly Measured[];
  readonly seeds: readonly number[];
  /** counts of the display, or OVER_RANGE: candidate by candidate, line by line, seed by seed */
  readonly counts: Int32Array;
}

export interface FaultTableInput {
  readonly definition: OvenDefinition;
  readonly candidates: readonly Candidate[];
  readonly lines: readonly Measured[];
  readonly seeds: readonly number[];
  readonly meter: MeterDefinition;
}

/** Lines that share a position, and what each candidate does to the leads in it. */
interface Group {
  readonly position: Position;
  /** places of its lines */ readonly at: readonly number[];
  readonly probings: readonly Probing[];
  readonly ofLeads: readonly (CircuitChange | null)[];
}

/**
 * Computes the table. One factorisation of each drawn oven serves every candidate in every position:
 * a lead lifted, a spot cleaned, an actuator pressed and a fault are changes of the same circuit, and
 * what they do to it is found from the parts' own code, never from a list.
 */
export function faultTable(input: FaultTableInput): FaultTable {
  const { definition, candidates, lines, seeds, meter } = input;
  const counts = new Int32Array(candidates.length * lines.length * seeds.length);
  const ovens = candidates.map((candidate) => fitted(definition, candidate));
  const groups = groupsOf(input, ovens);
  const whole = fitted(definition, noFault);
  seeds.forEach((seed, s) => {
    const oven = drawOven(definition, seed);
    const unit = drawMeter(meter, seed);
    const ofParts = partChanges(oven, whole, candidates);
    const base = predictionBase(oven, whole, meter, unit);
    for (const group of groups) {
      for (let c = 0; c < candidates.length; c += 1) {
        const change = joined(ofParts(c, group), group.ofLeads[c] ?? null);
        const readings = predict(
          base,
          change,
          () => inPosition(ovens[c]!, group.position),
          group.probings,
        );
        readings.forEach((reading, g) => {
          const cell = (c * lines.length + group.at[g]!) * seeds.length + s;
          counts[cell] = reading.isOverRange ? OVER_RANGE : (reading.counts ?? 0);
        });
      }
    }
  });
  return { candidates, lines, seeds, counts };
}

/** Counts of one cell; OVER_RANGE for OL. */
export const countsAt = (
  table: FaultTable,
  candidate: number,
  line: number,
  seed: number,
): number => table.counts[(candidate * table.lines.length + line) * table.seeds.length + seed]!;

function groupsOf(
  { definition, lines, meter }: FaultTableInput,
  ovens: readonly OvenState[],
): Group[] {
  const byKey = new Map<string, number[]>();
  lines.forEach((line, at) => {
    const key = positionKey(positionOf(line));
    byKey.set(key, [...(byKey.get(key) ?? []), at]);
  });
  const whole = fitted(definition, noFault);
  return [...byKey.values()].map((at) => {
    const position = positionOf(lines[at[0]!]!);
    return {
      position,
      at,
      probings: at.map((one) => probingOf(meter, lines[one]!.between, lines[one]!.setting)),
      ofLeads: ovens.map((oven) => changeOfLeads(definition, whole, inPosition(oven, position))),
    };
  });
}

/** A part's circuit depends on the candidate by its own faults, and on the position by its own actuator. */
function partChanges(
  oven: DrawnOven,
  whole: OvenState,
  candidates: readonly Candidate[],
): (candidate: number, group: Group) => CircuitChange | null {
  const actuated = oven.definition.parts.filter(({ kind }) => kind === 'door-switch');
  const changesOf = (part: OvenPart, { faults, opened }: Candidate): PartChange => {
    const faulty = { ...whole, faults, opened };
    const held = { ...faulty, pressed: [part.ref] };
    return {
      ref: part.ref,
      free: changeOfPart(part, oven, whole, faulty),
      held: actuated.includes(part) ? changeOfPart(part, oven, whole, held) : null,
    };
  };
  const sound = actuated.map((part) => changesOf(part, noFault));
  const touched = candidates.map((candidate) =>
    oven.definition.parts
      .filter(({ ref }) => touches(candidate, ref))
      .map((part) => changesOf(part, candidate)),
  );
  return (at, { position: { pressed } }) => {
    let change: CircuitChange | null = noChange;
    for (const { ref, free, held } of touched[at]!)
      change = joined(change, pressed.includes(ref) ? held : free);
    if (pressed.length === 0) return change;
    for (const { ref, held } of sound)
      if (pressed.includes(ref) && !touches(candidates[at]!, ref)) change = joined(change, held);
    return change;
  };
}

/** What a part's share of the circuit becomes, its actuator free and held pressed. */
interface PartChange {
  readonly ref: string;
  readonly free: CircuitChange | null;
  readonly held: CircuitChange | null;
}

const touches = ({ faults, opened }: Candidate, ref: string): boolean =>
  opened.includes(ref) || faults.some(({ on }) => on === ref);
