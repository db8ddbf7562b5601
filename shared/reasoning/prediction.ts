import type { MeterPort } from '../engine/analyses/port-reduction.ts';
import { reduce } from '../engine/analyses/port-reduction.ts';
import type { Variations } from '../engine/analyses/port-variation.ts';
import { variations } from '../engine/analyses/port-variation.ts';
import type { CircuitChange } from '../engine/circuit/circuit-change.ts';
import type { MeterDefinition, MeterUnit, Reading } from '../instruments/meter.ts';
import { meterBranch } from '../instruments/meter-branch.ts';
import { read } from '../instruments/read.ts';
import { assemble, nodeOf } from '../oven/assemble.ts';
import type { TargetRef } from '../oven/oven.ts';
import type { DrawnOven, OvenState } from '../oven/oven-state.ts';

/** Where the tips are, what the meter is set to, and what it then puts between them. */
export interface Probing {
  readonly red: TargetRef;
  readonly black: TargetRef;
  readonly setting: string;
  /** null: off, nothing */ readonly port: MeterPort | null;
}

export function probingOf(
  meter: MeterDefinition,
  [red, black]: readonly [TargetRef, TargetRef],
  setting: string,
): Probing {
  const branch = meterBranch(meter, setting, red, black);
  const port = branch && { openVolts: branch.volts, sourceResistance: branch.resistance };
  return { red, black, setting, port };
}

/** One drawn oven with a drawn meter, in one position, without a fault: solved once for all candidates. */
export interface PredictionBase {
  readonly oven: DrawnOven;
  readonly sound: OvenState;
  readonly unit: MeterUnit;
  readonly meter: MeterDefinition;
  readonly solved: Variations;
}

/** Throws where the circuit has no operating point: no legal oven state is such (a property test holds it). */
export function predictionBase(
  oven: DrawnOven,
  sound: OvenState,
  meter: MeterDefinition,
  unit: MeterUnit,
): PredictionBase {
  const solved = variations(assemble(oven, sound, []));
  if (!solved.ok) throw new Error(`prediction: ${solved.failure.message}`);
  return { oven, sound, unit, meter, solved: solved.value };
}

/**
 * The settled readings of these probings with a candidate in the oven: the same circuit, the same
 * meter code and the same last digit as on the bench. `change` is what the candidate does to the
 * base's circuit; null, or a change with no answer, has the candidate's own circuit solved whole.
 */
export function predict(
  base: PredictionBase,
  change: CircuitChange | null,
  faulty: () => OvenState,
  probings: readonly Probing[],
  readingNumber = 0,
): Reading[] {
  const isGrafted = change !== null && base.solved.vary(change);
  return probings.map(({ red, black, setting, port }) => {
    if (port === null) return displayOf(base, setting, [], [], readingNumber);
    const grafted = isGrafted
      ? base.solved.probe(nodeOf(base.sound, red), nodeOf(base.sound, black), port)
      : undefined;
    const volts = grafted?.volts ?? solvedWhole(base, faulty(), [red, black], port);
    // A voltage that has stood long enough is a trace of one sample.
    return displayOf(base, setting, atOnce, [volts], readingNumber);
  });
}

const atOnce = [0];

function solvedWhole(
  { oven }: PredictionBase,
  state: OvenState,
  [red, black]: readonly [TargetRef, TargetRef],
  meter: MeterPort,
): number {
  const reduced = reduce(assemble(oven, state, []));
  if (!reduced.ok) throw new Error(`prediction: ${reduced.failure.message}`);
  const probed = reduced.value.probe(nodeOf(state, red), nodeOf(state, black), meter);
  if (!probed.ok) throw new Error(`prediction: ${probed.failure.message}`);
  return probed.value.volts;
}

const displayOf = (
  { meter, unit }: PredictionBase,
  settingId: string,
  time: readonly number[],
  volts: readonly number[],
  readingNumber: number,
): Reading =>
  read({
    meter,
    unit,
    settingId,
    trace: { time, volts },
    lagState: null,
    relative: null,
    readingNumber,
  }).reading;
