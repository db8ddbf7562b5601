/**
 * Snap-action door switch; actuated while the door is closed or a hand presses it.
 *   COM-NO closed when actuated (primary, secondary, sensing); COM-NC closed when not (monitor).
 * The sensing switch carries milliamperes of the control board: a film that mains would break through
 * stays on its contact, and the board takes the door for open.
 *   R(closed) = 20 mOhm, R(open) = 1e9 Ohm.
 * Source: which contact closes when: service manuals SM-1, SM-3 in FACTS section 8;
 * contact 15 to 30 mOhm new: data sheets DS-S; films that low voltage does not break: dry-circuit
 * rule of IEC 60512-2-1 as quoted in FACTS section 8, the voltage itself is judgement.
 */
import type { FaultKind } from '../fault.ts';
import { judgement } from '../fault.ts';
import type { PartKind } from '../part-kind.ts';
import { breakdown } from '../pieces/breakdown.ts';
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
  {
    id: 'film',
    name: 'film on the contact',
    description:
      'The contact closes on a film that only mains breaks through: at low voltage it conducts badly.',
    weight: 2,
    source: judgement,
    variants: ['sensing'],
    parameters: { ohms: { name: 'film', unit: 'Ω', min: 5e3, max: 1e6, usual: 22e3 } },
  },
  {
    id: 'lever-bent',
    name: 'lever bent',
    description: 'The lever is bent: the closed door does not reach it, a finger does.',
    weight: 3,
    source: judgement,
    variants: ['sensing'],
    look: 'The lever stands away from the plunger; the hook of the door passes beside it.',
  },
];

/** V at which a film breaks down. Judgement. */
const FILM_BREAKS = 30;

const throwOf = (variant: string | undefined) => (variant === 'monitor' ? 'NC' : 'NO');

export const doorSwitch: PartKind = {
  kind: 'door-switch',
  name: 'door switch',
  variants: ['primary', 'secondary', 'monitor', 'sensing'],
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
  actuator: {
    hold: 'Hold the actuator pressed',
    letGo: 'Let the actuator go',
    inShort: 'press',
  },
  circuit: ({ node, inner, value, variant, faults: applied, isActuated, isPressed }) => {
    const fault = readFaults(faults, applied);
    const other = throwOf(variant);
    const isMet = fault.has('lever-bent') ? isPressed : isActuated;
    const wouldClose = other === 'NC' ? !isMet : isMet;
    const isClosed = fault.has('welded') || (wouldClose && !fault.has('contact-open'));
    const burnt = fault.has('high-resistance') ? fault.value('high-resistance', 'ohms') : 0;
    const film = fault.has('film') ? fault.value('film', 'ohms') : 0;
    const ohms = isClosed ? value('contact') + burnt + film : value('gap');
    const elements = [resistance(inner('contact'), node('COM'), node(other), ohms)];
    if (isClosed && film > 0)
      elements.push(...breakdown(inner('film'), node('COM'), node(other), FILM_BREAKS, 0.1));
    if (fault.has('leaky'))
      elements.push(
        resistance(inner('track'), node('COM'), node(other), fault.value('leaky', 'ohms')),
      );
    return elements;
  },
};
