import { phasor } from '../../engine/analyses/phasor.ts';
import { magnitude } from '../../engine/elementary/magnitude.ts';
import type { DrawnOven, OvenState } from '../../oven/oven-state.ts';
import { asFitted } from '../../oven/initial-state.ts';
import type { HoodOutcome } from '../record.ts';
import { energisedCircuit } from './energised-circuit.ts';
import { refsOf } from './run-electrically.ts';
import { relaysFor } from './relays-for.ts';

/** Share of a healthy current with which the vent turns, and of a healthy power with which a lamp is seen. Judgement. */
const turning = 0.5;
const seen = 0.3;

/** What the hood's keys do with a board that answers; null when the oven has no hood. Linear, so by phasors. */
export function hoodOf(oven: DrawnOven, state: OvenState, isAlive: boolean): HoodOutcome | null {
  const vents = refsWith(oven, 'motor', 'vent-fan');
  const lamps = refsWith(oven, 'lamp', 'cooktop');
  if (vents.length + lamps.length === 0) return null;
  const sound = asFitted(oven.definition, []);
  const isShare = (of: 'vent-low' | 'vent-high' | 'cooktop-lamp', element: string, share: number) =>
    isAlive && currentIn(oven, state, of, element) > share * currentIn(oven, sound, of, element);
  const isStuck = (ref: string, isLow: boolean): boolean =>
    state.faults.some(
      ({ on, fault }) => on === ref && (fault === 'seized' || (isLow && fault === 'greasy')),
    );
  const turns = (speed: 'vent-low' | 'vent-high'): boolean =>
    vents.every(
      (ref) => isShare(speed, `${ref}:winding`, turning) && !isStuck(ref, speed === 'vent-low'),
    );
  return {
    isVentTurningLow: turns('vent-low'),
    isVentTurningHigh: turns('vent-high'),
    isLampLit: lamps.every((ref) => isShare('cooktop-lamp', `${ref}:filament`, Math.sqrt(seen))),
  };
}

const refsWith = (oven: DrawnOven, kind: 'motor' | 'lamp', variant: string): string[] =>
  oven.definition.parts
    .filter((part) => part.kind === kind && part.variant === variant)
    .map(({ ref }) => ref);

/** A rms in one element with only the relay of one key pulled in. */
function currentIn(
  oven: DrawnOven,
  state: OvenState,
  key: 'vent-low' | 'vent-high' | 'cooktop-lamp',
  element: string,
): number {
  const on = { ...state, energised: relaysFor(oven, [key]), hot: refsOf(oven, 'lamp') };
  const solved = phasor(energisedCircuit(oven, on), [oven.definition.supply.hertz]);
  if (!solved.ok) throw new Error(`hood: ${solved.failure.message}`);
  const [re, im] = solved.value.currents[element]?.[0] ?? [0, 0];
  return magnitude(re, im);
}
