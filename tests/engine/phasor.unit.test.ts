import { describe, expect, it } from 'vitest';
import { phasor, type Complex } from '../../shared/engine/analyses/phasor.ts';
import type { Circuit } from '../../shared/engine/circuit/circuit.ts';
import {
  battery,
  capacitor,
  circuit,
  coupling,
  diode,
  inductor,
  phasorSource,
  resistor,
  solved,
} from './elements.ts';

/** At 1 rad/s, where 1 H is j1 ohm and 1 F is -j1 ohm. */
const atUnity = (from: Circuit) => solved(phasor(from, [1 / (2 * Math.PI)]));
const polar = ([real, imaginary]: Complex): [number, number] => [
  Math.hypot(real, imaginary),
  (Math.atan2(imaginary, real) * 180) / Math.PI,
];

describe('phasors of published examples', () => {
  // (1+j6) I1 + j2 I2 = 10, j2 I1 + (4+j) I2 = 0: published, verified
  it('solves coupled coils with a capacitor in the second mesh', () => {
    const { currents, voltages } = atUnity(
      circuit(
        phasorSource('V', 'a', '0', 10),
        resistor('R1', 'a', 'b', 1),
        inductor('L1', 'b', '0', 6),
        inductor('L2', 'c', '0', 4),
        coupling('K', 'L1', 'L2', 2 / Math.sqrt(24)),
        resistor('R2', 'c', 'd', 4),
        capacitor('C', 'd', '0', 1 / 3),
      ),
    );
    const [one, two] = [currents['L1']![0]!, currents['L2']![0]!];
    expect(one[0]).toBeCloseTo(0.5246423, 7);
    expect(one[1]).toBeCloseTo(-1.5580286, 7);
    expect(two[0]).toBeCloseTo(-0.7949126, 7);
    expect(two[1]).toBeCloseTo(-0.063593, 7);
    // the published Vo counts against the mesh current: -j3 I2
    const [size, degrees] = polar(voltages['d']!.map(([re, im]): Complex => [-re, -im])[0]!);
    expect(size).toBeCloseTo(2.3924, 4);
    expect(degrees).toBeCloseTo(94.574, 3);
  });

  // (5+j2) I1 - j3 I2 = 20 at 60 degrees, -j3 I1 + j2 I2 = 0: published rounded 3.576 and 5.364
  it('solves coils coupled against each other', () => {
    const { currents } = atUnity(
      circuit(
        phasorSource('V', 'a', '0', 20, 60),
        resistor('R', 'a', 'b', 5),
        inductor('L1', 'b', '0', 2),
        inductor('L2', 'c', '0', 5),
        coupling('K', 'L1', 'L2', -3 / Math.sqrt(10)),
        capacitor('C', 'c', '0', 1 / 3),
      ),
    );
    const [one, two] = [polar(currents['L1']![0]!), polar(currents['L2']![0]!)];
    expect(one[0]).toBeCloseTo(3.57771, 5);
    expect(two[0]).toBeCloseTo(5.36656, 5);
    expect(one[1]).toBeCloseTo(86.565, 3);
    expect(two[1]).toBeCloseTo(86.565, 3);
  });

  // j I1 - j3 I2 = 12, -j3 I1 + (12+j6) I2 = 0 (a well known textbook's example 13.1: 13.01, 2.91)
  it('solves coils with a capacitor in the first mesh', () => {
    const { currents } = atUnity(
      circuit(
        phasorSource('V', 'a', '0', 12),
        capacitor('C', 'a', 'b', 1 / 4),
        inductor('L1', 'b', '0', 5),
        inductor('L2', 'c', '0', 6),
        coupling('K', 'L1', 'L2', -3 / Math.sqrt(30)),
        resistor('R', 'c', '0', 12),
      ),
    );
    const [one, two] = [polar(currents['L1']![0]!), polar(currents['L2']![0]!)];
    expect(one[0]).toBeCloseTo(13.0158, 4);
    expect(one[1]).toBeCloseTo(-49.399, 3);
    expect(two[0]).toBeCloseTo(2.91043, 5);
    expect(two[1]).toBeCloseTo(14.036, 3);
  });
});

describe('phasors', () => {
  it('follow 1 / (1 + j w R C) over eight decades', () => {
    const frequencies = Array.from({ length: 33 }, (_, n) => 10 ** (-2 + n / 4));
    const { voltages } = solved(
      phasor(
        circuit(
          phasorSource('V', 'a', '0', 1),
          resistor('R', 'a', 'c', 1000),
          capacitor('C', 'c', '0', 1e-6),
        ),
        frequencies,
      ),
    );
    frequencies.forEach((hertz, n) => {
      const x = 2 * Math.PI * hertz * 1e-3;
      const [real, imaginary] = voltages['c']![n]!;
      expect(Math.abs(real * (1 + x * x) - 1)).toBeLessThan(1e-6);
      expect(Math.abs((imaginary * (1 + x * x)) / -x - 1)).toBeLessThan(1e-6);
    });
  });

  it('see a junction as its slope at the operating point', () => {
    // 1 mA through the junction: 25.852 ohm
    const { voltages } = solved(
      phasor(
        circuit(
          battery('B', 'b', '0', 10),
          resistor('RB', 'b', 'k', 1e4 - 690),
          phasorSource('V', 's', '0', 1),
          resistor('RS', 's', 't', 1e4),
          capacitor('C', 't', 'k', 1),
          diode('D', 'k', '0', { saturationCurrent: 1e-3 / Math.expm1(0.69 / 0.025852) }),
        ),
        [1000],
      ),
    );
    const slope = 25.852;
    const beside = (slope * 9310) / (slope + 9310);
    expect(voltages['k']![0]![0]).toBeCloseTo(beside / (beside + 1e4), 4);
  });
});
