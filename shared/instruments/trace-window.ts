import type { Trace } from './meter.ts';

/** V at a time between the samples `after - 1` and `after`, on the straight line that joins them. */
function voltsAt({ time, volts }: Trace, at: number, after: number): number {
  const [t0, v0] = [time[after - 1] ?? at, volts[after - 1] ?? 0];
  const [t1, v1] = [time[after] ?? at, volts[after] ?? v0];
  return t1 === t0 ? v1 : v0 + ((v1 - v0) * (at - t0)) / (t1 - t0);
}

/** A trace in two: up to `seconds` before its end, and from there; the sample between is in both. */
export function splitLast(trace: Trace, seconds: number): { before: Trace; last: Trace } {
  const start = (trace.time.at(-1) ?? 0) - seconds;
  const kept = trace.time.findIndex((time) => time > start);
  if (kept <= 0) return { before: { time: [], volts: [] }, last: trace };
  const between = voltsAt(trace, start, kept);
  return {
    before: {
      time: [...trace.time.slice(0, kept), start],
      volts: [...trace.volts.slice(0, kept), between],
    },
    last: {
      time: [start, ...trace.time.slice(kept)],
      volts: [between, ...trace.volts.slice(kept)],
    },
  };
}

/** The last `seconds` of a trace, its start interpolated. */
export const lastOf = (trace: Trace, seconds: number): Trace => splitLast(trace, seconds).last;

/** The same trace with a sample at least every `step` s. */
export function refined({ time, volts }: Trace, step: number): Trace {
  const fine: { time: number[]; volts: number[] } = { time: [], volts: [] };
  time.forEach((t, index) => {
    const [t0, v0, v] = [time[index - 1] ?? t, volts[index - 1] ?? 0, volts[index] ?? 0];
    const parts = Math.max(1, Math.ceil((t - t0) / step));
    for (let part = 1; part < parts; part += 1) {
      fine.time.push(t0 + ((t - t0) * part) / parts);
      fine.volts.push(v0 + ((v - v0) * part) / parts);
    }
    fine.time.push(t);
    fine.volts.push(v);
  });
  return fine;
}

/** Mean over the whole trace, exact for straight lines between samples; 0 for an empty one. */
export function meanOf({ time, volts }: Trace): number {
  const span = (time.at(-1) ?? 0) - (time[0] ?? 0);
  if (span <= 0) return volts.at(-1) ?? 0;
  let area = 0;
  for (let index = 1; index < time.length; index += 1) {
    const width = (time[index] ?? 0) - (time[index - 1] ?? 0);
    area += (width * ((volts[index] ?? 0) + (volts[index - 1] ?? 0))) / 2;
  }
  return area / span;
}

/** The trace with each sample replaced. */
export const mapped = ({ time, volts }: Trace, change: (volts: number) => number): Trace => ({
  time,
  volts: volts.map(change),
});

/** Largest magnitude in the trace, V. */
export const peakOf = ({ volts }: Trace): number =>
  volts.reduce((peak, sample) => Math.max(peak, Math.abs(sample)), 0);
