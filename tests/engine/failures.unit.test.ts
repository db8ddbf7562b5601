import { describe, expect, it } from 'vitest';
import { advance } from '../../shared/engine/analyses/advance.ts';
import { compile } from '../../shared/engine/analyses/compile.ts';
import { operatingPoint } from '../../shared/engine/analyses/operating-point.ts';
import { phasor } from '../../shared/engine/analyses/phasor.ts';
import { transient } from '../../shared/engine/analyses/transient.ts';
import type { Circuit, Element } from '../../shared/engine/circuit/circuit.ts';
import {
  battery,
  capacitor,
  circuit,
  coupling,
  currentSource,
  diode,
  failureOf,
  inductor,
  resistor,
  sine,
  solved,
} from './elements.ts';

const nothing = { voltages: {}, currents: {} };
const op = (...elements: Element[]) => operatingPoint(circuit(...elements));

describe('a bad element is a value, not an exception', () => {
  const good = resistor('R', 'a', '0', 1);
  const bad: [string, string, Element[]][] = [
    ['no resistance', 'X', [resistor('X', 'a', '0', 0)]],
    ['a negative resistance', 'X', [resistor('X', 'a', '0', -5)]],
    ['a resistance that is not a number', 'X', [resistor('X', 'a', '0', NaN)]],
    ['an endless resistance', 'X', [resistor('X', 'a', '0', Infinity)]],
    ['no capacitance', 'X', [capacitor('X', 'a', '0', 0)]],
    ['a start that is not a number', 'X', [capacitor('X', 'a', '0', 1e-6, NaN)]],
    ['a negative inductance', 'X', [inductor('X', 'a', '0', -1)]],
    ['a name used twice', 'R', [resistor('R', 'a', '0', 2)]],
    ['no name', '', [resistor('', 'a', '0', 2)]],
    ['a node without a name', 'X', [resistor('X', '', '0', 2)]],
    ['a coupling to nothing', 'K', [inductor('L1', 'a', '0', 1), coupling('K', 'L1', 'L2', 0.5)]],
    ['a coupling to itself', 'K', [inductor('L1', 'a', '0', 1), coupling('K', 'L1', 'L1', 0.5)]],
    [
      'a coupling beyond 1',
      'K',
      [inductor('L1', 'a', '0', 1), inductor('L2', 'b', '0', 1), coupling('K', 'L1', 'L2', 1.01)],
    ],
    [
      'couplings that would store negative energy',
      'K1',
      [
        ...['L1', 'L2', 'L3'].map((name) => inductor(name, name, '0', 1)),
        coupling('K1', 'L1', 'L2', 0.9),
        coupling('K2', 'L2', 'L3', 0.9),
        coupling('K3', 'L1', 'L3', -0.9),
      ],
    ],
    [
      'a pair coupled twice',
      'K2',
      [
        inductor('L1', 'a', '0', 1),
        inductor('L2', 'b', '0', 1),
        coupling('K1', 'L1', 'L2', 0.5),
        coupling('K2', 'L2', 'L1', 0.5),
      ],
    ],
    [
      'a wave that is not a number',
      'X',
      [battery('X', 'a', '0', { ...sine(1, 50), offset: NaN } as never)],
    ],
    ['no saturation current', 'X', [diode('X', 'a', '0', { saturationCurrent: 0 })]],
  ];
  it.each(bad)('%s', (_, name, elements) => {
    const result = op(good, ...elements);
    expect(result).toMatchObject({ ok: false, failure: { code: 'bad-element', element: name } });
    expect(result.ok || result.failure.message.length).toBeGreaterThan(5);
    expect(failureOf(advance(circuit(good, ...elements), nothing, 1))).toBe('bad-element');
  });

  it('a duration or a frequency that cannot be', () => {
    const rc = circuit(good, capacitor('C', 'a', '0', 1));
    for (const duration of [-1, NaN, Infinity]) {
      expect(failureOf(advance(rc, nothing, duration))).toBe('bad-element');
      expect(failureOf(phasor(rc, [duration]))).toBe('bad-element');
      expect(failureOf(transient(rc, { stop: duration, step: 1 }))).toBe('bad-element');
    }
  });
});

describe('a circuit without a single answer', () => {
  it.each<[string, Element[]]>([
    ['two batteries side by side', [battery('V1', 'a', '0', 1), battery('V2', 'a', '0', 2)]],
    ['two equal batteries side by side', [battery('V1', 'a', '0', 1), battery('V2', 'a', '0', 1)]],
    ['a battery on one node', [battery('V1', 'a', 'a', 1), resistor('R', 'a', '0', 1)]],
    [
      'three batteries in a ring',
      [battery('V1', 'a', '0', 1), battery('V2', 'b', 'a', 1), battery('V3', 'b', '0', 2)],
    ],
    [
      'a battery on a coil without resistance',
      [battery('V', 'a', '0', 1), inductor('L', 'a', '0', 1)],
    ],
    [
      'two coils side by side without resistance',
      [inductor('L1', 'a', '0', 1), inductor('L2', 'a', '0', 1), resistor('R', 'a', '0', 1)],
    ],
  ])('%s', (_, elements) => {
    expect(failureOf(op(...elements))).toBe('voltage-loop');
    expect(failureOf(compile(circuit(...elements)))).toBe('voltage-loop');
  });

  it('takes a coil on a battery once time passes', () => {
    const coil = circuit(battery('V', 'a', '0', 3), inductor('L', 'a', '0', 2));
    expect(solved(advance(coil, nothing, 4)).storage.currents['L']).toBeCloseTo(6, 6);
    expect(failureOf(transient(coil, { step: 1, stop: 4 }))).toBe('voltage-loop');
  });

  it('names the node a current is driven into without a way back', () => {
    expect(op(currentSource('J', '0', 'x', 1e-3), resistor('R', 'a', '0', 1))).toMatchObject({
      ok: false,
      failure: { code: 'floating-node', node: 'x' },
    });
    const held = op(currentSource('J', '0', 'x', 0), resistor('R', 'a', '0', 1));
    expect(solved(held).voltages['x']).toBe(0);
  });

  it('names the node nothing holds when told to put no conductance on nodes', () => {
    const island: Circuit = circuit(battery('V', 'a', 'b', 1), resistor('R', 'a', 'b', 1));
    expect(failureOf(operatingPoint(island, { groundConductance: 0 }))).toBe('floating-node');
    const { voltages } = solved(operatingPoint(island));
    expect(voltages['a']! - voltages['b']!).toBeCloseTo(1, 9);
    expect(voltages['a']! + voltages['b']!).toBeCloseTo(0, 6);
  });

  it('says so when a switch has no state that agrees with its control', () => {
    const relay = op(battery('V', 'a', '0', 10), resistor('R', 'a', 'b', 100), {
      kind: 'switch',
      name: 'S',
      nodes: ['b', '0'],
      control: ['b', '0'],
      model: { threshold: 5, hysteresis: 0, onResistance: 1, offResistance: 1e6 },
    });
    expect(relay).toMatchObject({ ok: false, failure: { code: 'not-converged', node: 'b' } });
  });
});

describe('a lifted node', () => {
  it('is legal and rests at ground', () => {
    const { voltages } = solved(
      op(
        battery('V', 'a', '0', 5),
        resistor('R', 'a', '0', 10),
        resistor('lifted', 'x', 'y', 0.003),
        capacitor('C', 'a', 'z', 1e-6),
      ),
    );
    for (const node of ['x', 'y', 'z']) expect(voltages[node]).toBe(0);
  });

  it('follows what it hangs from', () => {
    const { voltages } = solved(op(battery('V', 'a', '0', 5), resistor('lead', 'a', 'tip', 1e6)));
    expect(voltages['tip']).toBeCloseTo(5 / (1 + 1e-6), 9);
  });

  it('leaves an element with both ends on one node without current', () => {
    const { currents } = solved(
      op(battery('V', 'a', '0', 5), resistor('R', 'a', '0', 10), resistor('loop', 'a', 'a', 1)),
    );
    expect(currents['loop']).toBeCloseTo(0, 15);
  });
});
