import { exactMeter } from '../../shared/instruments/draw-meter.ts';
import { manual2000 } from '../../shared/instruments/manual-2000.ts';
import { meterBranch } from '../../shared/instruments/meter-branch.ts';
import type { MeterDefinition, Reading, Trace } from '../../shared/instruments/meter.ts';
import type { ReadInput } from '../../shared/instruments/read.ts';
import { read } from '../../shared/instruments/read.ts';

export const steady = (volts: number): Trace => ({ time: [0, 1], volts: [volts, volts] });

/** V between the tips with a resistance of `ohms` there: the divider with the meter's own branch. */
export function tipVolts(
  ohms: number,
  settingId: string,
  meter: MeterDefinition = manual2000,
): number {
  const branch = meterBranch(meter, settingId, 'red', 'black');
  if (!branch) throw new Error(`${settingId} connects nothing`);
  if (ohms === Infinity) return branch.volts;
  return (branch.volts * ohms) / (ohms + branch.resistance);
}

/** What an exact manual meter shows for this trace. */
export function show(settingId: string, trace: Trace, more: Partial<ReadInput> = {}): Reading {
  return read({
    meter: manual2000,
    unit: exactMeter(),
    settingId,
    trace,
    lagState: null,
    relative: null,
    readingNumber: 0,
    ...more,
  }).reading;
}

export const showOhms = (settingId: string, ohms: number, more: Partial<ReadInput> = {}): Reading =>
  show(settingId, steady(tipVolts(ohms, settingId, more.meter)), more);

/** A periodic wave over 0.2 s, sampled finely; `shape` takes the phase in turns. */
export function wave(hertz: number, shape: (turns: number) => number): Trace {
  const time = Array.from({ length: 4001 }, (_, index) => index * 5e-5);
  return { time, volts: time.map((t) => shape(t * hertz)) };
}
