import { describe, expect, it } from 'vitest';
import { auto6000 } from '../../shared/instruments/auto-6000.ts';
import { drawMeter, exactMeter } from '../../shared/instruments/draw-meter.ts';
import { manual2000 } from '../../shared/instruments/manual-2000.ts';
import { meters } from '../../shared/instruments/meters.ts';
import { read } from '../../shared/instruments/read.ts';
import { show, showOhms, steady, wave } from './across.ts';

const sine = (peak: number) => (turns: number) => peak * Math.sin(2 * Math.PI * turns);
const square = (peak: number) => (turns: number) => (turns % 1 < 0.5 ? peak : -peak);

describe('volts', () => {
  it.each([
    ['dc-200m', 0.1234, '123.4', 'mV'],
    ['dc-2', -0.31, '-0.310', 'V'],
    ['dc-20', 12.6, '12.60', 'V'],
    ['dc-200', 94.8, '94.8', 'V'],
    ['dc-1000', 401.9, '402', 'V'],
  ])('%s shows %d V as %s %s', (setting, volts, display, unit) => {
    expect(show(setting, steady(volts))).toMatchObject({ display, unit });
  });

  it('shows no minus before zero, and zero with its tips in the air', () => {
    expect(show('dc-20', steady(-0.0001)).display).toBe('0.00');
    expect(show('dc-20', { time: [], volts: [] }).display).toBe('0.00');
  });

  it('goes over range at 2000 counts', () => {
    expect(show('dc-2', steady(1.998)).isOverRange).toBe(false);
    expect(show('dc-2', steady(2.01)).display).toBe('OL');
    expect(show('dc-2', steady(-2.01)).display).toBe('OL');
  });

  // FACTS 4.1: an integral over whole cycles of 50 or 60 Hz rejects both.
  it('rejects mains on DC', () => {
    for (const hertz of [50, 60])
      expect(Math.abs(show('dc-200', wave(hertz, sine(169.7))).value ?? 99)).toBeLessThan(0.2);
  });

  it('is the mean of the last 0.1 s, not of the whole trace', () => {
    const trace = { time: [0, 5, 5, 5.1], volts: [900, 900, 10, 20] };
    expect(show('dc-1000', trace).value).toBe(15);
    const ramp = { time: [0, 1], volts: [0, 10] };
    expect(show('dc-20', ramp).value).toBeCloseTo(9.5, 6);
  });

  // Average-responding: pi / (2 sqrt 2) = 1.1107 x the rectified mean; a square wave of V reads 1.11 V.
  it('shows AC as the rms of a sine: right for a sine, 11 % high for a square wave', () => {
    expect(show('ac-200', wave(60, sine(169.7))).value).toBeCloseTo(120, 0);
    expect(show('ac-200', wave(60, square(100))).value).toBeCloseTo(111.07, 0);
    const on = { meter: auto6000 };
    expect(show('ac-600', wave(60, sine(169.7)), on).value).toBeCloseTo(120, 0);
    expect(show('ac-600', wave(60, square(100)), on).value).toBeCloseTo(100, 0);
  });

  it('blocks DC on AC', () => {
    expect(show('ac-200', steady(400)).value).toBe(0);
    expect(
      show(
        'ac-200',
        wave(60, (turns) => 300 + sine(14.142)(turns)),
      ).value,
    ).toBeCloseTo(10, 0);
  });
});

describe('error of a drawn meter', () => {
  it('is the same for the same seed, another for another', () => {
    expect(drawMeter(manual2000, 4)).toEqual(drawMeter(manual2000, 4));
    expect(drawMeter(manual2000, 4)).not.toEqual(drawMeter(manual2000, 5));
  });

  // Spec form ±(% of reading + digits): FACTS 4.2.
  it('stays inside the spec on every setting', () => {
    for (const meter of meters)
      for (const setting of meter.settings) {
        if (setting.function === 'off' || setting.function === 'capacitance') continue;
        const { scale, spec } = setting;
        const step = scale.size / 10 ** scale.decimals;
        for (let seed = 0; seed < 40; seed += 1) {
          const truth = step * scale.maxCounts * (0.05 + 0.02 * seed);
          const more = { meter, unit: drawMeter(meter, seed), readingNumber: seed };
          const isOhms = setting.function === 'ohms' || setting.function === 'beep';
          const own = isOhms && 'showsSourceOhms' in setting && setting.showsSourceOhms ? 10e6 : 0;
          const trace =
            setting.function === 'ac-volts' ? wave(60, sine(truth * Math.SQRT2)) : steady(truth);
          const reading = isOhms
            ? showOhms(setting.id, truth - 0.16 - own, more)
            : show(setting.id, trace, more);
          const allowed = (truth * spec.percent) / 100 + spec.digits * step;
          expect(
            Math.abs((reading.value ?? NaN) - truth),
            `${setting.id} ${seed}`,
          ).toBeLessThanOrEqual(allowed * (1 + 1e-9) + step * 1e-6);
        }
      }
  });

  it('differs between meters: forty of them do not show the same', () => {
    const shown = Array.from(
      { length: 40 },
      (_, seed) => showOhms('ohms-200', 95, { unit: drawMeter(manual2000, seed) }).display,
    );
    expect(new Set(shown).size).toBeGreaterThan(5);
  });

  it('lets the last digit move by one count at most, the same way for the same reading', () => {
    const unit = { ...exactMeter(9), noise: 0.3 };
    const counts = Array.from(
      { length: 300 },
      (_, readingNumber) => showOhms('ohms-200', 95.29, { unit, readingNumber }).counts!,
    );
    expect(new Set(counts)).toEqual(new Set([954, 955]));
    const again = showOhms('ohms-200', 95.29, { unit, readingNumber: 17 }).counts;
    expect(again).toBe(counts[17]);
  });
});

describe('REL', () => {
  it('takes the leads off', () => {
    const leads = showOhms('ohms-200', 0).value!;
    expect(leads).toBeCloseTo(0.2, 6);
    expect(showOhms('ohms-200', 0.55, { relative: leads }).value).toBeCloseTo(0.5, 6);
  });

  it('subtracts what was stored, right or wrong', () => {
    expect(showOhms('ohms-200', 94.64, { relative: 50 }).display).toBe('44.8');
    expect(showOhms('ohms-200', 0.15, { relative: 95 }).display).toBe('-94.7');
  });

  it('does not bring a reading back from over range', () => {
    expect(showOhms('ohms-200', 230, { relative: 100 }).display).toBe('OL');
  });
});

describe('what a meter must not meet', () => {
  // ENGINE 2: ohms, diode or beep on more than 30 V: nonsense and a warning.
  it.each(['ohms-200', 'ohms-20M', 'diode', 'beep', 'capacitance-2u'])('%s on 40 V warns', (id) => {
    const shown = [0, 1, 2].map((readingNumber) => show(id, steady(40), { readingNumber }));
    for (const reading of shown) expect(reading).toMatchObject({ isWarning: true, value: null });
    expect(new Set(shown.map(({ display }) => display)).size).toBeGreaterThan(1);
    expect(show(id, steady(20)).isWarning).toBe(false);
  });

  it('dies above 600 V on ohms, above 1000 V anywhere', () => {
    expect(show('ohms-20M', steady(700))).toMatchObject({ isDestroyed: true, display: '' });
    expect(show('dc-1000', steady(700)).isDestroyed).toBe(false);
    expect(show('dc-1000', steady(-2970))).toMatchObject({ isDestroyed: true, value: null });
    expect(show('ac-600', wave(60, sine(1100))).isDestroyed).toBe(true);
  });

  it('judges the worst moment, not the last', () => {
    const trace = { time: [0, 0.01, 5], volts: [2970, 1, 0] };
    expect(show('ohms-200', trace).isDestroyed).toBe(true);
  });
});

describe('capacitance', () => {
  // C = Im(Y) / w at 400 Hz (ENGINE 2); 0.95 uF with 10 MOhm across.
  it('reads the imaginary part of the admittance', () => {
    const admittance = [1e-7, 2 * Math.PI * 400 * 0.95e-6] as const;
    const more = { admittance };
    expect(show('capacitance-2u', steady(0), more)).toMatchObject({ display: '0.950', unit: 'µF' });
    expect(show('capacitance-20u', steady(0), more).display).toBe('0.95');
    expect(show('capacitance-2u', steady(0)).display).toBe('0.000');
  });
});

describe('the result of a reading', () => {
  it('carries value, counts and decimals of what is displayed', () => {
    expect(showOhms('ohms-20M', 7.62e6)).toEqual({
      display: '7.62',
      unit: 'MΩ',
      value: 7.62e6,
      counts: 762,
      decimals: 2,
      isBeeping: false,
      isOverRange: false,
      isWarning: false,
      isDestroyed: false,
    });
  });

  it('is empty for a setting the meter does not have', () => {
    const output = read({
      meter: manual2000,
      unit: exactMeter(),
      settingId: 'ohms-5k',
      trace: steady(1),
      lagState: null,
      relative: null,
      readingNumber: 0,
    });
    expect(output.reading.display).toBe('');
  });
});
