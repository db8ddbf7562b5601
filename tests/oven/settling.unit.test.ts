import { describe, expect, it } from 'vitest';
import { advance } from '../../shared/engine/analyses/advance.ts';
import type { Storage } from '../../shared/engine/circuit/circuit.ts';
import { exactMeter } from '../../shared/instruments/draw-meter.ts';
import { manual2000 } from '../../shared/instruments/manual-2000.ts';
import { meterBranch } from '../../shared/instruments/meter-branch.ts';
import type { Reading, Trace } from '../../shared/instruments/meter.ts';
import { settingOf } from '../../shared/instruments/meters.ts';
import { read } from '../../shared/instruments/read.ts';
import { assemble, nodeOf } from '../../shared/oven/assemble.ts';
import type { AppliedFault } from '../../shared/oven/fault.ts';
import type { DrawnOven } from '../../shared/oven/oven-state.ts';
import { cold, nominal, settled } from './lc-28.ts';

const empty: Storage = { voltages: {}, currents: {} };
const oneMicrofarad: DrawnOven = {
  ...nominal,
  values: { ...nominal.values, C1: { ...nominal.values['C1'], capacitance: 1e-6 } },
};
const apart = cold({ lift: ['W23/b', 'W24/a', 'W27/a'] });
const noBleeder = cold({ lift: ['W23/b', 'W24/a', 'W27/a'] }, [
  { on: 'C1', fault: 'bleeder-open' },
]);

interface Probing {
  setting: string;
  seconds: number;
  red?: string;
  black?: string;
  state?: typeof apart;
  storage?: Storage;
}

/** What the tips see from the moment they land, the whole oven around them. */
function land({ setting, seconds, red = 'C1.1', black = 'C1.2', ...more }: Probing): Trace {
  const { state = apart, storage = empty } = more;
  const branch = meterBranch(manual2000, setting, red, black);
  const circuit = assemble(oneMicrofarad, state, branch ? [branch] : []);
  const observe = [[nodeOf(state, red), nodeOf(state, black)]] as const;
  const passed = advance(circuit, storage, seconds, { observe });
  if (!passed.ok) throw new Error(passed.failure.message);
  const { time, values } = passed.value.samples;
  return { time, volts: values[0] ?? [] };
}

const show = (probing: Probing, lagState: number | null = null): Reading =>
  read({
    meter: manual2000,
    unit: exactMeter(),
    settingId: probing.setting,
    trace: land(probing),
    lagState,
    relative: null,
    readingNumber: 0,
  }).reading;

/** Ohm that the last moment of a trace shows on a setting: no window, no lag. */
function ohmsAtEnd(probing: Probing): number {
  const setting = settingOf(manual2000, probing.setting);
  if (setting?.function !== 'ohms') throw new Error('not an ohms setting');
  const volts = land(probing).volts.at(-1) ?? 0;
  return (volts / (setting.openVolts - volts)) * (setting.sourceOhms + 0.16);
}

describe('a capacitor on an ohms range', () => {
  // FACTS 4.3 (CALC): 1 uF with 10 MOhm on 20 MOhm (standard 10 MOhm), before the meter's own lag.
  it.each([
    [1, 0.997],
    [2, 1.974],
    [5, 4.62],
    [10, 7.62],
    [15, 9.05],
    [30, 9.95],
  ])('after %d s the ratio stands at %d MOhm', (seconds, megohms) => {
    const found = ohmsAtEnd({ setting: 'ohms-20M', seconds }) / 1e6;
    expect(Math.abs(found - megohms)).toBeLessThan(0.01);
  });

  // ENGINE 2: a further 0.8 s lag on 20 MOhm, the mean of 0.1 s: the display is 0.85 s behind.
  it('climbs on the display, behind by the lag and half a window', () => {
    for (const seconds of [2, 5, 10]) {
      const shown = show({ setting: 'ohms-20M', seconds }, 0).value! / 1e6;
      const behind = ohmsAtEnd({ setting: 'ohms-20M', seconds: seconds - 0.85 }) / 1e6;
      expect(Math.abs(shown / behind - 1)).toBeLessThan(0.08);
    }
    expect(show({ setting: 'ohms-20M', seconds: 30 }, 0).value! / 1e6).toBeGreaterThan(9.9);
    expect(show({ setting: 'ohms-20M', seconds: 90 }, 0).display).toBe('10.00');
  });

  // FACTS 4.3: over range at t = Rstd C ln 3 for a source of Rstd. On 20 MOhm the source is the
  // standard: 10.99 s. Where source Rs and standard differ it is Rs C ln(1 + 2 Rstd / Rs).
  it.each([
    ['ohms-20k', 11e3, 10e3],
    ['ohms-200k', 105e3, 100e3],
    ['ohms-2M', 1.05e6, 1e6],
    ['ohms-20M', 10e6, 10e6],
  ])('%s kicks over range when the law says', (setting, source, standard) => {
    const over = source * 1e-6 * Math.log(1 + (2 * standard) / source);
    const before = ohmsAtEnd({ setting, seconds: over * 0.995, state: noBleeder });
    const after = ohmsAtEnd({ setting, seconds: over * 1.005, state: noBleeder });
    expect(before).toBeLessThan(2 * standard);
    expect(after).toBeGreaterThan(2 * standard);
  });

  it('20 MOhm over-ranges at 10.99 s on an ideal capacitor and never with a good bleeder', () => {
    expect(10e6 * 1e-6 * Math.log(3)).toBeCloseTo(10.99, 2);
    expect(show({ setting: 'ohms-20M', seconds: 9, state: noBleeder }, 0).isOverRange).toBe(false);
    expect(show({ setting: 'ohms-20M', seconds: 14, state: noBleeder }, 0).display).toBe('OL');
  });

  // 1 uF behind 2.9 kOhm is full after 9 ms, long before the first 0.1 s reading is complete.
  it('does not beep, and is OL on the lowest range at the first reading', () => {
    expect(show({ setting: 'beep', seconds: 0.1 }).isBeeping).toBe(false);
    expect(show({ setting: 'ohms-200', seconds: 0.1 }).display).toBe('OL');
  });

  it('open inside: the bleeder stands at once, without a climb', () => {
    const open: AppliedFault[] = [{ on: 'C1', fault: 'open' }];
    const state = cold({ lift: ['W23/b', 'W24/a', 'W27/a'] }, open);
    expect(ohmsAtEnd({ setting: 'ohms-20M', seconds: 0.5, state })).toBeGreaterThan(9.9e6);
    expect(ohmsAtEnd({ setting: 'ohms-20M', seconds: 0.5 })).toBeLessThan(0.6e6);
  });

  it('with half its capacitance it climbs twice as fast', () => {
    const half: AppliedFault[] = [{ on: 'C1', fault: 'drifted', values: { fraction: 0.5 } }];
    const state = cold({ lift: ['W23/b', 'W24/a', 'W27/a'] }, half);
    const fast = ohmsAtEnd({ setting: 'ohms-20M', seconds: 2.5, state }) / 1e6;
    expect(fast).toBeCloseTo(4.62, 1);
  });

  it('left charged, it drives the ohmmeter: a warning or worse', () => {
    const charged = (volts: number) => ({ voltages: { 'C1:foils': volts }, currents: {} });
    const probing = { setting: 'ohms-20M', seconds: 0.3 };
    expect(show({ ...probing, storage: charged(50) }).isWarning).toBe(true);
    expect(show({ ...probing, storage: charged(2970) }).isDestroyed).toBe(true);
    expect(show({ ...probing, storage: charged(-5) })).toMatchObject({ isWarning: false });
  });
});

describe('a winding on an ohms range', () => {
  // L / R = 49 H / (3 kOhm + 95 Ohm) = 16 ms: at first nearly all of the open voltage, then 95 Ohm.
  it('takes a moment', () => {
    const state = cold({ lift: ['W23/a'] });
    const probing = { setting: 'ohms-200', red: 'T1.HV', black: 'CH.1', state };
    const volts = land({ ...probing, seconds: 0.3 }).volts;
    expect(volts.slice(0, 20).some((v) => Math.abs(v) > 2)).toBe(true);
    expect(ohmsAtEnd({ ...probing, seconds: 0.3 })).toBeCloseTo(95.0, 1);
  });
});

describe('what is settled', () => {
  it('is where the climb ends', () => {
    const end = settled({ state: apart, red: 'C1.1', black: 'C1.2', setting: 'ohms-20M' });
    expect(end.display).toBe('10.00');
  });
});
