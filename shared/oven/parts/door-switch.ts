/**
 * Snap-action door switch; actuated while the door is closed or a hand presses it.
 *   COM-NO closed when actuated (primary, secondary); COM-NC closed when not (monitor).
 *   R(closed) = 20 mOhm, R(open) = 1e9 Ohm.
 * Source: which contact closes when: service manuals SM-1, SM-3 in FACTS section 8;
 * contact 15 to 30 mOhm new: data sheets DS-S in FACTS section 8.
 */
import type { FaultKind } from '../fault.ts';
import { judgement } from '../fault.ts';
import type { PartKind } from '../part-kind.ts';
import { readFaults } from '../pieces/read-faults.ts';
import { resistance } from '../pieces/resistance.ts';

const faults: FaultKind[] = [
  {
    id: 'contact-open',
    name: 'stuck open',
    description: 'The contact does not close, whatever the lever does.',
    weight: 4,
    source: judgement,
  },
  {
    id: 'welded',
    name: 'stuck closed (welded)',
    description: 'The contact is welded and stays closed, whatever the lever does.',
    weight: 2,
    source: judgement,
  },
  {
    id: 'high-resistance',
    name: 'burnt contact',
    description: 'The contact closes but is burnt and makes a poor path.',
    weight: 3,
    source: judgement,
    parameters: { ohms: { name: 'contact', unit: 'Ω', min: 0.3, max: 50, usual: 3 } },
    look: 'The plastic at one tab of the switch is brown.',
  },
  {
    id: 'leaky',
    name: 'carbon track across the contact',
    description: 'Arcing has left carbon in the switch: the open contact still conducts a little.',
    weight: 1,
    source: judgement,
    parameters: { ohms: { name: 'track', unit: 'Ω', min: 1e4, max: 1e7, usual: 2e5 } },
  },
];

const throwOf = (variant: string | undefined) => (variant === 'monitor' ? 'NC' : 'NO');

export const doorSwitch: PartKind = {
  kind: 'door-switch',
  name: 'door switch',
  variants: ['primary', 'secondary', 'monitor'],
  terminals: (variant) => [
    { id: 'COM', name: 'common' },
    throwOf(variant) === 'NC'
      ? { id: 'NC', name: 'normally closed' }
      : { id: 'NO', name: 'normally open' },
  ],
  values: {
    contact: {
      name: 'contact',
      unit: 'Ω',
      nominal: 0.02,
      tolerance: 0.4,
      source: 'DS-S, FACTS 8',
    },
    gap: {
      name: 'open contact',
      unit: 'Ω',
      nominal: 1e9,
      tolerance: 0,
      source: 'ENGINE 3, common practice, no source',
    },
  },
  faults,
  actuator: { hold: 'Hold the actuator pressed', letGo: 'Let the actuator go' },
  circuit: ({ node, inner, value, variant, faults: applied, isActuated }) => {
    const fault = readFaults(faults, applied);
    const other = throwOf(variant);
    const wouldClose = other === 'NC' ? !isActuated : isActuated;
    const isClosed = fault.has('welded') || (wouldClose && !fault.has('contact-open'));
    const burnt = fault.has('high-resistance') ? fault.value('high-resistance', 'ohms') : 0;
    const ohms = isClosed ? value('contact') + burnt : value('gap');
    const elements = [resistance(inner('contact'), node('COM'), node(other), ohms)];
    if (fault.has('leaky'))
      elements.push(
        resistance(inner('track'), node('COM'), node(other), fault.value('leaky', 'ohms')),
      );
    return elements;
  },
};
