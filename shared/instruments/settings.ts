import type { CapacitanceSetting, OhmsSetting, Scale, Spec, VoltsSetting } from './meter.ts';

/** Ranges of one meter are written as short lines through these. `full` is the number of counts above which it shows OL. */

export const scale = (unit: string, size: number, decimals: number, maxCounts: number): Scale => ({
  unit,
  size,
  decimals,
  maxCounts,
});

export const spec = (percent: number, digits: number): Spec => ({ percent, digits });

export const ohms = (
  id: string,
  name: string,
  source: { volts: number; ohms: number },
  shown: Scale,
  error: Spec,
  more: Partial<Pick<OhmsSetting, 'lagSeconds' | 'showsSourceOhms'>> = {},
): OhmsSetting => ({
  id: `ohms-${id}`,
  dial: 'ohms',
  name,
  function: 'ohms',
  openVolts: source.volts,
  sourceOhms: source.ohms,
  scale: shown,
  spec: error,
  ...more,
});

export const volts = (
  kind: 'dc' | 'ac',
  id: string,
  name: string,
  shown: Scale,
  error: Spec,
  response?: VoltsSetting['response'],
): VoltsSetting => ({
  id: `${kind}-${id}`,
  dial: kind,
  name,
  function: kind === 'dc' ? 'dc-volts' : 'ac-volts',
  inputOhms: 10e6,
  scale: shown,
  spec: error,
  response,
});

export const capacitance = (
  id: string,
  name: string,
  shown: Scale,
  error: Spec,
): CapacitanceSetting => ({
  id: `capacitance-${id}`,
  dial: 'capacitance',
  name,
  function: 'capacitance',
  stimulus: { volts: 1, hertz: 400 },
  inputOhms: 20e3,
  scale: shown,
  spec: error,
});
