/**
 * Wire-wound ceramic resistor in the monitor circuit: it limits what the monitor switch shorts, so
 * that the fuse blows and no contact or outlet does.
 *   R = 0.8 Ohm; 230 V / (0.8 + 0.5) Ohm = 177 A.
 * Source: monitor resistor 0.8 Ohm, SM-4 in FACTS section 8; the crowbar current: calculated there.
 */
import type { FaultKind } from '../fault.ts';
import { judgement } from '../fault.ts';
import type { PartKind } from '../part-kind.ts';
import { readFaults } from '../pieces/read-faults.ts';
import { BROKEN, resistance } from '../pieces/resistance.ts';

const faults: FaultKind[] = [
  {
    id: 'open',
    name: 'open',
    description:
      'Its wire is broken: nothing shows in use, and the monitor switch protects nobody.',
    weight: 3,
    source: judgement,
  },
  {
    id: 'drifted',
    name: 'resistance too high',
    description:
      'Its end cap has worked loose: the monitor circuit no longer blows the fuse at once.',
    weight: 1,
    source: judgement,
    parameters: { ohms: { name: 'resistance', unit: 'Ω', min: 3, max: 1e4, usual: 40 } },
    look: 'The ceramic is brown at one end.',
  },
];

export const resistor: PartKind = {
  kind: 'resistor',
  name: 'resistor',
  terminals: () => [
    { id: '1', name: 'monitor switch side' },
    { id: '2', name: 'neutral side' },
  ],
  values: {
    resistance: {
      name: 'resistance',
      unit: 'Ω',
      nominal: 0.8,
      tolerance: 0.05,
      source: 'SM-4, FACTS 8',
    },
  },
  faults,
  circuit: ({ node, inner, value, faults: applied }) => {
    const fault = readFaults(faults, applied);
    const sound = fault.has('drifted') ? fault.value('drifted', 'ohms') : value('resistance');
    const ohms = fault.has('open') ? BROKEN : sound;
    return [resistance(inner('wire'), node('1'), node('2'), ohms)];
  },
};
