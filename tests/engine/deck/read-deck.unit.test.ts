import { describe, expect, it } from 'vitest';
import type { Element } from '../../../shared/engine/circuit/circuit.ts';
import type { Deck } from '../../../shared/engine/deck/deck.ts';
import { readDeck } from '../../../shared/engine/deck/read-deck.ts';

const deckOf = (text: string): Deck => {
  const read = readDeck(text);
  if (!read.ok) throw new Error(JSON.stringify(read.failure));
  return read.value;
};

/** The element named, from a deck made sound around the lines given. */
const elementOf = (name: string, ...lines: string[]): Element => {
  const deck = deckOf(['title', ...lines, 'RGROUND a 0 1', '.op', '.end'].join('\n'));
  const element = deck.circuit.elements.find((candidate) => candidate.name === name);
  if (element === undefined) throw new Error(`no ${name}`);
  return element;
};

describe('the form of a deck', () => {
  it('takes the first line as the title, whatever it holds', () => {
    expect(deckOf('R9 x 0 nonsense\nR1 a 0 1\n.op').title).toBe('R9 x 0 nonsense');
  });

  it('joins continuations over comments and blank lines', () => {
    const deck = deckOf('t\nR1\n+ a\n* comment\n\n+ 0 ; more\n  + 4.7k\n.op\n');
    expect(deck.circuit.elements).toEqual([
      { kind: 'resistor', name: 'r1', nodes: ['a', '0'], resistance: 4700 },
    ]);
  });

  it('drops comments at the end of lines', () => {
    const deck = deckOf('t\nR1 a 0 1k ; load $ x\nR2 a 0 2k $ R3\nR3 a 0 3k;\n.op $');
    const values = deck.circuit.elements.map((e) => (e.kind === 'resistor' ? e.resistance : 0));
    expect(values).toEqual([1000, 2000, 3000]);
  });

  it('keeps a dollar inside a word', () => {
    expect(elementOf('r1', 'R1 a b$c 1')).toMatchObject({ nodes: ['a', 'b$c'] });
  });

  it('knows no case, and takes gnd for ground', () => {
    expect(elementOf('r1', 'r1 OUT GND 1K')).toMatchObject({ nodes: ['out', '0'] });
  });

  it('reads nothing after .end, and needs none', () => {
    expect(deckOf('t\nR1 a 0 1\n.op\n.END\nQ1 nonsense').circuit.elements).toHaveLength(1);
    expect(deckOf('t\r\nR1 a 0 1\r\n.op').circuit.elements).toHaveLength(1);
  });

  it('says on which line each element stands', () => {
    const deck = deckOf('t\n\nR1 a\n+ 0 1\n* c\nC1 a 0 1u\n.op');
    expect([...deck.lineOf]).toEqual([
      ['r1', 3],
      ['c1', 6],
    ]);
  });
});

describe('elements', () => {
  it('reads capacitors, inductors and couplings', () => {
    expect(elementOf('c1', 'C1 a b 0.95uF IC=-100')).toEqual({
      kind: 'capacitor',
      name: 'c1',
      nodes: ['a', 'b'],
      capacitance: 0.95e-6,
      initialVoltage: -100,
    });
    expect(elementOf('l1', 'L1 a b 49 ic = 2m')).toEqual({
      kind: 'inductor',
      name: 'l1',
      nodes: ['a', 'b'],
      inductance: 49,
      initialCurrent: 2e-3,
    });
    expect(elementOf('k1', 'K1 L1 L2 0.97', 'L1 a 0 1', 'L2 b 0 1')).toEqual({
      kind: 'coupling',
      name: 'k1',
      inductors: ['l1', 'l2'],
      coefficient: 0.97,
    });
  });

  it.each([
    ['V1 a 0 5', { wave: { shape: 'dc', value: 5 } }],
    ['V1 a 0 DC -5', { wave: { shape: 'dc', value: -5 } }],
    ['V1 a 0 AC 2', { wave: { shape: 'dc', value: 0 }, ac: { magnitude: 2, phaseDegrees: 0 } }],
    [
      'V1 a 0 1 AC 2 -30',
      { wave: { shape: 'dc', value: 1 }, ac: { magnitude: 2, phaseDegrees: -30 } },
    ],
  ])('%s', (line, expected) => {
    expect(elementOf('v1', line)).toEqual({
      kind: 'voltage-source',
      name: 'v1',
      nodes: ['a', '0'],
      ...expected,
    });
  });

  it('keeps a direct value beside a wave', () => {
    expect(elementOf('i1', 'I1 a 0 DC 2 SIN(1 5 60 1m 100 30)')).toEqual({
      kind: 'current-source',
      name: 'i1',
      nodes: ['a', '0'],
      dc: 2,
      wave: {
        shape: 'sine',
        offset: 1,
        amplitude: 5,
        frequency: 60,
        delay: 1e-3,
        damping: 100,
        phaseDegrees: 30,
      },
    });
  });

  it('fills a pulse from .tran as SPICE does', () => {
    const deck = deckOf('t\nV1 a 0 PULSE(0 5 1m)\nR1 a 0 1\n.tran 10u 2m');
    expect(deck.circuit.elements[0]).toMatchObject({
      wave: { low: 0, high: 5, delay: 1e-3, rise: 1e-5, fall: 1e-5, width: 2e-3, period: 2e-3 },
    });
    const whole = deckOf('t\nV1 a 0 pulse 0 5 1m 2u 3u 4m 9m AC 1\nR1 a 0 1\n.tran 10u 2m');
    expect(whole.circuit.elements[0]).toMatchObject({
      ac: { magnitude: 1 },
      wave: { rise: 2e-6, fall: 3e-6, width: 4e-3, period: 9e-3 },
    });
  });

  it('reads diodes and switches with their models, wherever those stand', () => {
    const models = '.model hv D(IS=12n, N=26\n+ RS=20 BV=12k IBV=1u)\n.model k1 sw vt=2 vh = 0.5';
    const deck = deckOf(`t\nD1 a 0 HV\nS1 a 0 c 0 K1 ON\nS2 a 0 c 0 k1\n${models}\n.op`);
    expect(deck.circuit.elements).toMatchObject([
      {
        kind: 'diode',
        model: {
          saturationCurrent: 12e-9,
          emission: 26,
          seriesResistance: 20,
          breakdownVoltage: 12000,
          breakdownCurrent: 1e-6,
        },
      },
      {
        kind: 'switch',
        control: ['c', '0'],
        isInitiallyOn: true,
        model: { threshold: 2, hysteresis: 0.5, onResistance: 1, offResistance: 1e12 },
      },
      { kind: 'switch', isInitiallyOn: false },
    ]);
  });

  it('gives a bare diode model the values of SPICE', () => {
    expect(elementOf('d1', 'D1 a 0 plain', '.model plain D')).toMatchObject({
      model: { saturationCurrent: 1e-14, emission: 1, seriesResistance: 0 },
    });
  });
});

describe('commands', () => {
  it('reads .tran with all it may have', () => {
    expect(deckOf('t\nR1 a 0 1\n.tran 1u 1m 0.2m 5u UIC').transient).toEqual({
      step: 1e-6,
      stop: 1e-3,
      start: 0.2e-3,
      maxStep: 5e-6,
      useInitialConditions: true,
    });
    expect(deckOf('t\nR1 a 0 1\n.tran 1u 1m uic').transient).toEqual({
      step: 1e-6,
      stop: 1e-3,
      useInitialConditions: true,
    });
  });

  it('reads .ic, more than once', () => {
    const deck = deckOf('t\nR1 a b 1\nR2 b 0 1\n.ic V(a)=1 v(B) = -2m\n.ic v(0)=0\n.op');
    expect([...deck.initialVoltages]).toEqual([
      ['a', 1],
      ['b', -2e-3],
      ['0', 0],
    ]);
  });

  it.each([
    ['lin 3 50 60', [50, 55, 60]],
    ['lin 1 400 500', [400]],
    ['lin 3 0 10', [0, 5, 10]],
    ['oct 1 3 25', [3, 6, 12, 24]],
    ['dec 1 1 100', [1, 10, 100]],
    ['dec 10 60 60', [60]],
  ])('.ac %s', (sweep, expected) => {
    const found = deckOf(`t\nR1 a 0 1\n.ac ${sweep}`).frequencies!;
    expect(found).toHaveLength(expected.length);
    found.forEach((frequency, at) => expect(frequency).toBeCloseTo(expected[at]!, 9));
  });

  it('ends a decade sweep on its last frequency, as ngspice does', () => {
    // what ngspice 39 printed for `ac dec 3 1 50`
    const printed = [
      1, 2.186724147886556, 4.78176249895018, 10.45639552591273, 22.8652525963663, 50,
    ];
    const found = deckOf('t\nR1 a 0 1\n.ac dec 3 1 50').frequencies!;
    expect(found).toHaveLength(printed.length);
    found.forEach((frequency, at) => expect(frequency).toBeCloseTo(printed[at]!, 9));
  });
});
