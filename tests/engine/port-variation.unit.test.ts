import { describe, expect, it } from 'vitest';
import { reduce } from '../../shared/engine/analyses/port-reduction.ts';
import { variations } from '../../shared/engine/analyses/port-variation.ts';
import { changeAtRest, noChange } from '../../shared/engine/circuit/circuit-change.ts';
import type { Element } from '../../shared/engine/circuit/circuit.ts';
import { seededUniform } from '../../shared/engine/quantities/seeded-uniform.ts';

const resistor = (name: string, from: string, to: string, resistance: number): Element => ({
  kind: 'resistor',
  name,
  nodes: [from, to],
  resistance,
});
const diode = (name: string, from: string, to: string): Element => ({
  kind: 'diode',
  name,
  nodes: [from, to],
  model: { saturationCurrent: 12e-9, emission: 26, seriesResistance: 20 },
});
const METER = { openVolts: 3, sourceResistance: 1000 };

function probe(before: readonly Element[], after: readonly Element[], pair: [string, string]) {
  const change = changeAtRest(before, after);
  const made = variations({ elements: before });
  if (change === null || !made.ok) throw new Error('the change cannot be made');
  const reading = made.value.vary(change) ? made.value.probe(...pair, METER) : undefined;
  if (reading === undefined) throw new Error('the change has no answer');
  return reading;
}

/** Ohm that the meter sees. */
const ohms = ({ volts, amps }: { volts: number; amps: number }) => volts / amps;

describe('a circuit changed in a few elements', () => {
  // a 10 - b 20 - 0, and 30 from a to 0: 15 Ohm between a and 0, 7.5 between a and b (10 || 50)... by hand below
  const ladder = [
    resistor('R1', 'a', 'b', 10),
    resistor('R2', 'b', '0', 20),
    resistor('R3', 'a', '0', 30),
  ];
  const without = (name: string) => ladder.filter((element) => element.name !== name);

  it('unchanged, is itself: 30 beside 30', () => {
    const made = variations({ elements: ladder });
    if (!made.ok) throw new Error(made.failure.message);
    expect(made.value.vary(noChange)).toBe(true);
    expect(ohms(made.value.probe('a', '0', METER)!)).toBeCloseTo(15, 8);
  });

  it('cut, loses the branch: 30 alone', () => {
    expect(ohms(probe(ladder, without('R1'), ['a', '0']))).toBeCloseTo(30, 8);
  });

  it('raised by twelve decades, is as good as cut', () => {
    const after = [...without('R1'), resistor('R1', 'a', 'b', 1e12)];
    expect(ohms(probe(ladder, after, ['a', '0']))).toBeCloseTo(30, 6);
  });

  it('lowered by eleven decades, keeps its digits', () => {
    const gap = [...without('R1'), resistor('R1', 'a', 'b', 1e9)];
    const closed = [...without('R1'), resistor('R1', 'a', 'b', 0.02)];
    expect(ohms(probe(gap, closed, ['a', 'b']))).toBeCloseTo(1 / (1 / 0.02 + 1 / 50), 9);
  });

  it('takes new branches through new nodes: 30 beside 4 + 6 in series', () => {
    const after = [...without('R1'), resistor('N1', 'a', 'new', 4), resistor('N2', 'new', '0', 6)];
    expect(ohms(probe(ladder, after, ['a', '0']))).toBeCloseTo(7.5, 8);
  });

  it('takes a wire without resistance, and one that ends nowhere', () => {
    const wire: Element = { kind: 'inductor', name: 'L', nodes: ['a', 'b'], inductance: 1 };
    expect(ohms(probe(ladder, [...ladder, wire], ['a', '0']))).toBeCloseTo(12, 8);
    const stub = resistor('N', 'a', 'nowhere', 1);
    expect(ohms(probe(ladder, [...ladder, stub], ['a', '0']))).toBeCloseTo(15, 8);
  });

  it('says that it cannot take a new source', () => {
    const source: Element = {
      kind: 'voltage-source',
      name: 'V',
      nodes: ['a', '0'],
      wave: { shape: 'dc', value: 1 },
    };
    expect(changeAtRest(ladder, [...ladder, source])).toBeNull();
  });
});

describe('a changed circuit with junctions', () => {
  const base = [resistor('R1', 'a', 'b', 100), diode('D', 'b', '0'), resistor('R2', 'a', '0', 1e6)];
  const whole = (elements: readonly Element[], pair: [string, string]) => {
    const reduced = reduce({ elements });
    if (!reduced.ok) throw new Error(reduced.failure.message);
    const read = reduced.value.probe(...pair, METER);
    if (!read.ok) throw new Error(read.failure.message);
    return read.value;
  };
  const changes: [string, readonly Element[]][] = [
    ['the same', base],
    ['reversed', [base[0]!, diode('D', '0', 'b'), base[2]!]],
    ['gone', [base[0]!, base[2]!]],
    ['shorted', [...base, resistor('S', 'b', '0', 0.1)]],
    ['two in series', [base[0]!, diode('D', 'b', 'n'), diode('E', 'n', '0'), base[2]!]],
    ['one more beside it', [...base, diode('E', 'a', '0')]],
  ];
  it.each(changes)('%s, reads what it reads solved whole', (_, after) => {
    for (const pair of [
      ['a', '0'],
      ['0', 'a'],
      ['b', 'a'],
    ] as [string, string][]) {
      const fast = probe(base, after, pair);
      const slow = whole(after, pair);
      // the new node lacks its 1e-12 S: 7e-10 V of three
      expect(fast.volts).toBeCloseTo(slow.volts, 8);
    }
  });
});

describe('random circuits with random changes', () => {
  it('read what they read solved whole', () => {
    let compared = 0;
    for (let seed = 1; seed <= 200; seed += 1) {
      const draw = (key: string) => seededUniform(seed, key);
      const node = (key: string) => `n${Math.floor(7 * draw(key))}`.replace('n0', '0');
      const value = (key: string) => 10 ** (-2 + 11 * draw(key));
      const elements = Array.from({ length: 14 }, (_, at): Element => {
        const nodes = [node(`from ${at}`), node(`to ${at}`)] as const;
        return at % 5 === 4
          ? diode(`E${at}`, ...nodes)
          : resistor(`E${at}`, ...nodes, value(`of ${at}`));
      });
      const touched = new Set([Math.floor(14 * draw('first')), Math.floor(14 * draw('second'))]);
      const after = elements.flatMap((element, at): Element[] => {
        if (!touched.has(at)) return [element];
        if (draw(`how ${at}`) < 0.3) return [];
        if (element.kind === 'resistor') return [{ ...element, resistance: value(`then ${at}`) }];
        return [
          diode(element.name, node(`then from ${at}`), `fresh ${at}`),
          resistor(`F${at}`, `fresh ${at}`, node(`then to ${at}`), value(`then ${at}`)),
        ];
      });
      const made = variations({ elements });
      const reduced = reduce({ elements: after });
      const change = changeAtRest(elements, after);
      if (!made.ok || !reduced.ok || change === null) continue;
      made.value.vary(change);
      for (const [red, black] of [
        ['n1', 'n2'],
        ['n3', '0'],
        ['n5', 'n4'],
      ] as const) {
        const fast = made.value.probe(red, black, METER);
        const slow = reduced.value.probe(red, black, METER);
        if (fast === undefined || !slow.ok) continue;
        compared += 1;
        expect(
          Math.abs(fast.volts - slow.value.volts),
          `seed ${seed} ${red} ${black}`,
        ).toBeLessThan(1e-7 * Math.abs(slow.value.volts) + 1e-9);
      }
    }
    expect(compared).toBeGreaterThan(400);
  });
});
