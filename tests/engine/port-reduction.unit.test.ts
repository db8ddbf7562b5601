import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { compile } from '../../shared/engine/analyses/compile.ts';
import { operatingPoint } from '../../shared/engine/analyses/operating-point.ts';
import { reduce, type MeterPort } from '../../shared/engine/analyses/port-reduction.ts';
import type { Element } from '../../shared/engine/circuit/circuit.ts';
import {
  battery,
  circuit,
  currentSource,
  diode,
  failureOf,
  relativeError,
  resistor,
  solved,
} from './elements.ts';

/** The meter as a current beside its resistance, so that it brings no node of its own. */
function whole(elements: Element[], red: string, black: string, meter: MeterPort) {
  const { voltages } = solved(
    operatingPoint(
      circuit(
        ...elements,
        resistor('meter', red, black, meter.sourceResistance),
        currentSource('drive', black, red, meter.openVolts / meter.sourceResistance),
      ),
    ),
  );
  const volts = voltages[red]! - voltages[black]!;
  return { volts, amps: (meter.openVolts - volts) / meter.sourceResistance };
}

/** The ranges of the manual meter: 200 ohm, 2 M, 2000 M, and direct volts. */
const METERS: MeterPort[] = [
  { openVolts: 3, sourceResistance: 2900 },
  { openVolts: 0.65, sourceResistance: 1.05e6 },
  { openVolts: 3, sourceResistance: 1e7 },
  { openVolts: 0, sourceResistance: 1e7 },
];

const node = fc.integer({ min: 0, max: 6 }).map(String);
const ohms = fc.double({ min: -2.5, max: 11, noNaN: true }).map((decade) => 10 ** decade);

describe('the reduced circuit', () => {
  it('reads what the whole circuit reads with the meter in it, for any pair and range', () => {
    fc.assert(
      fc.property(
        fc.array(fc.tuple(node, node, ohms), { minLength: 3, maxLength: 14 }),
        fc.array(fc.tuple(node, node, fc.boolean()), { maxLength: 4 }),
        fc.option(fc.double({ min: -14, max: 14, noNaN: true })),
        node,
        node,
        fc.constantFrom(...METERS),
        (wires, junctions, volts, red, black, meter) => {
          fc.pre(red !== black);
          const elements = [
            ...Array.from({ length: 6 }, (_, n) => resistor(`I${n}`, `${n + 1}`, '0', 1e12)),
            ...wires.map(([a, b, r], n) => resistor(`R${n}`, a, b, r)),
            ...junctions.map(([a, b, isStack], n) =>
              diode(`D${n}`, a, b, {
                saturationCurrent: isStack ? 12e-9 : 1e-14,
                emission: isStack ? 26 : 1,
                seriesResistance: isStack ? 20 : 0,
              }),
            ),
            ...(volts === null
              ? []
              : [battery('V', 's', '0', volts), resistor('RV', 's', '1', 1000)]),
          ];
          const reading = solved(solved(reduce(circuit(...elements))).probe(red, black, meter));
          const full = whole(elements, red, black, meter);
          const size = Math.max(meter.openVolts, Math.abs(full.volts), 1e-3);
          expect(Math.abs(reading.volts - full.volts)).toBeLessThan(1e-9 * size);
          expect(Math.abs(reading.amps - full.amps)).toBeLessThan(
            1e-9 * (size / meter.sourceResistance),
          );
        },
      ),
      { numRuns: 150, seed: 10 },
    );
  });

  const divider = [
    battery('V', 'a', '0', 10),
    resistor('R1', 'a', 'b', 1000),
    resistor('R2', 'b', '0', 1000),
    resistor('lone', 'x', 'y', 94.8),
  ];

  it('loads a divider as a 10 megohm meter does', () => {
    const solver = solved(reduce(circuit(...divider)));
    const { volts, amps } = solved(solver.probe('b', '0', { openVolts: 0, sourceResistance: 1e7 }));
    expect(relativeError(volts, 5 / (1 + 500 / 1e7))).toBeLessThan(1e-8);
    expect(relativeError(amps, -volts / 1e7)).toBeLessThan(1e-9);
  });

  it('reads a part that hangs free of everything, one way and the other', () => {
    const solver = solved(reduce(circuit(...divider)));
    for (const [red, black] of [
      ['x', 'y'],
      ['y', 'x'],
    ] as const) {
      const { volts, amps } = solved(solver.probe(red, black, METERS[0]!));
      expect(relativeError(volts / amps, 94.8)).toBeLessThan(1e-9);
    }
  });

  it('reads nothing between a node and itself, and the open voltage at a terminal not in the circuit', () => {
    const solver = solved(reduce(circuit(...divider)));
    const shorted = solved(solver.probe('b', 'b', METERS[0]!));
    expect(shorted.volts).toBe(0);
    expect(relativeError(shorted.amps, 3 / 2900)).toBeLessThan(1e-12);
    const open = solved(solver.probe('nowhere', '0', METERS[2]!));
    expect(relativeError(open.volts, 3 / (1 + 1e-5))).toBeLessThan(1e-6);
  });

  it('sees insulation break down when the meter itself turns a switch', () => {
    const leak: Element = {
      kind: 'switch',
      name: 'S',
      nodes: ['h', '0'],
      control: ['h', '0'],
      model: { threshold: 2, hysteresis: 1, onResistance: 1e9, offResistance: 1e12 },
    };
    const solver = solved(reduce(circuit(leak)));
    const low = solved(solver.probe('h', '0', METERS[1]!));
    expect(low.volts / low.amps).toBeGreaterThan(4e11);
    const driven: MeterPort = { openVolts: 50, sourceResistance: 1e6 };
    const high = solved(solver.probe('h', '0', driven));
    expect(relativeError(high.volts / high.amps, 1e9)).toBeLessThan(0.01);
  });

  it('takes a compiled circuit with the values it has now', () => {
    const compiled = solved(
      compile(circuit(resistor('R', 'a', 'b', 100), resistor('S', 'b', '0', 5))),
    );
    expect(compiled.setValue('R', 4700)).toBeUndefined();
    const { volts, amps } = solved(solved(reduce(compiled)).probe('a', 'b', METERS[0]!));
    // the picosiemens of the node itself lies beside it
    expect(relativeError(volts / amps, 4700)).toBeLessThan(1e-8);
  });

  it('uses the present values where it has to solve the whole circuit too', () => {
    const compiled = solved(
      compile(
        circuit(
          resistor('R', 'a', '0', 100),
          battery('V', 'v', '0', 2),
          resistor('S', 'v', 'a', 50),
        ),
      ),
    );
    compiled.setValue('R', 300);
    compiled.setValue('V', 8);
    const solver = solved(reduce(compiled));
    const volts: MeterPort = { openVolts: 0, sourceResistance: 1e9 };
    expect(solved(solver.probe('a', '0', volts)).volts).toBeCloseTo((8 * 300) / 350, 6);
    // a terminal that is not in the circuit makes it solve the whole
    const { volts: beside } = solved(
      solver.probe('a', 'nowhere', { openVolts: 0, sourceResistance: 1 }),
    );
    expect(Math.abs(beside)).toBeLessThan(1e-9);
  });

  it('fails as the operating point does', () => {
    const loop = circuit(battery('V', 'a', '0', 1), battery('W', 'a', '0', 2));
    expect(failureOf(reduce(loop))).toBe('voltage-loop');
  });
});
