/**
 * High-voltage rectifier: 13 silicon junctions in one body.
 *   I = IS (exp((v - I RS) / (N Vt)) - 1), N = 13 x 2 = 26, Vt = 25.852 mV at 300 K, IS = 12 nA,
 *   RS = 20 Ohm, BV = 12 kV; current positive from anode `a` to cathode `k`.
 * One set of values for the battery check and for the 2000 MOhm range.
 * Source: fit in FACTS section 5.2.
 */
import type { Element } from '../../engine/circuit/circuit.ts';
import type { FaultKind } from '../fault.ts';
import { judgement } from '../fault.ts';
import type { PartKind } from '../part-kind.ts';
import { readFaults } from '../pieces/read-faults.ts';
import { BROKEN, resistance } from '../pieces/resistance.ts';

const faults: FaultKind[] = [
  {
    id: 'shorted',
    name: 'shorted',
    description: 'The junctions have melted through.',
    weight: 5,
    source: judgement,
    parameters: { ohms: { name: 'short', unit: 'Ω', min: 0.01, max: 50, usual: 0.1 } },
    look: 'The body of the diode is cracked.',
  },
  {
    id: 'open',
    name: 'open',
    description: 'The junctions have come apart: neither way conducts.',
    weight: 2,
    source: judgement,
  },
  {
    id: 'leaky',
    name: 'leaky',
    description: 'The diode conducts backwards as well.',
    weight: 1,
    source: judgement,
    parameters: { ohms: { name: 'leakage', unit: 'Ω', min: 1e3, max: 1e8, usual: 2e6 } },
  },
  {
    id: 'reversed',
    name: 'fitted the wrong way round',
    description: 'An earlier repair fitted the diode with its cathode to the capacitor.',
    weight: 1,
    source: judgement,
    look: 'The arrow on the body points away from the chassis.',
  },
  {
    id: 'breaks-down',
    name: 'breaks down in use',
    description: 'It conducts backwards above a voltage; every low-voltage check is good.',
    weight: 1,
    source: judgement,
    parameters: { volts: { name: 'breaks down at', unit: 'V', min: 500, max: 5000, usual: 1500 } },
  },
];

const fit = 'FACTS 5.2';

export const hvDiode: PartKind = {
  kind: 'hv-diode',
  name: 'high-voltage diode',
  terminals: () => [
    { id: 'a', name: 'anode' },
    { id: 'k', name: 'cathode' },
  ],
  values: {
    saturationCurrent: { name: 'IS', unit: 'A', nominal: 12e-9, tolerance: 0.15, source: fit },
    emission: { name: 'N', unit: '', nominal: 26, tolerance: 0, source: fit },
    seriesResistance: { name: 'RS', unit: 'Ω', nominal: 20, tolerance: 0.1, source: 'ENGINE 3' },
    breakdown: { name: 'BV', unit: 'V', nominal: 12e3, tolerance: 0.05, source: 'ENGINE 3' },
  },
  faults,
  circuit: ({ node, inner, value, faults: applied }) => {
    const fault = readFaults(faults, applied);
    const [anode, cathode] = fault.has('reversed')
      ? [node('k'), node('a')]
      : [node('a'), node('k')];
    const body = fault.has('open') ? inner('body') : anode;
    const elements: Element[] = [
      {
        kind: 'diode',
        name: inner('junctions'),
        nodes: [body, cathode],
        model: {
          saturationCurrent: value('saturationCurrent'),
          emission: value('emission'),
          seriesResistance: value('seriesResistance'),
          breakdownVoltage: fault.has('breaks-down')
            ? fault.value('breaks-down', 'volts')
            : value('breakdown'),
          breakdownCurrent: 1e-6,
        },
      },
    ];
    if (fault.has('open')) elements.push(resistance(inner('gap'), anode, body, BROKEN));
    for (const id of ['shorted', 'leaky'])
      if (fault.has(id))
        elements.push(resistance(inner(id), node('a'), node('k'), fault.value(id, 'ohms')));
    return elements;
  },
};
