import { describe, expect, it } from 'vitest';
import { transient, type TransientOptions } from '../../shared/engine/analyses/transient.ts';
import type { Circuit, Wave } from '../../shared/engine/circuit/circuit.ts';
import {
  battery,
  capacitor,
  circuit,
  currentSource,
  diode,
  inductor,
  resistor,
  sine,
  solved,
} from './elements.ts';

const run = (from: Circuit, options: TransientOptions) => solved(transient(from, options));
const fromRest = { useInitialConditions: true } as const;

/** The value at a time that is a sample. */
function at(values: readonly number[], times: readonly number[], time: number): number {
  const index = times.findIndex((sample) => Math.abs(sample - time) < 1e-9);
  expect(index).toBeGreaterThanOrEqual(0);
  return values[index]!;
}

const step = (low: number, high: number, delay: number, edge = 0): Wave => ({
  shape: 'pulse',
  low,
  high,
  delay,
  rise: edge,
  fall: edge,
  width: 1e9,
  period: 0,
});

describe('transients with closed forms', () => {
  // 10 V, 1 kilohm, 1 uF: 10 (1 - 1/e) = 6.321206 V after 1 ms
  it('charges a capacitor', () => {
    const rc = circuit(
      battery('V', 'a', '0', 10),
      resistor('R', 'a', 'c', 1000),
      capacitor('C', 'c', '0', 1e-6),
    );
    const { time, voltages } = run(rc, { step: 1e-5, stop: 5e-3, ...fromRest });
    expect(at(voltages['c']!, time, 1e-3)).toBeCloseTo(6.321206, 4);
    time.forEach((t, n) => {
      expect(Math.abs(voltages['c']![n]! - 10 * -Math.expm1(-t / 1e-3))).toBeLessThan(1e-4);
    });
  });

  // 10 V, 10 ohm, 100 mH: 1 - 1/e = 0.632121 A after 10 ms
  it('builds up the current of a coil', () => {
    const rl = circuit(
      battery('V', 'a', '0', 10),
      resistor('R', 'a', 'l', 10),
      inductor('L', 'l', '0', 0.1),
    );
    const { time, currents } = run(rl, { step: 1e-4, stop: 0.02, ...fromRest });
    expect(at(currents['L']!, time, 0.01)).toBeCloseTo(0.632121, 5);
    expect(at(currents['V']!, time, 0.01)).toBeCloseTo(-0.632121, 5);
  });

  const series = (ohms: number) =>
    circuit(
      battery('V', 'a', '0', 10),
      resistor('R', 'a', 'b', ohms),
      inductor('L', 'b', 'c', 0.1),
      capacitor('C', 'c', '0', 1e-6),
    );

  // R 100: zeta 0.158114, wd 3122.499 rad/s; calculated
  it('rings a series circuit', () => {
    const { time, voltages } = run(series(100), { step: 2e-6, stop: 2.5e-3, ...fromRest });
    const volts = voltages['c']!;
    expect(at(volts, time, 0.5e-3)).toBeCloseTo(8.678628, 3);
    expect(at(volts, time, 1e-3)).toBeCloseTo(16.045658, 3);
    expect(at(volts, time, 2e-3)).toBeCloseTo(6.346377, 3);
    const peak = Math.max(...volts);
    expect(peak).toBeCloseTo(16.046791, 3);
    expect(time[volts.indexOf(peak)]).toBeCloseTo(1.006115e-3, 5);
  });

  // critical and overdamped (s = -513.167, -19486.833); calculated
  it.each([
    [632.4555, 8.23814],
    [2000, 3.852134],
  ])('lets it creep with %f ohm', (ohms, expected) => {
    const { time, voltages } = run(series(ohms), { step: 2e-6, stop: 1e-3, ...fromRest });
    expect(at(voltages['c']!, time, 1e-3)).toBeCloseTo(expected, 4);
  });

  it('starts from the operating point unless told otherwise', () => {
    const { voltages, currents } = run(series(100), { step: 1e-5, stop: 1e-3 });
    voltages['c']!.forEach((volts) => expect(volts).toBeCloseTo(10, 7));
    currents['V']!.forEach((amperes) => expect(Math.abs(amperes)).toBeLessThan(1e-9));
  });

  it('starts from node voltages that are held, then lets them go', () => {
    const rc = circuit(
      battery('V', 'a', '0', 10),
      resistor('R', 'a', 'c', 1000),
      capacitor('C', 'c', '0', 1e-6),
    );
    for (const useInitialConditions of [true, false]) {
      const { time, voltages } = run(rc, {
        step: 1e-5,
        stop: 1e-3,
        initialVoltages: { c: 4 },
        useInitialConditions,
      });
      expect(voltages['c']![0]).toBeCloseTo(4, 6);
      expect(at(voltages['c']!, time, 1e-3)).toBeCloseTo(10 - 6 / Math.E, 4);
    }
  });

  // v = A (wRC)^-1-filtered sine: amplitude 1/sqrt(1 + (wRC)^2), plus the decay from rest
  it('follows a sine through an RC to its steady state and its start', () => {
    const [tau, omega] = [1e-3, 2 * Math.PI * 200];
    const rc = circuit(
      battery('V', 'a', '0', sine(5, 200)),
      resistor('R', 'a', 'c', 1000),
      capacitor('C', 'c', '0', 1e-6),
    );
    const { time, voltages } = run(rc, { step: 2e-5, stop: 0.03 });
    const scale = 5 / (1 + (omega * tau) ** 2);
    time.forEach((t, n) => {
      const steady = Math.sin(omega * t) - omega * tau * Math.cos(omega * t);
      const exact = scale * (steady + omega * tau * Math.exp(-t / tau));
      expect(Math.abs(voltages['c']![n]! - exact)).toBeLessThan(3e-4);
    });
  });

  it('meets the corners of a pulse exactly, ramps and jumps alike', () => {
    const wave: Wave = {
      shape: 'pulse',
      low: 0,
      high: 6,
      delay: 1e-3,
      rise: 1e-3,
      fall: 0,
      width: 2e-3,
      period: 5e-3,
    };
    const rc = circuit(
      battery('V', 'a', '0', wave),
      resistor('R', 'a', 'c', 1000),
      capacitor('C', 'c', '0', 0.2e-6),
    );
    const tau = 0.2e-3;
    const { time, voltages } = run(rc, { step: 1e-4, stop: 9e-3 });
    const ramp = (t: number): number => 6000 * (t - tau * -Math.expm1(-t / tau));
    expect(at(voltages['c']!, time, 1.5e-3)).toBeCloseTo(ramp(0.5e-3), 3);
    const top = ramp(1e-3);
    const plateau = 6 + (top - 6) * Math.exp(-1e-3 / tau);
    expect(at(voltages['c']!, time, 3e-3)).toBeCloseTo(plateau, 3);
    const end = 6 + (top - 6) * Math.exp(-2e-3 / tau);
    expect(at(voltages['c']!, time, 4.3e-3)).toBeCloseTo(end * Math.exp(-0.3e-3 / tau), 3);
    expect(at(voltages['a']!, time, 4.1e-3)).toBe(0);
    expect(at(voltages['c']!, time, 6.5e-3)).toBeCloseTo(ramp(0.5e-3), 3);
  });

  it('damps and delays a sine as written', () => {
    const wave: Wave = {
      ...sine(2, 1000),
      delay: 1e-3,
      damping: 500,
      offset: 1,
      phaseDegrees: 90,
    } as Wave;
    const { time, voltages } = run(
      circuit(battery('V', 'a', '0', wave), resistor('R', 'a', '0', 50)),
      { step: 5e-5, stop: 4e-3 },
    );
    expect(at(voltages['a']!, time, 0.5e-3)).toBeCloseTo(3, 9);
    const since = 1.25e-3;
    const exact = 1 + 2 * Math.exp(-500 * since) * Math.cos(2 * Math.PI * 1000 * since);
    expect(at(voltages['a']!, time, 2.25e-3)).toBeCloseTo(exact, 9);
  });

  it('keeps samples from the start asked for, at multiples of the step', () => {
    const { time } = run(circuit(battery('V', 'a', '0', sine(1, 50)), resistor('R', 'a', '0', 1)), {
      step: 1e-3,
      stop: 0.02,
      start: 0.015,
    });
    expect(time.map((t) => Math.round(t * 1e6))).toEqual([
      15000, 16000, 17000, 18000, 19000, 20000,
    ]);
  });

  it('moves a charge as a current source says', () => {
    const { voltages } = run(
      circuit(
        currentSource('J', '0', 'c', step(0, 1e-3, 1e-3)),
        capacitor('C', 'c', '0', 1e-6),
        resistor('R', 'c', '0', 1e12),
      ),
      { step: 1e-3, stop: 3e-3 },
    );
    expect(voltages['c']!.at(-1)).toBeCloseTo(2, 6);
  });

  // smoothing capacitor large enough that its voltage is the crest less one diode drop
  it('charges a peak rectifier to the crest less the drop', () => {
    const { summary } = run(
      circuit(
        battery('V', 'a', '0', sine(10, 50)),
        diode('D', 'a', 'c', { saturationCurrent: 1e-12, seriesResistance: 0.01 }),
        capacitor('C', 'c', '0', 1e-3),
        resistor('R', 'c', '0', 1e6),
      ),
      { stop: 0.2, observe: { from: 0.1, pairs: [['c', '0']] } },
    );
    expect(summary!.pairs[0]!.mean).toBeGreaterThan(9.3);
    expect(summary!.pairs[0]!.mean).toBeLessThan(9.75);
  });
});

describe('a summary over a window', () => {
  it('has the mean, rms, peak and power of a sine', () => {
    const { summary, time } = run(
      circuit(battery('V', 'a', '0', sine(10, 50)), resistor('R', 'a', '0', 4)),
      {
        stop: 0.06,
        observe: { from: 0.02, pairs: [['a', '0']], currents: ['R'], powers: ['R', 'V'] },
      },
    );
    expect(time).toEqual([]);
    const [volts] = summary!.pairs;
    expect(Math.abs(volts!.mean)).toBeLessThan(1e-3);
    expect(volts!.rms).toBeCloseTo(10 / Math.SQRT2, 3);
    expect(Math.abs(volts!.peak)).toBeCloseTo(10, 1);
    expect(summary!.currents['R']!.rms).toBeCloseTo(2.5 / Math.SQRT2, 3);
    expect(summary!.powers['R']!.mean).toBeCloseTo(12.5, 2);
    expect(summary!.powers['V']!.mean).toBeCloseTo(-12.5, 2);
  });
});
