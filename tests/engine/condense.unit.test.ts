import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { operatingPoint } from '../../shared/engine/analyses/operating-point.ts';
import type { Circuit, Element, OperatingPoint } from '../../shared/engine/circuit/circuit.ts';
import { condense } from '../../shared/engine/circuit/condense.ts';

const resistor = (name: string, a: string, b: string, resistance: number): Element => ({
  kind: 'resistor',
  name,
  nodes: [a, b],
  resistance,
});
const battery: Element = {
  kind: 'voltage-source',
  name: 'v',
  nodes: ['a', '0'],
  wave: { shape: 'dc', value: 12.6 },
};

function solved(circuit: Circuit): OperatingPoint {
  const point = operatingPoint(circuit);
  if (!point.ok) throw new Error(point.failure.message);
  return point.value;
}

describe('a condensed circuit', () => {
  it('makes one resistor of a chain with a branch that leads nowhere', () => {
    const chain = [
      battery,
      resistor('1', 'a', 'b', 10),
      resistor('2', 'b', 'c', 20),
      resistor('3', 'c', '0', 30),
      resistor('end', 'b', 'd', 5),
      resistor('further', 'd', 'e', 5),
    ];
    expect(condense({ elements: chain }, new Set()).elements).toEqual([
      battery,
      resistor('a~0', 'a', '0', 60),
    ]);
  });

  it('makes a triangle of a star: 1, 2 and 3 ohm are 11/3, 11/2 and 11 ohm', () => {
    const held = ['a', 'b', 'c'].map((node): Element => ({
      kind: 'capacitor',
      name: `at ${node}`,
      nodes: [node, '0'],
      capacitance: 1e-6,
    }));
    const star = ['a', 'b', 'c'].map((node, at) => resistor(node, node, 'middle', at + 1));
    const sizes = condense({ elements: [...held, ...star] }, new Set()).elements.flatMap((one) =>
      one.kind === 'resistor' ? [one.resistance] : [],
    );
    expect(sizes.sort((p, q) => p - q)).toEqual([11 / 3, 5.5, 11]);
  });

  it('gives the source the same current, and keeps what it is told to', () => {
    const nodes = ['0', 'a', 'b', 'c', 'd', 'e', 'f'];
    const mesh = fc.array(
      fc.tuple(
        fc.constantFrom(...nodes),
        fc.constantFrom(...nodes),
        fc.double({ min: -2, max: 6, noNaN: true }),
      ),
      { minLength: 4, maxLength: 14 },
    );
    fc.assert(
      fc.property(mesh, (drawn) => {
        const kept = resistor('kept', 'a', 'b', 100);
        const elements = drawn
          .filter(([a, b]) => a !== b)
          .map(([a, b, decade], at) => resistor(`r${at}`, a, b, 10 ** decade));
        const ties = nodes.slice(1).map((node) => resistor(`tie ${node}`, node, '0', 1e5));
        const whole = { elements: [battery, kept, ...elements, ...ties] };
        const small = condense(whole, new Set(['kept']));
        expect(small.elements).toContainEqual(kept);
        const [one, other] = [solved(whole), solved(small)];
        const current = one.currents['v']!;
        expect(Math.abs(current - other.currents['v']!)).toBeLessThan(1e-7 * Math.abs(current));
        expect(Math.abs(one.voltages['b']! - other.voltages['b']!)).toBeLessThan(1e-6);
      }),
      { numRuns: 200, seed: 7 },
    );
  });
});
