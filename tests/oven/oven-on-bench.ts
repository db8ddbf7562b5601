import { readFileSync } from 'node:fs';
import { operatingPoint } from '../../shared/engine/analyses/operating-point.ts';
import { exactMeter } from '../../shared/instruments/draw-meter.ts';
import { manual2000 } from '../../shared/instruments/manual-2000.ts';
import { meterBranch } from '../../shared/instruments/meter-branch.ts';
import type { MeterUnit, Reading } from '../../shared/instruments/meter.ts';
import { read } from '../../shared/instruments/read.ts';
import { assemble, nodeOf } from '../../shared/oven/assemble.ts';
import { nominalOven } from '../../shared/oven/draw.ts';
import type { AppliedFault } from '../../shared/oven/fault.ts';
import { asFitted } from '../../shared/oven/initial-state.ts';
import type { OvenDefinition, ServiceMeasurement } from '../../shared/oven/oven.ts';
import type { DrawnOven, OvenState } from '../../shared/oven/oven-state.ts';
import { parseOven } from '../../shared/oven/parse-oven.ts';

export const ovenJson = (id: string): unknown =>
  JSON.parse(readFileSync(`scenarios/ovens/${id}.json`, 'utf8'));

/** The oven as the server reads it; every mistake of its file in the message. */
export function loadOven(id: string): OvenDefinition {
  const parsed = parseOven(ovenJson(id));
  if (!parsed.ok)
    throw new Error(parsed.problems.map(({ path, message }) => `${path}: ${message}`).join('\n'));
  return parsed.oven;
}

export interface Probed {
  red: string;
  black: string;
  setting: string;
  oven?: DrawnOven;
  unit?: MeterUnit;
  readingNumber?: number;
}

/** Readings of one oven on the bench, cord out and door open. */
export function onBench(definition: OvenDefinition) {
  const nominal = nominalOven(definition);
  const cold = (
    { lift = [], ...change }: Partial<OvenState> & { lift?: readonly string[] } = {},
    faults: readonly AppliedFault[] = [],
  ): OvenState => {
    const fitted = asFitted(definition, faults);
    const leadEnds = { ...fitted.leadEnds, ...change.leadEnds };
    for (const end of lift) leadEnds[end] = null;
    return { ...fitted, isDoorClosed: false, ...change, leadEnds };
  };
  const settled = (state: OvenState, probed: Probed): Reading => {
    const { red, black, setting, oven = nominal } = probed;
    const branch = meterBranch(manual2000, setting, red, black);
    const solved = operatingPoint(assemble(oven, state, branch ? [branch] : []));
    if (!solved.ok) throw new Error(solved.failure.message);
    const at = (target: string) => solved.value.voltages[nodeOf(state, target)] ?? Number.NaN;
    const volts = at(red) - at(black);
    return shownFor(setting, volts, probed);
  };
  return { definition, nominal, cold, settled };
}

export type OnBench = ReturnType<typeof onBench>;

/** What the manual meter shows of a voltage that stands between its tips. */
export const shownFor = (
  settingId: string,
  volts: number,
  { unit = exactMeter(), readingNumber = 0 }: Pick<Probed, 'unit' | 'readingNumber'> = {},
): Reading =>
  read({
    meter: manual2000,
    unit,
    settingId,
    trace: { time: [0, 1], volts: [volts, volts] },
    lagState: null,
    relative: null,
    readingNumber,
  }).reading;

const display = { Ω: 1, kΩ: 1e3, MΩ: 1e6 } as const;

/** Whether a reading is what a line of service data expects of a good part. */
export function isGood(line: ServiceMeasurement, reading: Reading): boolean {
  switch (line.expect) {
    case 'open':
      return reading.isOverRange;
    case 'beep':
      return reading.isBeeping;
    case 'range': {
      if (reading.value === null) return false;
      const shown = reading.value / display[line.unit as keyof typeof display];
      return shown >= (line.low ?? -Infinity) && shown <= (line.high ?? Infinity);
    }
  }
}
