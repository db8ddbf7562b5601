import type { DrawnOven, OvenState } from '../../oven/oven-state.ts';
import type { Electrical } from './run-electrically.ts';
import { refsOf } from './run-electrically.ts';

/** of the anode power; 4 kV x 0.3 A in for 800 W out (FACTS 7) */
const efficiency = 0.7;

/** W, of all magnetrons, once their heaters are hot. */
export interface MagnetronPower {
  /** into the food */ microwaves: number;
  /** left in the magnetrons: what the anode takes and does not give, and the heater */ lost: number;
}

/** What beam and threshold of each magnetron take up, and what becomes of it; without a magnet nothing but heat. */
export function magnetronPower(oven: DrawnOven, state: OvenState, ran: Electrical): MagnetronPower {
  const all = refsOf(oven, 'magnetron').map((ref) => {
    const anode = Math.max(0, ran.power(`${ref}:beam`) + ran.power(`${ref}:threshold`));
    const isCracked = state.faults.some(
      ({ on, fault }) => on === ref && fault === 'cracked-magnet',
    );
    const microwaves = isCracked ? 0 : efficiency * anode;
    const heater = anode > 0 ? ran.power(`${ref}:heater`) : 0;
    return { microwaves, lost: anode - microwaves + heater };
  });
  return {
    microwaves: all.reduce((sum, one) => sum + one.microwaves, 0),
    lost: all.reduce((sum, one) => sum + one.lost, 0),
  };
}
