import { seededUniform } from '../engine/quantities/seeded-uniform.ts';
import type { MeterDefinition, MeterFunction, MeterUnit } from './meter.ts';

const functions: readonly MeterFunction[] = [
  'off',
  'ohms',
  'beep',
  'diode',
  'dc-volts',
  'ac-volts',
  'capacitance',
];

const byFunction = (share: (name: MeterFunction) => number) =>
  Object.fromEntries(functions.map((name) => [name, share(name)])) as MeterUnit['gain'];

/** Share of the spec a new meter uses up: the rest is left for age and rounding. Judgement. */
const GAIN_SHARE = 0.7;
const OFFSET_SHARE = 0.3;
/** Counts: a last digit that stands between two values moves now and then. Judgement. */
const NOISE = 0.3;

/** The meter handed out in one attempt: its own gain and offset error by function, inside its spec. */
export function drawMeter(meter: MeterDefinition, seed: number): MeterUnit {
  const spread = (what: string, name: MeterFunction) =>
    2 * seededUniform(seed, `${meter.id}.${what}.${name}`) - 1;
  return {
    seed,
    gain: byFunction((name) => GAIN_SHARE * spread('gain', name)),
    offset: byFunction((name) => OFFSET_SHARE * spread('offset', name)),
    noise: NOISE,
  };
}

/** A meter without error or noise of its own: for worked numbers. */
export function exactMeter(seed = 0): MeterUnit {
  return { seed, gain: byFunction(() => 0), offset: byFunction(() => 0), noise: 0 };
}
