import type { z } from 'zod';
import type { hazard } from '../../../shared/bench/record.ts';
import { leakageLimit } from '../../../shared/bench/safety/leakage.ts';

export type HazardData = z.infer<typeof hazard>;

export interface HazardWords {
  /** one line */ title: string;
  /** plain sentences: what happened on the bench */ happened: string;
  person: string;
  meter: string;
  /** guided: what belongs before this step */ first: string;
}

const volts = (data: HazardData): string => figure(Math.abs(data.volts), 'V');
const noMeter = 'Nothing, it was not in the path.';

const byKind: Readonly<Record<HazardData['kind'], (data: HazardData) => HazardWords>> = {
  shock: (data) => ({
    title: `Shock from ${data.at ?? 'the open oven'}`,
    happened: `Your hand met ${data.at ?? 'it'} while it stood ${volts(data)} above chassis. ${flow(data)}`,
    person: shockOnPerson(data.energy),
    meter: noMeter,
    first:
      'Before a hand touches anything: cord out, discharge each terminal of the capacitor to chassis through the discharge lead, then prove it dead on DC volts with a meter that you proved on the battery.',
  }),
  'mains-exposed': (data) =>
    data.at === null
      ? {
          title: 'Mains within reach',
          happened:
            'The cord is in while the cover is off. Line, neutral and everything they feed lie open.',
          person: 'One touch of a live tab can stop a heart. Mains does not run down: it holds on.',
          meter: 'Nothing yet.',
          first: 'Fit the cover before the cord goes in. Every test in this oven can be made cold.',
        }
      : {
          title: `Mains on ${data.at}`,
          happened: `Your hand met ${data.at} with ${volts(data)} AC on it, the other hand on the chassis.`,
          person:
            'Mains through the chest can stop a heart. Muscles clamp, and the hand cannot let go.',
          meter: noMeter,
          first: 'Pull the cord and keep the plug in sight before the cover comes off.',
        },
  'microwave-leakage': () => ({
    title: 'Microwaves past the door',
    happened: `It ran while its door let through more than ${leakageLimit} mW/cm² at 5 cm, and nobody had surveyed it.`,
    person: 'Eyes warm first and feel it last. Nothing hurts, and harm is done.',
    meter: noMeter,
    first:
      'Look at the door, its hinges and its seal before a run. After any work on it go around it with the survey meter first, at arm’s length.',
  }),
  'live-probing': (data) => ({
    title: 'Probing live',
    happened: `The tips met ${volts(data)} AC between ${pair(data)}, the cord in.`,
    person:
      'Nothing this time: the handles insulate. A slipped tip or a worn lead puts mains on your fingers or an arc in your face.',
    meter: 'On a volts setting it stands this. On any other it may not.',
    first: 'Pull the cord. Find the fault with ohms, diode and beep on a dead circuit.',
  }),
  'capacitor-shorted': (data) => ({
    title: 'Charged capacitor shorted',
    happened: `The blade bridged ${pair(data)} at ${volts(data)}: a bang and a flash. ${flow(data)}`,
    person: 'Metal spray and a startled hand. The current is hundreds of amperes for an instant.',
    meter: 'Nothing, it was not connected there.',
    first:
      'Discharge through a resistor: clip of the discharge lead on chassis, tip on each terminal for a few seconds. A blade may also break the capacitor or the diode, and leave you a second fault.',
  }),
  'ohms-on-live': (data) => ({
    title: 'Ohms on a live circuit',
    happened: `The meter was set to drive its own current, and found ${volts(data)} between ${pair(data)}.`,
    person: 'Nothing, the handles insulate.',
    meter:
      'The digits mean nothing while the voltage stands. A higher voltage would have destroyed it.',
    first: 'Prove the circuit dead on DC volts first. Then set ohms, diode or beep.',
  }),
  'meter-destroyed': (data) => ({
    title: 'Meter destroyed',
    happened: `${volts(data)} stood between ${pair(data)}, more than this setting bears.`,
    person:
      'A meter that fails on high voltage can burst in your hand, and the arc runs along the leads.',
    meter: 'It is dead and shows nothing more.',
    first:
      'Never put a meter on high voltage. Discharge the capacitor through the discharge lead first, then prove it dead.',
  }),
};

/**
 * A hazard in plain words. The effects are order of magnitude for a dry hand-to-hand path, common
 * practice, no source; what was measured on this bench is in the figures.
 */
export const hazardWords = (data: HazardData): HazardWords => byKind[data.kind](data);

/** `from` first, as recorded. */
const pair = ({ at, to }: HazardData): string => `${at ?? 'one place'} and ${to ?? 'chassis'}`;

const flow = ({ charge, energy }: HazardData): string =>
  energy > 0 ? `${figure(charge, 'C')} flowed, ${figure(energy, 'J')} in all.` : '';

/** J through the body. Common practice, no source: below some millijoules a prick, from tenths of a joule a violent blow, from some joules deadly. */
function shockOnPerson(energy: number): string {
  if (energy < 0.01)
    return 'A sting. The jerk of the arm throws your hand into the next sharp edge.';
  if (energy < 0.5) return 'A hard blow through arms and chest. The jerk alone can injure you.';
  return 'A blow through the chest that can stop a heart.';
}

const prefixes = [
  [1e3, 'k'],
  [1, ''],
  [1e-3, 'm'],
  [1e-6, 'µ'],
  [1e-9, 'n'],
] as const;

/** `1.83 kV`, `310 mJ`: three figures with a prefix. */
export function figure(value: number, unit: string): string {
  if (value === 0) return `0 ${unit}`;
  const [size, prefix] = prefixes.find(([one]) => Math.abs(value) >= one) ??
    prefixes[prefixes.length - 1] ?? [1, ''];
  return `${Number((value / size).toPrecision(3))} ${prefix}${unit}`;
}
