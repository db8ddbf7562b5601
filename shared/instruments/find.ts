/**
 * What a setting finds between its tips, SI, before the meter's own error.
 *   ohms: R = V / I with I = (Voc - V) / Rs: the ratio of the mean voltages across unknown and source
 *   diode: V at the jacks; DC: mean; AC: 1.1107 x mean of |v - mean| (average-responding), or rms
 *   capacitance: C = Im(Y) / w
 * Sources: ratiometric ohms and dual-slope mean: FACTS section 4.1; 1.1107 = pi / (2 sqrt 2).
 */
import { square } from '../engine/elementary/power.ts';
import type {
  ActiveSetting,
  DiodeSetting,
  MeterDefinition,
  OhmsSetting,
  Trace,
  VoltsSetting,
} from './meter.ts';
import { lastOf, mapped, meanOf, refined, splitLast } from './trace-window.ts';
import { filtered, lagSecondsOf } from './lag.ts';

/** s: a reading is the mean of this long */
export const WINDOW = 0.1;
/** s: finer than any mains half wave, for the exponential of the lag and for rectifying */
const FINE = 1e-3;
const FORM_FACTOR = Math.PI / (2 * Math.SQRT2);

export interface Found {
  trace: Trace;
  lagState: number | null;
  /** S at the capacitance setting's frequency */ admittance?: readonly [number, number];
}

function tipVolts(setting: OhmsSetting | DiodeSetting, { trace, lagState }: Found): number | null {
  if (trace.time.length === 0) return null;
  const tau = lagSecondsOf(setting);
  const { before, last } = splitLast(trace, WINDOW);
  if (tau === 0) return meanOf(last);
  const held = filtered(before, tau, lagState).volts.at(-1) ?? lagState;
  return meanOf(filtered(refined(last, FINE), tau, held));
}

function ohmsOf(setting: OhmsSetting, meter: MeterDefinition, found: Found): number {
  const volts = tipVolts(setting, found);
  if (volts === null || volts >= setting.openVolts) return Infinity;
  const current = (setting.openVolts - volts) / (setting.sourceOhms + meter.leadOhms);
  const own = setting.showsSourceOhms ? setting.sourceOhms : 0;
  return volts / current + meter.leadOhms + own;
}

function junctionVolts(setting: DiodeSetting, meter: MeterDefinition, found: Found): number {
  const volts = tipVolts(setting, found);
  if (volts === null) return Infinity;
  const current = (setting.openVolts - volts) / (setting.sourceOhms + meter.leadOhms);
  return volts + current * meter.leadOhms;
}

function alternating(setting: VoltsSetting, { trace }: Found): number {
  const window = refined(lastOf(trace, WINDOW), FINE);
  const mean = meanOf(window);
  if (setting.response === 'true-rms')
    return Math.sqrt(meanOf(mapped(window, (volts) => square(volts - mean))));
  return FORM_FACTOR * meanOf(mapped(window, (volts) => Math.abs(volts - mean)));
}

/** Ohm, V or F; Infinity: more than the setting can tell. */
export function find(setting: ActiveSetting, meter: MeterDefinition, found: Found): number {
  switch (setting.function) {
    case 'ohms':
    case 'beep':
      return ohmsOf(setting, meter, found);
    case 'diode':
      return junctionVolts(setting, meter, found);
    case 'dc-volts':
      return meanOf(lastOf(found.trace, WINDOW));
    case 'ac-volts':
      return alternating(setting, found);
    case 'capacitance': {
      const [, susceptance] = found.admittance ?? [0, 0];
      return susceptance / (2 * Math.PI * setting.stimulus.hertz);
    }
  }
}
