import { describe, expect, it } from 'vitest';
import { readDeck } from '../../../shared/engine/deck/read-deck.ts';
import { solveDeck, type DeckAnswer } from '../../../shared/engine/deck/solve-deck.ts';

const answerTo = (text: string): DeckAnswer => {
  const read = readDeck(text);
  if (!read.ok) throw new Error(JSON.stringify(read.failure));
  const solved = solveDeck(read.value);
  if (!solved.ok) throw new Error(solved.failure.message);
  return solved.value;
};

/** Published exercises and hand calculations; their origins are in the golden folders of the same circuits. */
const KNOWN: readonly (readonly [string, string, Record<string, number>])[] = [
  [
    'Wheatstone bridge: 4/821 A through the galvanometer',
    'V1 a 0 10\nR1 a b 100\nR2 b 0 10\nR3 0 d 5\nR4 d a 60\nR5 b g 15\nVG g d 0',
    { 'v(b)': 710 / 821, 'v(d)': 650 / 821, 'i(vg)': 4 / 821 },
  ],
  [
    'two sources on two nodes',
    'VA a 0 15\nR1 a x 1\nR2 x 0 1\nR3 x y 0.5\nR4 y 0 2\nVB b 0 20\nR5 b y 1',
    { 'v(x)': 9.25, 'v(y)': 11, 'i(va)': -5.75, 'i(vb)': -9 },
  ],
  [
    'bridged-T of 20 dB',
    'V1 s 0 2\nR1 s i 600\nR2 i m 600\nR3 m o 600\nR4 m 0 66.66666666666667\nR5 i o 5400\nR6 o 0 600',
    { 'v(i)': 1, 'v(o)': 0.1 },
  ],
  [
    '10 MOhm beside 10 MOhm: nothing else draws',
    'V1 s 0 9\nR1 s a 10meg\nR2 a 0 10meg',
    { 'v(a)': 4.5 },
  ],
];

describe('operating points of decks', () => {
  it.each(KNOWN)('%s', (_name, lines, expected) => {
    const { op } = answerTo(`t\n${lines}\n.op`);
    for (const [signal, value] of Object.entries(expected)) {
      expect(op?.[signal], signal).toBeCloseTo(value, 10);
    }
  });

  it.each([
    // Lambert W with Vt 25.8520 mV: 4.307456 mA, 0.692544 V
    [5, '1k', 'IS=1e-14', 0.692544, 4.307456e-3],
    [1, '100', 'IS=1e-12', 0.57325, 4.267501e-3],
    [3, '10k', 'IS=1e-9 N=2', 0.639668, 0.236033e-3],
    // the rectifier as thirteen junctions of n = 2: 8.465 V at 12 V, 8.555 V at 12.6 V
    [12, '1k', 'IS=12n N=26', 8.465, 3.535e-3],
    [12.6, '1k', 'IS=12n N=26', 8.555, 4.045e-3],
  ])('%d V through %s into D(%s)', (volts, resistance, model, across, amperes) => {
    const { op } = answerTo(
      `t\nV1 s 0 ${volts}\nR1 s a ${resistance}\nD1 a 0 m\n.model m D(${model})\n.op`,
    );
    expect(op?.['v(a)']).toBeCloseTo(across, across > 1 ? 3 : 5);
    expect(-op!['i(v1)']!).toBeCloseTo(amperes, across > 1 ? 6 : 8);
  });

  it('lets a part of the circuit float', () => {
    const { op } = answerTo('t\nV1 s 0 9\nR1 s a 1meg\nR2 b c 1k\nC1 a b 1u\nR3 a 0 1meg\n.op');
    expect(op).toMatchObject({ 'v(b)': 0, 'v(c)': 0 });
    expect(op?.['v(a)']).toBeCloseTo(4.5, 10);
  });
});

describe('a lead that ends nowhere', () => {
  // the only current at n7 is rounding; with no conductance on the nodes at all this was refused
  const lines = `r1 n1 0 1130\nr2 n2 0 161900\nr3 n3 0 41.98\nr4 n4 n1 3353\nr5 n5 0 55680
r6 n6 n5 144.4\nr7 n7 n5 50.18\nr8 n8 0 14090\nr9 n9 n4 75.36\nc1 n1 n7 1.925e-10
d10 n4 n9 a\nd11 n4 n6 b\nd12 n8 n6 c\nv1 s 0 -29.67\nr13 s n8 1.383\ni1 n6 n3 2.879m
.model a d(is=7.099n n=26 rs=14.06)\n.model b d(is=38.02p n=1.419 rs=11.2 bv=12.92)
.model c d(is=28.55n n=26 rs=5.606)`;

  it('has the voltage of its other end', () => {
    const { op } = answerTo(`t\n${lines}\n.op`);
    expect(op?.['v(n7)']).toBeCloseTo(op!['v(n5)']!, 12);
    expect(op?.['v(n7)']).toBeLessThan(-10);
  });
});

describe('transients of decks', () => {
  it('answers at the multiples of the step, from the start', () => {
    const { tran } = answerTo('t\nV1 a 0 SIN(0 1 50)\nR1 a 0 1k\n.tran 1m 10m 4m');
    const time = Array.from({ length: 7 }, (_, index) => (4 + index) * 1e-3);
    expect(tran!['time']).toHaveLength(7);
    time.forEach((at, index) => {
      expect(tran!['time']![index]).toBeCloseTo(at, 12);
      expect(tran!['v(a)']![index]).toBeCloseTo(Math.sin(2 * Math.PI * 50 * at), 9);
      expect(tran!['i(v1)']![index]).toBeCloseTo(-1e-3 * Math.sin(2 * Math.PI * 50 * at), 12);
    });
  });

  it("starts from .ic with and without uic, and a capacitor's own start goes first", () => {
    const circuit = 't\nR1 a 0 1k\nC1 a 0 1u\nR2 b 0 1k\nC2 b 0 1u IC=5\n.ic V(a)=2 V(b)=3\n';
    const told = answerTo(`${circuit}.tran 1m 1m uic`).tran!;
    expect(told['v(a)']![1]).toBeCloseTo(2 * Math.exp(-1), 4);
    expect(told['v(b)']![1]).toBeCloseTo(5 * Math.exp(-1), 4);
    const held = answerTo(`${circuit}.tran 1m 1m`).tran!;
    expect(held['v(a)']![1]).toBeCloseTo(2 * Math.exp(-1), 4);
    expect(held['v(b)']![1]).toBeCloseTo(3 * Math.exp(-1), 4);
  });

  it('leaves what the bleeder leaves: 147.86 V after 30 s, 7.36 V after 60 s', () => {
    const { tran } = answerTo('t\nC1 a 0 1u IC=2969.85\nR1 a 0 10meg\n.tran 30 60 uic');
    expect(tran!['v(a)']![1]).toBeCloseTo(147.86, 1);
    expect(tran!['v(a)']![2]).toBeCloseTo(7.36, 2);
  });
});

describe('phasors of decks', () => {
  it('gives real and imaginary parts', () => {
    const { ac } = answerTo(
      't\nV1 a 0 AC 1\nR1 a b 1k\nC1 b 0 1u\n.ac lin 1 159.15494309189535 159.2',
    );
    const [re, im] = ac!['v(b)']![0] as readonly [number, number];
    expect(ac!['frequency']).toEqual([159.15494309189535]);
    expect(re).toBeCloseTo(0.5, 12);
    expect(im).toBeCloseTo(-0.5, 12);
  });

  it('keeps a switch as the operating point left it', () => {
    // ngspice 39 takes every switch as off here, so no golden deck has one
    const { ac } = answerTo(
      't\nVC c 0 5\nV1 a 0 AC 1\nS1 a b c 0 m\nR1 b 0 90\n.model m SW(VT=2 RON=10 ROFF=1meg)\n.ac lin 1 60 60',
    );
    const [re] = ac!['v(b)']![0] as readonly [number, number];
    expect(re).toBeCloseTo(0.9, 12);
  });
});

describe('a deck that cannot be solved', () => {
  const failureOf = (lines: string) => {
    const read = readDeck(`t\n${lines}`);
    if (!read.ok) throw new Error(JSON.stringify(read.failure));
    const solved = solveDeck(read.value);
    if (solved.ok) throw new Error('solved');
    return solved.failure;
  };

  it('has an inductor across a source', () => {
    expect(failureOf('V1 a 0 1\nL1 a 0 1\n.op')).toMatchObject({
      code: 'voltage-loop',
      element: 'l1',
    });
  });

  it('has a switch that turns itself off', () => {
    const lines = 'V1 s 0 10\nR1 s a 1k\nS1 a 0 a 0 m\n.model m SW(VT=5 RON=1)\n.op';
    expect(failureOf(lines)).toMatchObject({ code: 'not-converged', node: 'a' });
  });

  it('drives a current where it cannot return', () => {
    expect(failureOf('I1 0 a 1m\nC1 a 0 1u\nR1 b 0 1\n.op')).toMatchObject({
      code: 'floating-node',
      node: 'a',
    });
  });

  it('but may charge a capacitor from a told start', () => {
    const { tran } = answerTo('t\nI1 0 a 1m\nC1 a 0 1u\nR1 b 0 1\n.tran 1m 2m uic');
    expect(tran!['v(a)']![2]).toBeCloseTo(2, 6);
  });
});
