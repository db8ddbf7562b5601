import { describe, expect, it } from 'vitest';
import { operatingPoint } from '../../shared/engine/analyses/operating-point.ts';
import { thermalVoltage } from '../../shared/engine/quantities/physical-constants.ts';
import { battery, circuit, diode, relativeError, resistor, solved } from './elements.ts';

/** W(x) for x > 0 by Halley's iteration: Corless et al., Adv. Comput. Math. 5 (1996) 329-359. */
function lambertW(x: number): number {
  let w = Math.log1p(x);
  for (let round = 0; round < 50; round += 1) {
    const grown = Math.exp(w);
    const off = w * grown - x;
    w -= off / (grown * (w + 1) - ((w + 2) * off) / (2 * w + 2));
  }
  return w;
}

/** Banwell and Jayakumar, Electronics Letters 36(4) (2000) 291-292: a = N n Vt. */
function closedForm(volts: number, ohms: number, saturation: number, a: number): number {
  const argument = ((saturation * ohms) / a) * Math.exp((volts + saturation * ohms) / a);
  return (a / ohms) * lambertW(argument) - saturation;
}

const loop = (
  volts: number,
  ohms: number,
  saturationCurrent: number,
  emission: number,
  more = {},
) =>
  solved(
    operatingPoint(
      circuit(
        battery('V', 'a', '0', volts),
        resistor('R', 'a', 'k', ohms),
        diode('D', 'k', '0', { saturationCurrent, emission, ...more }),
      ),
    ),
  );

describe('a junction', () => {
  it('has 25.8520 mV of thermal voltage at 300 K', () => {
    expect(thermalVoltage()).toBeCloseTo(0.025852, 7);
    expect(thermalVoltage(298.15)).toBeCloseTo(0.0256926, 7);
    expect(thermalVoltage(293.15)).toBeCloseTo(0.0252617, 7);
  });

  // Boost.Math's published example lambert_w_diode.cpp: W0 = 10.5225, I = 0.00108485 A
  it('agrees with the published Lambert-W example', () => {
    const { currents } = solved(
      operatingPoint(
        circuit(
          battery('V', 'a', '0', 0.9),
          resistor('R', 'a', 'k', 249),
          diode('D', 'k', '0', { saturationCurrent: 25e-15, seriesResistance: 0.3 }),
        ),
        { thermalVoltage: 0.0257025 },
      ),
    );
    expect(currents['D']).toBeCloseTo(0.00108485, 8);
  });

  // Calculated with the exact constants at 300 K
  it.each([
    [5, 1000, 1e-14, 1, 4.307456e-3, 0.692544],
    [1, 100, 1e-12, 1, 4.267501e-3, 0.57325],
    [3, 1e4, 1e-9, 2, 0.236033e-3, 0.639668],
  ])('at %f V and %f ohm carries its closed form', (v, r, is, n, amperes, volts) => {
    const { currents, voltages } = loop(v, r, is, n);
    expect(relativeError(currents['D']!, amperes)).toBeLessThan(1e-6);
    expect(voltages['k']).toBeCloseTo(volts, 6);
    expect(relativeError(currents['D']!, closedForm(v, r, is, n * thermalVoltage()))).toBeLessThan(
      1e-8,
    );
  });

  // The stack of 13 with n = 2 and 12 nA; calculated. Common practice, no source, for the bands.
  it.each([
    [12.0, 8.465],
    [12.6, 8.555],
    [13.8, 8.71],
    [14.0, 8.733],
  ])('of the high-voltage rectifier stands at its trade check from %f V', (volts, expected) => {
    const { voltages } = loop(volts, 1000, 12e-9, 26);
    expect(voltages['k']).toBeCloseTo(expected, 3);
    expect(voltages['k']).toBeGreaterThan(6.5);
    expect(voltages['k']).toBeLessThan(10);
  });

  it('of the high-voltage rectifier reads its two ways on the 2000 megohm range', () => {
    const forward = loop(3, 1e7, 12e-9, 26).currents['R']!;
    const reverse = solved(
      operatingPoint(
        circuit(
          battery('V', 'a', '0', 3),
          resistor('R', 'a', 'k', 1e7),
          diode('D', '0', 'k', { saturationCurrent: 12e-9, emission: 26 }),
        ),
      ),
    ).currents['R']!;
    expect(3 / forward / 1e6).toBeCloseTo(22.6, 1);
    expect(Math.abs(3 / reverse / 1e6 - 253.5)).toBeLessThan(0.2);
  });

  it('carries IBV at BV, and no more than IS short of it', () => {
    const breakdown = { breakdownVoltage: 50, breakdownCurrent: 1e-3 };
    const at = (volts: number) => -loop(-volts, 1e-3, 1e-12, 1, breakdown).currents['D']!;
    expect(relativeError(at(50), 1e-3)).toBeLessThan(1e-3);
    expect(at(48)).toBeLessThan(1.001e-12 + 48e-12);
    expect(at(50 + thermalVoltage() * Math.log(10))).toBeGreaterThan(8e-3);
  });

  it('is solved at kilovolts, either way round, from nothing', () => {
    const on = loop(12000, 1000, 12e-9, 26, { seriesResistance: 20 });
    expect(on.currents['D']).toBeGreaterThan(11.7);
    const off = loop(-12000, 1000, 12e-9, 26, { seriesResistance: 20 });
    expect(relativeError(off.currents['D']!, -12e-9)).toBeLessThan(1e-6);
  });

  it('shares current with its equals in parallel and voltage in series', () => {
    const model = { saturationCurrent: 1e-12, emission: 1.7 };
    const { currents, voltages } = solved(
      operatingPoint(
        circuit(
          battery('V', 'a', '0', 10),
          resistor('R', 'a', 'k', 1000),
          diode('D1', 'k', 'm', model),
          diode('D2', 'k', 'm', model),
          diode('D3', 'm', 'n', model),
          diode('D4', 'n', '0', model),
        ),
      ),
    );
    expect(relativeError(currents['D1']!, currents['D2']!)).toBeLessThan(1e-9);
    expect(relativeError(currents['D3']!, 2 * currents['D1']!)).toBeLessThan(1e-9);
    expect(relativeError(voltages['m']!, 2 * voltages['n']!)).toBeLessThan(1e-9);
  });
});
