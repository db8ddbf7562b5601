import { describe, expect, it } from 'vitest';
import type { Circuit, Element } from '../../../shared/engine/circuit/circuit.ts';
import { readDeck } from '../../../shared/engine/deck/read-deck.ts';
import { writeDeck } from '../../../shared/engine/deck/write-deck.ts';

const readBack = (circuit: Circuit): readonly Element[] => {
  const written = writeDeck(circuit);
  const read = readDeck(['t', ...written.lines, '.op'].join('\n'));
  if (!read.ok) throw new Error(`${JSON.stringify(read.failure)}\n${written.lines.join('\n')}`);
  return read.value.circuit.elements;
};

const DIODE = { saturationCurrent: 12e-9, emission: 26, seriesResistance: 20 };
const SWITCH = { threshold: 2.5, hysteresis: 0.5, onResistance: 0.03, offResistance: 1e9 };

/** One of each kind, named as a deck may name them. */
const WHOLE: readonly Element[] = [
  { kind: 'resistor', name: 'r1', nodes: ['a', '0'], resistance: 1 / 3 },
  {
    kind: 'capacitor',
    name: 'c1',
    nodes: ['a', 'b'],
    capacitance: 0.95e-6,
    initialVoltage: -2969.85,
  },
  { kind: 'capacitor', name: 'c2', nodes: ['a', 'b'], capacitance: 1e-30 },
  { kind: 'inductor', name: 'l1', nodes: ['a', 'b'], inductance: 49, initialCurrent: 1e-3 },
  { kind: 'inductor', name: 'l2', nodes: ['b', '0'], inductance: 0.16 },
  { kind: 'coupling', name: 'k1', inductors: ['l1', 'l2'], coefficient: -0.97 },
  { kind: 'voltage-source', name: 'v1', nodes: ['d', '0'], wave: { shape: 'dc', value: 1e21 } },
  {
    kind: 'voltage-source',
    name: 'v2',
    nodes: ['e', '0'],
    dc: 3,
    ac: { magnitude: 120, phaseDegrees: -30 },
    wave: {
      shape: 'sine',
      offset: 1,
      amplitude: 169.7056274847714,
      frequency: 60,
      delay: 1e-3,
      damping: 5,
      phaseDegrees: 30,
    },
  },
  {
    kind: 'current-source',
    name: 'i1',
    nodes: ['0', 'a'],
    wave: {
      shape: 'pulse',
      low: -1,
      high: 5,
      delay: -1e-3,
      rise: 1e-6,
      fall: 2e-6,
      width: 1e-3,
      period: 4e-3,
    },
  },
  { kind: 'diode', name: 'd1', nodes: ['a', 'b'], model: DIODE },
  {
    kind: 'diode',
    name: 'd2',
    nodes: ['a', '0'],
    model: { ...DIODE, breakdownVoltage: 12000, breakdownCurrent: 1e-6 },
  },
  {
    kind: 'switch',
    name: 's1',
    nodes: ['a', 'b'],
    control: ['d', '0'],
    model: SWITCH,
    isInitiallyOn: true,
  },
  {
    kind: 'switch',
    name: 's2',
    nodes: ['a', 'b'],
    control: ['d', '0'],
    model: SWITCH,
    isInitiallyOn: false,
  },
];

describe('a circuit written as a deck', () => {
  it('reads back as it was, to the last bit', () => {
    expect(readBack({ elements: WHOLE })).toEqual(WHOLE);
  });

  it('gives equal models one line', () => {
    const { lines } = writeDeck({ elements: WHOLE });
    expect(lines.filter((line) => line.startsWith('.model'))).toHaveLength(3);
  });

  it('makes up names that a deck cannot hold, and says which', () => {
    const written = writeDeck({
      elements: [
        { kind: 'resistor', name: 'C1 bleeder', nodes: ['C1.1', 'C1.2'], resistance: 1e7 },
        { kind: 'resistor', name: 'R1', nodes: ['C1.2', 'gnd'], resistance: 1 },
        { kind: 'resistor', name: 'r1', nodes: ['gnd', '0'], resistance: 2 },
        {
          kind: 'voltage-source',
          name: 'mains',
          nodes: ['n1', '0'],
          wave: { shape: 'dc', value: 1 },
        },
      ],
    });
    const nodes = [...written.nodes];
    expect(nodes.map(([name]) => name)).toEqual(['0', 'C1.1', 'C1.2', 'gnd', 'n1']);
    expect(new Set(nodes.map(([, node]) => node)).size).toBe(nodes.length);
    expect(nodes.every(([, node]) => /^[a-z0-9_]+$/.test(node) && node !== 'gnd')).toBe(true);
    expect(written.elements.get('mains')).toMatch(/^v\d+$/);
    expect(new Set(written.elements.values()).size).toBe(4);
    expect(readDeck(['t', ...written.lines, '.op'].join('\n'))).toMatchObject({ ok: true });
  });

  it('gives the series resistance of a winding a resistor of its own', () => {
    const elements = readBack({
      elements: [
        { kind: 'inductor', name: 'l1', nodes: ['a', '0'], inductance: 2, seriesResistance: 95 },
        { kind: 'resistor', name: 'r1', nodes: ['a', '0'], resistance: 1 },
      ],
    });
    const [winding, series] = elements;
    expect(winding).toMatchObject({ kind: 'inductor', inductance: 2 });
    expect(series).toMatchObject({
      kind: 'resistor',
      resistance: 95,
      nodes: [expect.any(String), '0'],
    });
    if (winding?.kind !== 'inductor' || series?.kind !== 'resistor') expect.fail('other kinds');
    expect(winding.nodes).toEqual(['a', series.nodes[0]]);
  });
});
