import { poweredRun, standing } from '../bench/powered-run/powered-run.ts';
import type { RunOutcome } from '../bench/record.ts';
import { exactMeter } from '../instruments/draw-meter.ts';
import { manual2000 } from '../instruments/manual-2000.ts';
import type { Reading } from '../instruments/meter.ts';
import { faultsOf } from '../oven/check-faults.ts';
import { nominalOven } from '../oven/draw.ts';
import type { AppliedFault, FaultKind } from '../oven/fault.ts';
import type { OvenDefinition, ServiceMeasurement } from '../oven/oven.ts';
import type { DrawnOven } from '../oven/oven-state.ts';
import { noFault } from './candidate.ts';
import { changeOfLeads, changeOfParts, joined } from './candidate-change.ts';
import { fitted, inPosition, positionOf } from './position.ts';
import type { PredictionBase } from './prediction.ts';
import { predict, predictionBase, probingOf } from './prediction.ts';

/** What one fault does to an oven at its nominal values: measured cold, seen, and run. */
export interface CatalogueEntry {
  readonly fault: AppliedFault;
  readonly kind: FaultKind;
  /** service-data points where the display is not the good oven's */
  readonly readings: readonly {
    readonly line: ServiceMeasurement;
    readonly good: string;
    readonly faulty: string;
  }[];
  readonly run: RunOutcome;
  readonly runsByItself: boolean;
  /** fuses that the door's opening blows while the oven stands plugged in */
  readonly opensWithDoor: readonly string[];
}

export interface Catalogue {
  /** a run of the good oven */ readonly healthy: RunOutcome;
  entry(fault: AppliedFault): CatalogueEntry;
}

/** s; long enough for a fuse to melt on twice its rating and for the water to say how much heat there is */
const RUN_SECONDS = 60;

/** Computes entries one at a time: a run takes longer than all readings. */
export function catalogueOf(definition: OvenDefinition): Catalogue {
  const oven = nominalOven(definition);
  const base = predictionBase(oven, fitted(definition, noFault), manual2000, exactMeter());
  const run = (faults: readonly AppliedFault[]): RunOutcome =>
    poweredRun(oven, asPluggedIn(definition, faults), RUN_SECONDS);
  const good = definition.serviceData.map((line) => readingAt(base, [], line));
  return {
    healthy: run([]),
    entry: (fault) => ({
      fault,
      kind: kindOf(definition, fault),
      readings: definition.serviceData.flatMap((line, at) => {
        const faulty = readingAt(base, [fault], line);
        const [was, is] = [shownAs(good[at]!), shownAs(faulty)];
        return isOtherReading(good[at]!, faulty) ? [{ line, good: was, faulty: is }] : [];
      }),
      run: run([fault]),
      runsByItself: standing(oven, asPluggedIn(definition, [fault])).runsByItself ?? false,
      opensWithDoor: opensWithDoor(oven, fault),
    }),
  };
}

const opensWithDoor = (oven: DrawnOven, fault: AppliedFault): readonly string[] => {
  const shut = asPluggedIn(oven.definition, [fault]);
  if ((standing(oven, shut).opened ?? []).length > 0) return [];
  return standing(oven, { ...shut, isDoorClosed: false }).opened ?? [];
};

const asPluggedIn = (definition: OvenDefinition, faults: readonly AppliedFault[]) => ({
  ...fitted(definition, { faults, opened: [] }),
  isDoorClosed: true,
});

function readingAt(
  base: PredictionBase,
  faults: readonly AppliedFault[],
  line: ServiceMeasurement,
): Reading {
  const { definition }: DrawnOven = base.oven;
  const state = inPosition(fitted(definition, { faults, opened: [] }), positionOf(line));
  const change = joined(
    changeOfParts(base.oven, base.sound, state),
    changeOfLeads(definition, base.sound, state),
  );
  const probing = probingOf(base.meter, line.between, line.setting);
  return predict(base, change, () => state, [probing])[0]!;
}

/** A count is the last digit's own unrest. */
const isOtherReading = (p: Reading, q: Reading): boolean =>
  p.isOverRange !== q.isOverRange || Math.abs((p.counts ?? 0) - (q.counts ?? 0)) > 1;

const shownAs = ({ display, unit, isOverRange }: Reading): string =>
  isOverRange ? 'OL' : `${display} ${unit}`;

function kindOf(definition: OvenDefinition, { on, fault }: AppliedFault): FaultKind {
  const kind = faultsOf(definition, on)?.find(({ id }) => id === fault);
  if (!kind) throw new Error(`${on} has no fault ${fault}`);
  return kind;
}
