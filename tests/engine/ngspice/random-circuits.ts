import type { Circuit, DiodeModel, Element } from '../../../shared/engine/circuit/circuit.ts';
import { seededUniform } from '../../../shared/engine/quantities/seeded-uniform.ts';

/** A circuit drawn from a seed, and the analyses to compare on it, in deck notation. */
export interface RandomCircuit {
  circuit: Circuit;
  analyses: string[];
  /** s, the longest step the reference may take, when there is a transient */ longestStep?: string;
}

/** Draws in a row from one seed. */
class Draws {
  private count = 0;
  private readonly seed: number;

  constructor(seed: number) {
    this.seed = seed;
  }

  uniform(from: number, to: number): number {
    this.count += 1;
    return from + (to - from) * seededUniform(this.seed, `draw ${this.count}`);
  }

  /** Uniform in the logarithm, rounded so that a deck shows it whole. */
  decades(from: number, to: number): number {
    return Number((10 ** this.uniform(Math.log10(from), Math.log10(to))).toPrecision(4));
  }

  whole(from: number, to: number): number {
    return Math.floor(this.uniform(from, to + 1));
  }

  value(from: number, to: number): number {
    return Number(this.uniform(from, to).toPrecision(4));
  }
}

const resistor = (name: string, from: string, to: string, resistance: number): Element => ({
  kind: 'resistor',
  name,
  nodes: [from, to],
  resistance,
});

/**
 * Resistors from 3 mOhm to 1 TOhm. A tree of 1 Ohm to 10 kOhm reaches every node: an island held to
 * ground by insulation alone is beyond what the reference can resolve in double precision.
 */
export function randomMesh(seed: number): RandomCircuit {
  const draws = new Draws(seed);
  const size = draws.whole(4, 24);
  const node = (index: number): string => (index === 0 ? '0' : `N.${index}`);
  const elements: Element[] = [];
  for (let index = 1; index <= size; index += 1) {
    const onto = node(draws.whole(0, index - 1));
    elements.push(resistor(`tree ${index}`, node(index), onto, draws.decades(1, 1e4)));
  }
  for (let index = 1; index <= 2 * size; index += 1) {
    const [from, to] = [draws.whole(0, size), draws.whole(0, size)];
    elements.push(resistor(`r${index}`, node(from), node(to), draws.decades(3e-3, 1e12)));
  }
  for (let index = 1; index <= draws.whole(1, 3); index += 1) {
    const wave = { shape: 'dc', value: draws.value(-400, 400) } as const;
    elements.push({ kind: 'voltage-source', name: `V ${index}`, nodes: [`S.${index}`, '0'], wave });
    const onto = node(draws.whole(1, size));
    elements.push(resistor(`lead ${index}`, `S.${index}`, onto, draws.decades(3e-3, 1e5)));
  }
  const nodes = [node(draws.whole(1, size)), node(draws.whole(0, size))] as const;
  const wave = { shape: 'dc', value: draws.decades(1e-9, 1) } as const;
  elements.push({ kind: 'current-source', name: 'I1', nodes, wave });
  return { circuit: { elements }, analyses: ['.op'] };
}

function randomDiode(draws: Draws): DiodeModel {
  const isStack = draws.uniform(0, 1) < 0.3;
  const breaks = draws.uniform(0, 1) < 0.2;
  return {
    saturationCurrent: isStack ? draws.decades(1e-9, 5e-8) : draws.decades(1e-15, 1e-9),
    emission: isStack ? 26 : draws.value(1, 2),
    seriesResistance: draws.uniform(0, 1) < 0.5 ? 0 : draws.value(0.1, 20),
    ...(breaks ? { breakdownVoltage: draws.value(5, 60), breakdownCurrent: 1e-3 } : {}),
  };
}

/** Diodes, capacitors and resistors: the operating point, and small signals about it. */
export function randomDiodes(seed: number): RandomCircuit {
  const draws = new Draws(seed);
  const size = draws.whole(3, 10);
  const node = (index: number): string => (index === 0 ? '0' : `n${index}`);
  const elements: Element[] = [];
  for (let index = 1; index <= size; index += 1) {
    const onto = node(draws.whole(0, index - 1));
    elements.push(resistor(`tree ${index}`, node(index), onto, draws.decades(10, 1e6)));
  }
  const any = (): readonly [string, string] => {
    const from = draws.whole(0, size);
    return [node(from), node((from + draws.whole(1, size)) % (size + 1))];
  };
  for (let index = 1; index <= draws.whole(1, 6); index += 1) {
    elements.push({ kind: 'diode', name: `D-${index}`, nodes: any(), model: randomDiode(draws) });
  }
  const capacitance = draws.decades(1e-10, 1e-5);
  elements.push({ kind: 'capacitor', name: 'c1', nodes: any(), capacitance });
  elements.push({
    kind: 'voltage-source',
    name: 'v1',
    nodes: ['s', '0'],
    wave: { shape: 'dc', value: draws.value(-30, 30) },
    ac: { magnitude: 0.01, phaseDegrees: draws.value(-180, 180) },
  });
  elements.push(resistor('lead', 's', node(draws.whole(1, size)), draws.decades(1, 1e5)));
  const wave = { shape: 'dc', value: draws.decades(1e-9, 1e-2) } as const;
  elements.push({ kind: 'current-source', name: 'i1', nodes: any(), wave });
  return { circuit: { elements }, analyses: ['.op', '.ac dec 1 10 100k'] };
}

/** Two to four coupled windings with losses and loads: phasors, and the first cycles of a sine. */
export function randomWindings(seed: number): RandomCircuit {
  const draws = new Draws(seed);
  const count = draws.whole(2, 4);
  const elements: Element[] = [];
  const shares: number[] = [];
  const primary = draws.decades(1e-3, 1);
  for (let index = 1; index <= count; index += 1) {
    const [a, b, c] = [`w${index}a`, `w${index}b`, index === 1 ? 's' : `w${index}c`];
    const inductance = index === 1 ? primary : primary * draws.decades(1e-3, 400);
    const reactance = 2 * Math.PI * 60 * inductance;
    const seriesResistance = Number((reactance * draws.uniform(0.005, 0.05)).toPrecision(4));
    const inductor = { kind: 'inductor', inductance, seriesResistance } as const;
    elements.push({ ...inductor, name: `L ${index}`, nodes: [a, index % 2 === 0 ? b : '0'] });
    if (index % 2 === 0) elements.push(resistor(`bond ${index}`, b, '0', draws.decades(1e-2, 1e6)));
    elements.push(resistor(`lead ${index}`, c, a, reactance * draws.uniform(0.01, 0.1)));
    if (index > 1)
      elements.push(resistor(`load ${index}`, c, '0', reactance * draws.decades(0.1, 100)));
    shares.push(draws.uniform(0.6, 0.995));
  }
  // k of a pair as a product of two shares: such a matrix is always positive definite
  shares.forEach((share, second) => {
    for (let first = 0; first < second; first += 1) {
      const sign = draws.uniform(0, 1) < 0.3 ? -1 : 1;
      const coefficient = count === 2 ? sign * share * shares[first]! : share * shares[first]!;
      const inductors = [`L ${first + 1}`, `L ${second + 1}`] as const;
      elements.push({ kind: 'coupling', name: `k ${first} ${second}`, inductors, coefficient });
    }
  });
  const capacitance = 1 / ((2 * Math.PI * draws.decades(100, 1000)) ** 2 * primary);
  elements.push(resistor('damping', 's', 'q', draws.decades(1, 100)));
  elements.push({ kind: 'capacitor', name: 'c1', nodes: ['q', '0'], capacitance });
  elements.push({
    kind: 'voltage-source',
    name: 'mains',
    nodes: ['s', '0'],
    wave: {
      shape: 'sine',
      offset: 0,
      amplitude: draws.value(1, 400),
      frequency: 60,
      delay: 0,
      damping: 0,
      phaseDegrees: 0,
    },
    ac: { magnitude: 120, phaseDegrees: 0 },
  });
  return {
    circuit: { elements },
    analyses: ['.ac dec 2 10 10k', '.tran 0.5m 20m'],
    longestStep: '5u',
  };
}

/** A sine or pulse through a diode onto a smoothing capacitor, a switch across the load. */
export function randomRectifier(seed: number): RandomCircuit {
  const draws = new Draws(seed);
  const load = draws.decades(20, 1e4);
  const elements: Element[] = [
    {
      kind: 'voltage-source',
      name: 'v1',
      nodes: ['in', '0'],
      wave: {
        shape: 'sine',
        offset: draws.value(-5, 5),
        amplitude: draws.value(20, 200),
        frequency: draws.value(40, 80),
        delay: 0,
        damping: 0,
        phaseDegrees: draws.value(0, 360),
      },
    },
    resistor('source', 'in', 'a', draws.decades(1, 20)),
    { kind: 'diode', name: 'd1', nodes: ['a', 'out'], model: randomDiode(draws) },
    resistor('load', 'out', '0', load),
    {
      kind: 'capacitor',
      name: 'c1',
      nodes: ['out', '0'],
      capacitance: draws.decades(0.001, 0.1) / load,
    },
    {
      kind: 'voltage-source',
      name: 'v2',
      nodes: ['gate', '0'],
      wave: {
        shape: 'pulse',
        low: 0,
        high: 5,
        delay: draws.value(5e-3, 15e-3),
        rise: 1e-4,
        fall: 1e-4,
        width: draws.value(5e-3, 12e-3),
        period: 1,
      },
    },
    {
      kind: 'switch',
      name: 'relay',
      nodes: ['out', 'x'],
      control: ['gate', '0'],
      model: { threshold: 2.5, hysteresis: 0.3, onResistance: 0.05, offResistance: 1e8 },
    },
    resistor('extra', 'x', '0', load * draws.uniform(0.3, 3)),
  ];
  return { circuit: { elements }, analyses: ['.tran 0.37m 25.9m'], longestStep: '2u' };
}

/**
 * Resistors, capacitors and inductors anywhere, among them capacitors in loops with a source and
 * inductors in series with a current source: every current those force must come out as well.
 */
export function randomNetwork(seed: number): RandomCircuit {
  const draws = new Draws(seed);
  const size = draws.whole(3, 8);
  const node = (index: number): string => (index === 0 ? '0' : `m${index}`);
  const any = (): readonly [string, string] => {
    const from = draws.whole(0, size);
    return [node(from), node((from + draws.whole(1, size)) % (size + 1))];
  };
  const elements: Element[] = [];
  for (let index = 1; index <= size; index += 1) {
    const onto = node(draws.whole(0, index - 1));
    elements.push(resistor(`tree ${index}`, node(index), onto, draws.decades(30, 3e3)));
  }
  for (let index = 1; index <= draws.whole(1, 4); index += 1) {
    const capacitance = draws.decades(1e-8, 1e-5);
    elements.push({ kind: 'capacitor', name: `c${index}`, nodes: any(), capacitance });
  }
  for (let index = 1; index <= draws.whole(1, 3); index += 1) {
    const inductor = { kind: 'inductor', inductance: draws.decades(1e-3, 1) } as const;
    const seriesResistance = draws.value(1, 30);
    elements.push({ ...inductor, name: `l${index}`, nodes: any(), seriesResistance });
  }
  const capacitance = draws.decades(1e-8, 1e-6);
  elements.push({ kind: 'capacitor', name: 'across', nodes: ['s', node(1)], capacitance });
  elements.push(resistor('lead', 's', node(draws.whole(1, size)), draws.decades(10, 1e3)));
  elements.push({
    kind: 'voltage-source',
    name: 'v1',
    nodes: ['s', '0'],
    ac: { magnitude: draws.value(1, 10), phaseDegrees: draws.value(-180, 180) },
    wave: {
      shape: 'pulse',
      low: draws.value(-10, 10),
      high: draws.value(-10, 10),
      delay: draws.value(1e-3, 4e-3),
      rise: draws.decades(3e-5, 1e-3),
      fall: draws.decades(3e-5, 1e-3),
      width: draws.value(2e-3, 6e-3),
      period: draws.value(9e-3, 20e-3),
    },
  });
  elements.push({
    kind: 'current-source',
    name: 'i1',
    nodes: ['0', 'j'],
    wave: {
      shape: 'sine',
      offset: draws.value(-0.01, 0.01),
      amplitude: draws.value(0, 0.02),
      frequency: draws.value(50, 400),
      delay: 0,
      damping: draws.value(0, 50),
      phaseDegrees: draws.value(-180, 180),
    },
  });
  const inductance = draws.decades(1e-3, 0.1);
  elements.push({ kind: 'inductor', name: 'in line', nodes: ['j', node(size)], inductance });
  return {
    circuit: { elements },
    analyses: ['.op', '.ac dec 2 10 100k', '.tran 0.21m 8.4m'],
    longestStep: '1u',
  };
}
