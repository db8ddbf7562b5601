/**
 * High-voltage transformer: primary 1-2, heater winding H1-H2, high-voltage winding from HV to the
 * core, core bolted to the chassis and varnished.
 *   L(HV) = a^2 L(primary) with a the turns ratio; coupling primary to HV 0.97, to heater 0.98.
 * HV winding shorted to core at the part r of its length from the HV end: r R to the core, and the
 * rest of the winding is a closed loop. Polarity: H1, HV and terminal 1 swing together.
 * Sources: ENGINE section 3; resistances: service manuals SM-1 to SM-3 in FACTS section 6.1;
 * shorted turns: FACTS section 6.3.
 */
import { square } from '../../engine/elementary/power.ts';
import type { Element } from '../../engine/circuit/circuit.ts';
import type { FaultKind } from '../fault.ts';
import { judgement } from '../fault.ts';
import type { PartContext, PartKind } from '../part-kind.ts';
import { breakdown } from '../pieces/breakdown.ts';
import { readFaults } from '../pieces/read-faults.ts';
import type { FaultReader } from '../pieces/read-faults.ts';
import { FUSED, resistance } from '../pieces/resistance.ts';
import { shortTurns } from '../pieces/shorted-turns.ts';
import type { Winding } from '../pieces/windings.ts';
import { windings } from '../pieces/windings.ts';

const leakage = { name: 'leakage', unit: 'Ω', min: 100, max: 1.5e7, usual: 1e6 };

const faults: FaultKind[] = [
  {
    id: 'primary-open',
    name: 'primary open',
    description: 'The primary is broken at its tab.',
    weight: 2,
    source: judgement,
  },
  {
    id: 'hv-open',
    name: 'high-voltage winding open',
    description: 'The thin wire of the high-voltage winding is broken.',
    weight: 3,
    source: judgement,
  },
  {
    id: 'hv-shorted-to-core',
    name: 'high-voltage winding shorted to core',
    description:
      'The winding has burnt through to the core and only the part up to there is in use.',
    weight: 3,
    source: judgement,
    parameters: {
      part: {
        name: 'part of the winding from its HV end to the short',
        unit: '',
        min: 0,
        max: 0.9,
        usual: 0.3,
      },
    },
    look: 'The paper of the high-voltage winding is charred towards the core.',
  },
  {
    id: 'heater-winding-open',
    name: 'heater winding open',
    description: 'The few turns that heat the magnetron are broken at their crimp.',
    weight: 1,
    source: judgement,
  },
  {
    id: 'heater-winding-shorted-to-core',
    name: 'heater winding shorted to core',
    description: 'The insulation of the heater winding is pinched against the core.',
    weight: 1,
    source: judgement,
    look: 'The insulation of the heater winding is cut where it passes the core.',
  },
  {
    id: 'primary-leaky-to-core',
    name: 'primary leaky to core',
    description: 'The insulation between primary and core conducts.',
    weight: 1,
    source: judgement,
    parameters: { ohms: leakage },
  },
  {
    id: 'shorted-turns',
    name: 'high-voltage turns shorted',
    description: 'Some turns of the high-voltage winding are shorted among themselves.',
    weight: 3,
    source: judgement,
    parameters: {
      fraction: { name: 'part of the winding', unit: '', min: 0.002, max: 0.2, usual: 0.032 },
      ohms: { name: 'loop', unit: 'Ω', min: 0.04, max: 20, usual: 0.8 },
    },
  },
  {
    id: 'breaks-down',
    name: 'insulation breaks down hot',
    description:
      'The high-voltage winding arcs to the core above a voltage; cold it reads as it should.',
    weight: 1,
    source: judgement,
    parameters: { volts: { name: 'breaks down at', unit: 'V', min: 1100, max: 2800, usual: 1500 } },
  },
];

const seen = 'ENGINE 3; SM-1 to SM-3, FACTS 6.1';
const source = 'ENGINE 3, common practice, no source';
/** Ohm: charred copper against the core. Judgement. */
const CHARRED = 0.3;

function primaryAndHeater({ node, inner, value }: PartContext, fault: FaultReader): Winding[] {
  return [
    {
      name: inner('primary'),
      nodes: [node('1'), node('2')],
      inductance: value('primaryInductance'),
      resistance: value('primary'),
      isOpen: fault.has('primary-open'),
      linkage: 1,
      limb: 'primary',
    },
    {
      name: inner('heater'),
      nodes: [node('H1'), node('H2')],
      inductance: value('primaryInductance') * square(value('heaterVolts') / value('supplyVolts')),
      resistance: value('heater'),
      isOpen: fault.has('heater-winding-open'),
      linkage: 0.98,
      limb: 'heater',
    },
  ];
}

function highVoltage(part: PartContext, fault: FaultReader): { all: Winding[]; extra: Element[] } {
  const { node, inner, value } = part;
  const fraction = fault.has('shorted-turns') ? fault.value('shorted-turns', 'fraction') : 0;
  const whole: Winding = {
    name: inner('hv'),
    nodes: [node('HV'), node('core')],
    inductance: value('primaryInductance') * square(value('turnsRatio')),
    resistance: value('hv'),
    isOpen: fault.has('hv-open'),
    linkage: value('coupling'),
    limb: 'hv',
  };
  const loopOhms = fault.has('shorted-turns') ? fault.value('shorted-turns', 'ohms') : 0;
  const { left, loop, wire } = shortTurns(whole, fraction, loopOhms);
  const turns = loop ? [loop] : [];
  if (!fault.has('hv-shorted-to-core')) return { all: [left, ...turns], extra: wire };
  const used = Math.max(fault.value('hv-shorted-to-core', 'part'), 1e-3);
  const charred = inner('hv-charred');
  const upper: Winding = {
    ...left,
    nodes: [node('HV'), charred],
    inductance: left.inductance * square(used),
    resistance: left.resistance * used,
  };
  const lower: Winding = {
    ...left,
    name: inner('hv-rest'),
    nodes: [charred, node('core')],
    inductance: left.inductance * square(1 - used),
    resistance: left.resistance * (1 - used),
    isOpen: false,
  };
  const short = resistance(inner('hv-short'), charred, node('core'), CHARRED);
  return { all: [upper, lower, ...turns], extra: [...wire, short] };
}

export const hvTransformer: PartKind = {
  kind: 'hv-transformer',
  name: 'high-voltage transformer',
  terminals: () => [
    { id: '1', name: 'primary' },
    { id: '2', name: 'primary, other end' },
    { id: 'H1', name: 'heater winding' },
    { id: 'H2', name: 'heater winding, other end' },
    { id: 'HV', name: 'high-voltage winding' },
    { id: 'core', name: 'core', isVarnished: true, isBody: true },
  ],
  values: {
    primary: { name: 'primary', unit: 'Ω', nominal: 0.55, tolerance: 0.05, source },
    primaryInductance: { name: 'primary', unit: 'H', nominal: 0.16, tolerance: 0.1, source },
    turnsRatio: {
      name: 'turns ratio',
      unit: '',
      nominal: 17.5,
      tolerance: 0.01,
      source: 'ENGINE 3; 2100 V / 120 V, FACTS 6.1',
    },
    coupling: { name: 'coupling to HV', unit: '', nominal: 0.97, tolerance: 0.002, source },
    hv: { name: 'high-voltage winding', unit: 'Ω', nominal: 95, tolerance: 0.1, source: seen },
    heater: { name: 'heater winding', unit: 'Ω', nominal: 8e-3, tolerance: 0.1, source: seen },
    heaterVolts: { name: 'heater winding', unit: 'V', nominal: 3.3, tolerance: 0.02, source },
    supplyVolts: { name: 'rated supply', unit: 'V', nominal: 120, tolerance: 0, source },
    insulation: { name: 'winding to core', unit: 'Ω', nominal: 1e12, tolerance: 0.3, source },
  },
  faults,
  running: { hums: 'primary' },
  circuit: (part) => {
    const { node, inner, value } = part;
    const fault = readFaults(faults, part.faults);
    const { all, extra } = highVoltage(part, fault);
    const toCore = (name: string, terminal: string, ohms: number) =>
      resistance(inner(name), node(terminal), node('core'), ohms);
    const elements = [
      ...windings([...primaryAndHeater(part, fault), ...all]),
      ...extra,
      toCore('primary-core', '1', value('insulation')),
      toCore('heater-core', 'H1', value('insulation')),
    ];
    if (fault.has('primary-leaky-to-core'))
      elements.push(toCore('leak', '1', fault.value('primary-leaky-to-core', 'ohms')));
    if (fault.has('heater-winding-shorted-to-core'))
      elements.push(toCore('heater-short', 'H1', FUSED));
    if (fault.has('breaks-down')) {
      const volts = fault.value('breaks-down', 'volts');
      elements.push(...breakdown(inner('arc'), node('HV'), node('core'), volts, 10));
    }
    return elements;
  },
};
