/**
 * The meter's own low-pass on its highest ohms ranges: tau y' = x - y.
 * Between two samples x is a straight line x0 + s t, so
 *   y(h) = (y0 - x0 + s tau) exp(-h / tau) + x0 + s (h - tau)   exactly.
 * Source: 0.8 s on 20 MOhm and up: ENGINE section 2; "a few seconds" in meter manuals, FACTS 4.2.
 */
import type { MeterDefinition, Setting, Trace } from './meter.ts';
import { settingOf } from './meters.ts';
import { exp } from '../engine/elementary/exponential.ts';

export const lagSecondsOf = (setting: Setting): number =>
  setting.function === 'ohms' ? (setting.lagSeconds ?? 0) : 0;

/** The trace behind the low-pass. `before`: V it held, null: it starts at the first sample. */
export function filtered({ time, volts }: Trace, tau: number, before: number | null): Trace {
  let held = before ?? volts[0] ?? 0;
  const out = volts.map((to, index) => {
    const from = volts[index - 1] ?? to;
    const width = (time[index] ?? 0) - (time[index - 1] ?? time[index] ?? 0);
    if (width <= 0) return held;
    const slope = (to - from) / width;
    held = (held - from + slope * tau) * exp(-width / tau) + from + slope * (width - tau);
    return held;
  });
  return { time, volts: out };
}

/** V that the meter's low-pass holds after the trace; null where the setting has none. */
export function lagAlong(
  meter: MeterDefinition,
  settingId: string,
  trace: Trace,
  before: number | null,
): number | null {
  const setting = settingOf(meter, settingId);
  const tau = setting ? lagSecondsOf(setting) : 0;
  if (tau === 0) return null;
  return filtered(trace, tau, before).volts.at(-1) ?? before;
}
