import { settingOf } from '../instruments/meters.ts';
import { read } from '../instruments/read.ts';
import type { Reading, Trace } from '../instruments/meter.ts';
import { admittance } from './admittance.ts';
import { solveLive } from './live-volts.ts';
import type { BenchState } from './bench-state.ts';
import type { Passed } from './pass-time.ts';
import { pairOf, passTime } from './pass-time.ts';
import type { ShownReading } from './record.ts';
import type { Setup } from './setup.ts';
import { heldOtherwise, meterOnLeads } from './test-leads.ts';
import { magnitude } from '../engine/elementary/magnitude.ts';
import { sin } from '../engine/elementary/sine.ts';

/** ms between two readings: three a second. */
export const readingPeriod = 1000 / 3;
/** ms over which a reading must have stood to be called settled */
const settledOver = 500;

export interface MeterView {
  reading: Reading;
  isSettled: boolean;
}

/** What the display shows at the end of `passed`; null: meter off, dead, or a tip in the air. */
export function readMeter(setup: Setup, before: BenchState, passed: Passed): MeterView | null {
  const { state } = passed;
  if (state.meter.isDestroyed || state.meter.setting === 'off') return null;
  const { red, black } = state.probes;
  const connected = red !== null && black !== null;
  const now = connected ? withMains(setup, state, passed.trace) : openTrace;
  const reading = readTrace(setup, before, state.benchMs, now);
  const earlier = connected ? cutTrace(now, settledOver / 1000) : now;
  const previous = readTrace(setup, before, state.benchMs - settledOver, earlier);
  const isSettled =
    (now.time.at(-1) ?? 0) >= 0.1 &&
    reading.isOverRange === previous.isOverRange &&
    Math.abs((reading.counts ?? 0) - (previous.counts ?? 0)) <= 1;
  return { reading, isSettled };
}

/** What the display shows at `atMs`, counted from the last event. */
export const meterAt = (setup: Setup, state: BenchState, atMs: number): MeterView | null =>
  readMeter(setup, state, passTime(setup, state, atMs));

export const shown = (state: BenchState, view: MeterView): ShownReading | null => {
  const { red, black } = state.probes;
  if (!red || !black) return null;
  const { display, unit, value, isBeeping } = view.reading;
  return {
    red,
    black,
    setting: state.meter.setting,
    display,
    unit,
    value,
    isSettled: view.isSettled,
    isBeeping,
    isRelative: state.meter.relative !== null,
    ...heldOtherwise(state.holds),
  };
};

const readTrace = (setup: Setup, before: BenchState, atMs: number, trace: Trace): Reading =>
  read({
    meter: meterOnLeads(setup, before),
    unit: setup.unit,
    settingId: before.meter.setting,
    trace,
    lagState: before.meter.lag,
    relative: before.meter.relative,
    readingNumber: Math.max(0, Math.floor(atMs / readingPeriod)),
    ...admittanceOf(setup, before),
  }).reading;

/** What a capacitance setting needs beside the trace. */
function admittanceOf(setup: Setup, state: BenchState): { admittance?: readonly [number, number] } {
  const setting = settingOf(setup.meter, state.meter.setting);
  const { red, black } = state.probes;
  if (setting?.function !== 'capacitance' || !red || !black) return {};
  return { admittance: admittance(setup, state, [red, black], setting.stimulus.hertz) };
}

/** Tips in the air: nothing flows, and a volts input sits at zero. */
const openTrace: Trace = { time: [], volts: [] };

/** The trace as it was `seconds` before its end. */
function cutTrace(trace: Trace, seconds: number): Trace {
  const end = (trace.time.at(-1) ?? 0) - seconds;
  const kept = trace.time.findLastIndex((time) => time <= end);
  if (kept < 1) return { time: trace.time.slice(0, 1), volts: trace.volts.slice(0, 1) };
  return { time: trace.time.slice(0, kept + 1), volts: trace.volts.slice(0, kept + 1) };
}

/** Mains between the tips, over the last tenth of a second, on top of what is stored. */
function withMains(setup: Setup, state: BenchState, trace: Trace): Trace {
  const solved = solveLive(setup, state);
  const { red, black } = state.probes;
  if (!solved || !red || !black) return trace;
  const [a, b] = pairOf(state, red, black).map(solved);
  if (!a || !b) return trace;
  const peak = Math.SQRT2 * magnitude(a[0] - b[0], a[1] - b[1]);
  if (peak < 1e-3) return trace;
  const { hertz } = setup.oven.definition.supply;
  const standing = trace.volts.at(-1) ?? 0;
  const end = Math.max(trace.time.at(-1) ?? 0, 0.1);
  const time = Array.from({ length: 201 }, (_, i) => end - 0.1 + i * 0.0005);
  return {
    time,
    volts: time.map((t) => standing + peak * sin(2 * Math.PI * hertz * t)),
  };
}
