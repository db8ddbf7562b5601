/**
 * What can be wrong with a lead. A lead seated at both ends is
 *   R = R(wire) + 2 x 3 mOhm; each connector adds its own contact.
 * Source: good crimped joint 1 to 3 mOhm, loose or burnt 0.1 Ohm up: FACTS section 8, common practice.
 */
import type { FaultKind } from './fault.ts';
import { judgement } from './fault.ts';

/** Ohm, one seated connector. */
export const CONNECTOR_CONTACT = 3e-3;

const ohms = { name: 'joint', unit: 'Ω', min: 0.1, max: 100, usual: 1.5 };

export const leadFaults: readonly FaultKind[] = [
  {
    id: 'open-inside',
    name: 'broken inside',
    description: 'The conductor is broken under its insulation.',
    weight: 1,
    source: judgement,
  },
  {
    id: 'burnt-connector-a',
    name: 'burnt connector at its first end',
    description: 'The receptacle has lost its spring and makes a poor joint.',
    weight: 2,
    source: judgement,
    parameters: { ohms },
    look: 'The sleeve of the connector at the first end is brown and hard.',
  },
  {
    id: 'burnt-connector-b',
    name: 'burnt connector at its other end',
    description: 'The receptacle has lost its spring and makes a poor joint.',
    weight: 2,
    source: judgement,
    parameters: { ohms },
    look: 'The sleeve of the connector at the other end is brown and hard.',
  },
  {
    id: 'off-a',
    name: 'left off at its first end',
    description: 'An earlier repair left this connector off its terminal.',
    weight: 1,
    source: judgement,
    look: 'The connector at the first end hangs loose.',
  },
  {
    id: 'off-b',
    name: 'left off at its other end',
    description: 'An earlier repair left this connector off its terminal.',
    weight: 1,
    source: judgement,
    look: 'The connector at the other end hangs loose.',
  },
  {
    id: 'wrong-terminal-a',
    name: 'on the wrong terminal at its first end',
    description: 'An earlier repair put this connector on the terminal beside its own.',
    weight: 1,
    source: judgement,
    other: 'terminal',
    look: 'The connector at the first end does not sit where the wiring diagram has it.',
  },
  {
    id: 'swapped-a',
    name: 'swapped with its neighbour at its first end',
    description: 'An earlier repair exchanged this connector with another of the same part.',
    weight: 1,
    source: judgement,
    other: 'lead end',
    look: 'The connector at the first end does not sit where the wiring diagram has it.',
  },
  {
    id: 'wrong-terminal-b',
    name: 'on the wrong terminal at its other end',
    description: 'An earlier repair put this connector on the terminal beside its own.',
    weight: 1,
    source: judgement,
    other: 'terminal',
    look: 'The connector at the other end does not sit where the wiring diagram has it.',
  },
  {
    id: 'swapped-b',
    name: 'swapped with its neighbour at its other end',
    description: 'An earlier repair exchanged this connector with another of the same part.',
    weight: 1,
    source: judgement,
    other: 'lead end',
    look: 'The connector at the other end does not sit where the wiring diagram has it.',
  },
];
