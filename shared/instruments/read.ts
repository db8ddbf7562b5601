import { seededUniform } from '../engine/quantities/seeded-uniform.ts';
import { find } from './find.ts';
import { lagAlong } from './lag.ts';
import type { ActiveSetting, MeterDefinition, MeterUnit, Reading, Trace } from './meter.ts';
import { settingOf } from './meters.ts';
import { peakOf } from './trace-window.ts';
import { powerOfTen } from '../engine/elementary/power.ts';

export interface ReadInput {
  meter: MeterDefinition;
  unit: MeterUnit;
  settingId: string;
  /** V between the tips since the lag state; empty: a tip is in the air */ trace: Trace;
  /** V the meter's low-pass held at the start of the trace; null: nothing yet */
  lagState: number | null;
  /** SI, what REL subtracts; null: off */ relative: number | null;
  /** counts readings, three a second: seeds the last digit */ readingNumber: number;
  /** S [re, im] between the tips at the frequency of a capacitance setting; absent: tips open */
  admittance?: readonly [number, number];
}

export interface ReadOutput {
  reading: Reading;
  lagState: number | null;
}

const nothing: Reading = {
  display: '',
  unit: '',
  value: null,
  counts: null,
  decimals: 0,
  isBeeping: false,
  isOverRange: false,
  isWarning: false,
  isDestroyed: false,
};

function shown(setting: ActiveSetting, counts: number): string {
  return (counts / powerOfTen(setting.scale.decimals)).toFixed(setting.scale.decimals);
}

function overRange(setting: ActiveSetting): Reading {
  const { unit, decimals } = setting.scale;
  return {
    display: 'OL',
    unit,
    value: null,
    counts: null,
    decimals,
    isBeeping: false,
    isOverRange: true,
    isWarning: false,
    isDestroyed: false,
  };
}

/** More than an ohmmeter may see: digits that mean nothing. */
function nonsense(setting: ActiveSetting, { unit, readingNumber }: ReadInput): Reading {
  const { scale } = setting;
  const share = 2 * seededUniform(unit.seed, `nonsense.${readingNumber}`) - 1;
  const display = shown(setting, Math.round(share * scale.maxCounts));
  return { ...nothing, display, unit: scale.unit, decimals: scale.decimals, isWarning: true };
}

function measured(setting: ActiveSetting, input: ReadInput): Reading {
  const { scale, spec } = setting;
  const { unit, relative, readingNumber } = input;
  const step = scale.size / powerOfTen(scale.decimals);
  const found = find(setting, input.meter, input);
  if (!Number.isFinite(found)) return overRange(setting);
  const gain = (unit.gain[setting.function] * spec.percent) / 100;
  const offset = unit.offset[setting.function] * (spec.digits - 1) * step;
  const value = found * (1 + gain) + offset;
  const noise = unit.noise * (2 * seededUniform(unit.seed, `${setting.id}.${readingNumber}`) - 1);
  const raw = Math.round(value / step + noise);
  if (Math.abs(raw) > scale.maxCounts) return overRange(setting);
  // `+ 0` turns a negative zero into zero.
  const counts = Math.round(value / step + noise - (relative ?? 0) / step) + 0;
  // A negative voltage lies below every limit too: only the beep setting sounds.
  const isBeeping = setting.function === 'beep' && value < (setting.beepsBelow ?? 0);
  // Written out: a spread costs fifty times as much, and a fault table makes hundreds of thousands.
  return {
    display: shown(setting, counts),
    unit: scale.unit,
    value: counts * step,
    counts,
    decimals: scale.decimals,
    isBeeping,
    isOverRange: false,
    isWarning: false,
    isDestroyed: false,
  };
}

/** What the display shows at the end of the trace, and what the meter's low-pass then holds. Pure. */
export function read(input: ReadInput): ReadOutput {
  const { meter, settingId, trace } = input;
  const lagState = lagAlong(meter, settingId, trace, input.lagState);
  const setting = settingOf(meter, settingId);
  if (!setting || setting.function === 'off') return { reading: nothing, lagState };
  const isPassive = setting.function !== 'dc-volts' && setting.function !== 'ac-volts';
  const peak = peakOf(trace);
  const { limits } = meter;
  if (peak > limits.any || (isPassive && peak > limits.passive))
    return { reading: { ...nothing, isDestroyed: true }, lagState };
  if (isPassive && peak > limits.warning) return { reading: nonsense(setting, input), lagState };
  return { reading: measured(setting, input), lagState };
}
