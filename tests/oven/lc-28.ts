import { readFileSync } from 'node:fs';
import { operatingPoint } from '../../shared/engine/analyses/operating-point.ts';
import type { OperatingPoint } from '../../shared/engine/circuit/circuit.ts';
import { exactMeter } from '../../shared/instruments/draw-meter.ts';
import { manual2000 } from '../../shared/instruments/manual-2000.ts';
import { meterBranch } from '../../shared/instruments/meter-branch.ts';
import type { MeterDefinition, MeterUnit, Reading } from '../../shared/instruments/meter.ts';
import { read } from '../../shared/instruments/read.ts';
import { assemble, nodeOf } from '../../shared/oven/assemble.ts';
import { nominalOven } from '../../shared/oven/draw.ts';
import type { AppliedFault } from '../../shared/oven/fault.ts';
import { asFitted } from '../../shared/oven/initial-state.ts';
import type { OvenDefinition } from '../../shared/oven/oven.ts';
import type { BenchBranch, DrawnOven, OvenState } from '../../shared/oven/oven-state.ts';
import { parseOven } from '../../shared/oven/parse-oven.ts';

const file = new URL('../../scenarios/ovens/larkfield-lc-28.json', import.meta.url);

/** The file as it lies there, a fresh copy each time. */
export const lc28Json = (): unknown => JSON.parse(readFileSync(file, 'utf8'));

function load(): OvenDefinition {
  const parsed = parseOven(lc28Json());
  if (!parsed.ok) throw new Error(parsed.problems.map(({ message }) => message).join('\n'));
  return parsed.oven;
}

export const lc28 = load();
export const nominal = nominalOven(lc28);

/** Door open, nothing lifted unless said. */
export function cold(
  change: Partial<OvenState> & { lift?: readonly string[] } = {},
  faults: readonly AppliedFault[] = [],
): OvenState {
  const { lift = [], ...rest } = change;
  const fitted = asFitted(lc28, faults);
  const leadEnds = { ...fitted.leadEnds, ...rest.leadEnds };
  for (const end of lift) leadEnds[end] = null;
  return { ...fitted, isDoorClosed: false, ...rest, leadEnds };
}

/** Operating point, or a thrown message: a bench state that cannot be solved is a bug. */
export function solve(
  state: OvenState,
  branches: readonly BenchBranch[],
  oven: DrawnOven = nominal,
): OperatingPoint {
  const solved = operatingPoint(assemble(oven, state, branches));
  if (!solved.ok) throw new Error(solved.failure.message);
  return solved.value;
}

/** V between two targets. */
export function voltsBetween(
  state: OvenState,
  red: string,
  black: string,
  branches: readonly BenchBranch[],
  oven: DrawnOven = nominal,
): number {
  const { voltages } = solve(state, branches, oven);
  const at = (target: string) => voltages[nodeOf(state, target)] ?? Number.NaN;
  return at(red) - at(black);
}

export interface Probe {
  state: OvenState;
  red: string;
  black: string;
  setting: string;
  oven?: DrawnOven;
  meter?: MeterDefinition;
  unit?: MeterUnit;
  readingNumber?: number;
  relative?: number;
}

/** The settled reading of a meter across two targets. */
export function settled(probe: Probe): Reading {
  const { state, red, black, setting, oven = nominal, meter = manual2000 } = probe;
  const branch = meterBranch(meter, setting, red, black);
  const volts = voltsBetween(state, red, black, branch ? [branch] : [], oven);
  return read({
    meter,
    unit: probe.unit ?? exactMeter(),
    settingId: setting,
    trace: { time: [0, 1], volts: [volts, volts] },
    lagState: null,
    relative: probe.relative ?? null,
    readingNumber: probe.readingNumber ?? 0,
  }).reading;
}

/** Ohm between two targets as an ideal 1 µA ohmmeter of 1 V would find them. */
export function ohmsBetween(state: OvenState, red: string, black: string, source = 1e6): number {
  const branch = { name: 'ohmmeter', from: red, to: black, resistance: source, volts: 1 };
  const volts = voltsBetween(state, red, black, [branch]);
  return (volts / (1 - volts)) * source;
}
