import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { advance } from '../../shared/engine/analyses/advance.ts';
import { compile } from '../../shared/engine/analyses/compile.ts';
import { operatingPoint } from '../../shared/engine/analyses/operating-point.ts';
import type { Circuit, Element } from '../../shared/engine/circuit/circuit.ts';
import {
  battery,
  capacitor,
  circuit,
  currentSource,
  diode,
  inductor,
  relativeError,
  resistor,
  solved,
} from './elements.ts';

const NODES = 7;
const node = fc.integer({ min: 0, max: NODES - 1 }).map(String);
/** 3 milliohm to 1e12 ohm, evenly in decades. */
const ohms = fc.double({ min: -2.5, max: 12, noNaN: true }).map((decade) => 10 ** decade);
const wires = fc.array(fc.tuple(node, node, ohms), { minLength: 1, maxLength: 16 });
const junctions = fc.array(fc.tuple(node, node, fc.boolean()), { maxLength: 4 });
const volts = fc.double({ min: -3000, max: 3000, noNaN: true });

function network(
  resistors: readonly (readonly [string, string, number])[],
  diodes: readonly (readonly [string, string, boolean])[] = [],
): Element[] {
  return [
    ...resistors.map(([a, b, r], n) => resistor(`R${n}`, a, b, r)),
    ...diodes.map(([a, b, isStack], n) =>
      diode(
        `D${n}`,
        a,
        b,
        isStack
          ? { saturationCurrent: 12e-9, emission: 26, seriesResistance: 20 }
          : { saturationCurrent: 1e-14, seriesResistance: 0.1 },
      ),
    ),
  ];
}

const isFinite = (values: Readonly<Record<string, number>>): boolean =>
  Object.values(values).every(Number.isFinite);

describe("Kirchhoff's current law", () => {
  it('holds to 1e-9 of the largest current at every node, from milliohms to teraohms', () => {
    fc.assert(
      fc.property(
        wires,
        junctions,
        volts,
        fc.double({ min: -2.5, max: 7, noNaN: true }),
        (w, d, v, inside) => {
          const whole = circuit(
            battery('V', 's', '0', v),
            resistor('RV', 's', '1', 10 ** inside),
            ...network(w, d),
          );
          const compiled = solved(compile(whole));
          expect(compiled.solve()).toBeUndefined();
          expect(compiled.kclResidual()).toBeLessThan(1e-9);
          const { voltages, currents } = compiled.point();
          expect(isFinite(voltages) && isFinite(currents)).toBe(true);
          expect(worstNode(whole, voltages, currents)).toBeLessThan(1e-9);
        },
      ),
      { numRuns: 300, seed: 1 },
    );
  });

  it('comes with currents that each obey their own resistor', () => {
    fc.assert(
      fc.property(wires, volts, (w, v) => {
        const whole = circuit(battery('V', '1', '0', v), ...network(w));
        const { voltages, currents } = solved(operatingPoint(whole));
        w.forEach(([a, b, r], n) => {
          const across = voltages[a]! - voltages[b]!;
          const law = r * currents[`R${n}`]!;
          // a voltage at 3 kV has a last digit of half a picovolt
          const digit = 4 * Number.EPSILON * (Math.abs(voltages[a]!) + Math.abs(voltages[b]!));
          expect(Math.abs(across - law)).toBeLessThanOrEqual(digit + 1e-9 * Math.abs(law) + 1e-300);
        });
      }),
      { numRuns: 200, seed: 2 },
    );
  });

  function worstNode(
    { elements }: Circuit,
    voltages: Readonly<Record<string, number>>,
    currents: Readonly<Record<string, number>>,
  ): number {
    let worst = 0;
    for (const name of Object.keys(voltages)) {
      if (name === '0') continue;
      let sum = 1e-12 * voltages[name]!;
      let largest = Math.abs(sum);
      for (const element of elements) {
        if (element.kind === 'coupling') continue;
        const amperes = currents[element.name]!;
        if (element.nodes[0] === element.nodes[1]) continue;
        if (element.nodes[0] === name) sum += amperes;
        else if (element.nodes[1] === name) sum -= amperes;
        else continue;
        largest = Math.max(largest, Math.abs(amperes));
      }
      if (largest > 1e-30) worst = Math.max(worst, Math.abs(sum) / largest);
    }
    return worst;
  }
});

describe('a network of resistors', () => {
  it('is reciprocal: a current here gives there what the same current there gives here', () => {
    fc.assert(
      fc.property(wires, (w) => {
        // tied to ground somewhere, so that a current has a way back
        const tied = [
          ...w,
          ...Array.from({ length: NODES - 1 }, (_, n) => [`${n + 1}`, '0', 1e4] as const),
        ];
        const across = (from: string, to: string): number =>
          solved(operatingPoint(circuit(currentSource('J', '0', from, 1e-3), ...network(tied))))
            .voltages[to]!;
        const [there, here] = [across('1', '4'), across('4', '1')];
        expect(Math.abs(there - here)).toBeLessThanOrEqual(1e-9 * Math.abs(there) + 1e-20);
      }),
      { numRuns: 100, seed: 3 },
    );
  });

  it('is passive: it takes power and no node leaves the range of its source', () => {
    fc.assert(
      fc.property(wires, volts, (w, v) => {
        const { voltages, currents } = solved(
          operatingPoint(circuit(battery('V', '1', '0', v), ...network(w))),
        );
        expect(v * -currents['V']!).toBeGreaterThanOrEqual(0);
        for (const at of Object.values(voltages)) {
          expect(at).toBeGreaterThanOrEqual(Math.min(0, v) - 1e-9 * Math.abs(v));
          expect(at).toBeLessThanOrEqual(Math.max(0, v) + 1e-9 * Math.abs(v));
        }
      }),
      { numRuns: 100, seed: 4 },
    );
  });

  it('has two in series equal to one, and two side by side', () => {
    fc.assert(
      fc.property(ohms, ohms, volts, (r, s, v) => {
        fc.pre(r < 1e9 && s < 1e9 && Math.abs(v) > 1e-3);
        const current = (...elements: Element[]): number =>
          solved(
            operatingPoint(circuit(battery('V', 'a', '0', v), ...elements), {
              groundConductance: 1e-30,
            }),
          ).currents['V']!;
        const two = current(resistor('R', 'a', 'm', r), resistor('S', 'm', '0', s));
        expect(relativeError(two, current(resistor('T', 'a', '0', r + s)))).toBeLessThan(1e-9);
        const beside = current(resistor('R', 'a', '0', r), resistor('S', 'a', '0', s));
        const one = current(resistor('T', 'a', '0', (r * s) / (r + s)));
        expect(relativeError(beside, one)).toBeLessThan(1e-9);
      }),
      { numRuns: 100, seed: 5 },
    );
  });
});

describe('a transient', () => {
  const farads = fc.double({ min: -9, max: -5, noNaN: true }).map((decade) => 10 ** decade);
  const charge = fc.double({ min: -2000, max: 2000, noNaN: true });

  it('conserves the charge of capacitors joined by anything', () => {
    fc.assert(
      fc.property(
        farads,
        farads,
        charge,
        charge,
        fc.double({ min: -2.5, max: 7, noNaN: true }),
        (c, d, u, v, decade) => {
          const joined = circuit(
            capacitor('C', 'a', '0', c),
            capacitor('D', 'b', '0', d),
            resistor('R', 'a', 'b', 10 ** decade),
          );
          // the conductance of the nodes themselves would leak over so many time constants
          const duration = Math.min(1e-3, 30 * 10 ** decade * Math.max(c, d));
          const { storage } = solved(
            advance(joined, { voltages: { C: u, D: v }, currents: {} }, duration),
          );
          const before = c * u + d * v;
          const after = c * storage.voltages['C']! + d * storage.voltages['D']!;
          const size = c * Math.abs(u) + d * Math.abs(v);
          const leak = 1e-12 * duration * (Math.abs(u) + Math.abs(v));
          expect(Math.abs(after - before)).toBeLessThanOrEqual(1e-9 * size + leak + 1e-30);
        },
      ),
      { numRuns: 60, seed: 6 },
    );
  });

  it('never gives back more energy than was stored', () => {
    fc.assert(
      fc.property(
        wires,
        junctions,
        farads,
        charge,
        fc.double({ min: -6, max: -1, noNaN: true }),
        (w, d, c, u, decade) => {
          const left = circuit(
            capacitor('C', '1', '2', c),
            capacitor('D', '3', '4', 1e-7),
            inductor('L', '5', '6', 0.5, 3),
            ...network(w, d),
          );
          const stored = { voltages: { C: u, D: 100 }, currents: { L: 0.1 } };
          const result = advance(left, stored, 10 ** decade, { observe: [['1', '2']] });
          const { storage, samples } = solved(result);
          const energy = (v: number, w: number, i: number): number =>
            (c * v * v + 1e-7 * w * w + 0.5 * i * i) / 2;
          const before = energy(u, 100, 0.1);
          const after = energy(
            storage.voltages['C']!,
            storage.voltages['D']!,
            storage.currents['L']!,
          );
          expect(after).toBeLessThanOrEqual(before * (1 + 1e-5));
          expect(samples.values[0]!.every(Number.isFinite)).toBe(true);
          expect(samples.time.at(-1)).toBeCloseTo(10 ** decade, 12);
        },
      ),
      { numRuns: 25, seed: 7 },
    );
  });

  it('answers the same to the last bit whatever was solved before', () => {
    const kept = circuit(
      battery('V', 'a', '0', 12),
      resistor('R', 'a', 'b', 1e3),
      diode('D', 'b', 'c', { saturationCurrent: 12e-9, emission: 26, seriesResistance: 20 }),
      capacitor('C', 'c', '0', 1e-6),
      resistor('B', 'c', '0', 1e7),
    );
    const run = () => solved(advance(kept, { voltages: { C: 3 }, currents: {} }, 2));
    const first = run();
    fc.assert(
      fc.property(
        wires,
        (w) => operatingPoint(circuit(battery('V', '1', '0', 9), ...network(w))).ok,
      ),
      { numRuns: 20, seed: 8 },
    );
    expect(run()).toEqual(first);
  });
});
