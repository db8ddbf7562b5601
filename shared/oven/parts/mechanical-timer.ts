/**
 * Mechanical timer with its power selector: a cam held by a clockwork gear that a small synchronous
 * motor lets run down, a main contact 1-2, a power contact 2-3, a motor M1-M2, a bell at zero.
 *   main: closed while the knob stands off zero (turned by hand, or running down in a powered run);
 *   power contact: opened and closed by a second cam at part power, closed all the time at full
 *   power, where the selector stands here;
 *   motor: R and L in series.
 *   R(closed) = 20 mOhm, R(open) = 1e9 Ohm.
 * Source: contacts as snap switches, data sheets DS-S in FACTS section 8; on and off times of part
 * power SM-9 in FACTS section 9; motor: a 230 V synchronous motor like the turntable's 16 kOhm (SM-4,
 * FACTS section 8), common practice.
 */
import type { FaultKind } from '../fault.ts';
import { judgement } from '../fault.ts';
import type { PartContext, PartKind } from '../part-kind.ts';
import type { FaultReader } from '../pieces/read-faults.ts';
import { readFaults } from '../pieces/read-faults.ts';
import { resistance } from '../pieces/resistance.ts';
import { windings } from '../pieces/windings.ts';

const burnt = { ohms: { name: 'contact', unit: 'Ω', min: 0.3, max: 200, usual: 4 } };

const faults: FaultKind[] = [
  {
    id: 'main-open',
    name: 'main contact open',
    description: 'The main contact does not close, however far the knob is turned.',
    weight: 4,
    source: judgement,
  },
  {
    id: 'main-welded',
    name: 'main contact welded',
    description:
      'The main contact stays closed at zero: the oven runs whenever its door is closed.',
    weight: 2,
    source: judgement,
  },
  {
    id: 'main-burnt',
    name: 'main contact burnt',
    description: 'The main contact closes but is burnt and makes a poor path.',
    weight: 3,
    source: judgement,
    parameters: burnt,
    look: 'The case of the timer is brown at terminal 2.',
  },
  {
    id: 'power-open',
    name: 'power contact open',
    description: 'The power contact does not close: lamp, fan and plate run and nothing is heated.',
    weight: 3,
    source: judgement,
  },
  {
    id: 'power-welded',
    name: 'power contact welded',
    description:
      'The power contact never opens: every setting cooks at full power. At full power it reads as it should.',
    weight: 2,
    source: judgement,
  },
  {
    id: 'power-burnt',
    name: 'power contact burnt',
    description: 'The power contact closes but is burnt and makes a poor path.',
    weight: 3,
    source: judgement,
    parameters: burnt,
    look: 'The case of the timer is brown at terminal 3.',
  },
  {
    id: 'motor-open',
    name: 'motor winding open',
    description: 'The winding of the motor is broken: the knob stays where it was put.',
    weight: 3,
    source: judgement,
  },
  {
    id: 'gear-stripped',
    name: 'gear stripped',
    description:
      'A wheel of the gear has lost teeth: the motor turns and the knob does not come down. Nothing reads wrong.',
    weight: 2,
    source: judgement,
  },
  {
    id: 'bell-loose',
    name: 'bell loose',
    description: 'The bell has come off its post: the oven works and does not ring.',
    weight: 1,
    source: judgement,
    look: 'The bell hangs on its striker beside the post.',
  },
  {
    id: 'leaky-to-chassis',
    name: 'leaky to chassis',
    description: 'Steam and grease between the main contact and the metal frame conduct.',
    weight: 1,
    source: judgement,
    parameters: { ohms: { name: 'leakage', unit: 'Ω', min: 1e3, max: 1.5e7, usual: 2e5 } },
    look: 'A greasy brown film on the frame of the timer.',
  },
];

const contactSource = 'DS-S, FACTS 8';

function contacts(part: PartContext, fault: FaultReader) {
  const { node, inner, value } = part;
  const isTurned = part.isEnergised || part.isPressed;
  const ohms = (name: 'main' | 'power', wouldClose: boolean): number => {
    const isClosed = fault.has(`${name}-welded`) || (wouldClose && !fault.has(`${name}-open`));
    const poor = fault.has(`${name}-burnt`) ? fault.value(`${name}-burnt`, 'ohms') : 0;
    return isClosed ? value('contact') + poor : value('gap');
  };
  return [
    resistance(inner('main'), node('1'), node('2'), ohms('main', isTurned)),
    resistance(inner('power'), node('2'), node('3'), ohms('power', true)),
  ];
}

export const mechanicalTimer: PartKind = {
  kind: 'mechanical-timer',
  name: 'mechanical timer',
  terminals: () => [
    { id: '1', name: 'main contact, supply side' },
    { id: '2', name: 'main contact, load side' },
    { id: '3', name: 'power contact, transformer side' },
    { id: 'M1', name: 'motor, supply side' },
    { id: 'M2', name: 'motor, neutral side' },
  ],
  values: {
    contact: { name: 'contact', unit: 'Ω', nominal: 0.02, tolerance: 0.4, source: contactSource },
    gap: {
      name: 'open contact',
      unit: 'Ω',
      nominal: 1e9,
      tolerance: 0,
      source: 'ENGINE 3, common practice, no source',
    },
    motor: {
      name: 'motor winding',
      unit: 'Ω',
      nominal: 14e3,
      tolerance: 0.1,
      source: 'common practice, no source',
    },
    motorInductance: {
      name: 'motor inductance',
      unit: 'H',
      nominal: 35,
      tolerance: 0.15,
      source: 'judgement',
    },
  },
  faults,
  actuator: {
    hold: 'Turn the knob up',
    letGo: 'Turn the knob back to zero',
    inShort: 'turn up',
  },
  running: {
    isSwitchedOn: true,
    turns: { winding: 'motor', stoppedBy: ['gear-stripped'] },
  },
  circuit: (part) => {
    const { node, inner, value, faults: applied } = part;
    const fault = readFaults(faults, applied);
    const motor = {
      name: inner('motor'),
      nodes: [node('M1'), node('M2')] as const,
      inductance: value('motorInductance'),
      resistance: value('motor'),
      isOpen: fault.has('motor-open'),
      linkage: 1,
      limb: 'stator',
    };
    const elements = [...contacts(part, fault), ...windings([motor])];
    if (fault.has('leaky-to-chassis')) {
      const ohms = fault.value('leaky-to-chassis', 'ohms');
      elements.push(resistance(inner('leak'), node('1'), '0', ohms));
    }
    return elements;
  },
};
