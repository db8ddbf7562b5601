/** A meter is data: what each setting puts on its terminals, how it shows what it finds, and its error. SI units. */

/** V between the red and the black tip against time in s, straight lines between samples. */
export interface Trace {
  time: readonly number[];
  volts: readonly number[];
}

export interface Scale {
  /** as on the display: `kΩ` */ unit: string;
  /** SI per displayed unit: 1e3 */ size: number;
  decimals: number;
  /** above this the display shows OL */ maxCounts: number;
}

/** ±(percent of reading + digits x last digit) */
export interface Spec {
  percent: number;
  digits: number;
}

interface SettingBase {
  id: string;
  /** the place of the dial; settings of one dial place are its ranges, lowest first */ dial: string;
  name: string;
  scale: Scale;
  spec: Spec;
}

export interface OhmsSetting extends SettingBase {
  function: 'ohms' | 'beep';
  /** V, tips open */ openVolts: number;
  /** Ohm in series with it */ sourceOhms: number;
  /** the display does not take its own source off: leads shorted read it */
  showsSourceOhms?: boolean;
  /** s, first-order low-pass before the converter */ lagSeconds?: number;
  /** Ohm */ beepsBelow?: number;
}

export interface DiodeSetting extends SettingBase {
  function: 'diode';
  openVolts: number;
  sourceOhms: number;
}

export interface VoltsSetting extends SettingBase {
  function: 'dc-volts' | 'ac-volts';
  inputOhms: number;
  /** of an AC setting: mean of the rectified wave shown as the rms of a sine, or true rms */
  response?: 'average' | 'true-rms';
}

export interface CapacitanceSetting extends SettingBase {
  function: 'capacitance';
  /** what it drives the tips with: V rms, Hz */ stimulus: { volts: number; hertz: number };
  /** Ohm, its load on standing charge */ inputOhms: number;
}

export interface OffSetting {
  id: 'off';
  dial: 'off';
  name: string;
  function: 'off';
}

export type Setting = OffSetting | OhmsSetting | DiodeSetting | VoltsSetting | CapacitanceSetting;
export type MeterFunction = Setting['function'];
export type ActiveSetting = Exclude<Setting, OffSetting>;

export interface MeterDefinition {
  id: string;
  name: string;
  /** counts of the display: 2000, 6000 */ counts: number;
  isAutoRanging: boolean;
  /** Ohm, both test leads together with their tips */ leadOhms: number;
  /** V peak: above `warning` a passive setting shows nonsense; above these the meter dies */
  limits: { warning: number; passive: number; any: number };
  settings: readonly Setting[];
}

/** One meter out of the box: its own error, as a share of its spec, by function. */
export interface MeterUnit {
  seed: number;
  /** -1 to 1, of the percent */ gain: Readonly<Record<MeterFunction, number>>;
  /** -1 to 1, of the digits */ offset: Readonly<Record<MeterFunction, number>>;
  /** counts, of its converter: moves the last digit by one at most */ noise: number;
}

export interface Reading {
  /** `94.8`, `-0.31`, `OL`; empty when the meter is off or dead */ display: string;
  unit: string;
  /** SI, as displayed; null: no number */ value: number | null;
  counts: number | null;
  decimals: number;
  isBeeping: boolean;
  isOverRange: boolean;
  /** more than 30 V on a setting that must not see any: the reading is nonsense */ isWarning: boolean;
  isDestroyed: boolean;
}
