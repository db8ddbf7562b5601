/**
 * Microwaves that get past the closed door, at 5 cm from it:
 *   S(place) = P (g s(place) + what a damaged door lets through there),
 * P the microwave power (W), g the door's own leakage per watt, s the share of each place.
 * Limits: 5 mW/cm2 in use, 1 mW/cm2 before sale (21 CFR 1030.10(c), second hand; 50 W/m2 at 5 cm in
 * AS/NZS 60335.2.25 as quoted: FACTS 2). Size of a sound door's leakage and its shares: judgement.
 */
import type { DrawnOven, OvenState } from '../../oven/oven-state.ts';
import { partKinds } from '../../oven/parts/catalogue.ts';

/** mW/cm² at 5 cm, of an oven in use */
export const leakageLimit = 5;

export const doorPlaces = [
  'top edge',
  'handle side',
  'bottom edge',
  'hinge side',
  'window',
] as const;
export type DoorPlace = (typeof doorPlaces)[number];

const shares: Record<DoorPlace, number> = {
  'top edge': 1,
  'handle side': 0.8,
  'bottom edge': 0.9,
  'hinge side': 0.7,
  window: 0.4,
};

/** Where each fault of the door lets it out. */
const faultPlaces: Readonly<Record<string, DoorPlace>> = {
  'door-hinge-bent': 'hinge side',
  'door-seal-burnt': 'handle side',
  'door-seal-dirty': 'bottom edge',
};

/** mW/cm² at each place of the door, at 5 cm, while the oven gives `power` W of microwaves. */
export function leakageAround(
  { definition, values }: DrawnOven,
  { faults }: OvenState,
  power: number,
): Record<DoorPlace, number> {
  const [door] = definition.parts.filter(({ kind }) => kind === 'chassis');
  const own = values[door?.ref ?? '']?.['doorLeak'] ?? 0;
  const extra = (place: DoorPlace): number =>
    faults
      .filter(({ on, fault }) => on === door?.ref && faultPlaces[fault] === place)
      .reduce((sum, { fault, values: given }) => {
        const usual = partKinds.chassis.faults.find(({ id }) => id === fault)?.parameters?.['leak'];
        return sum + (given?.['leak'] ?? usual?.usual ?? 0);
      }, 0);
  const at = (place: DoorPlace): number =>
    Math.round(100 * (power / 1000) * (own * shares[place] + extra(place))) / 100;
  return Object.fromEntries(doorPlaces.map((place) => [place, at(place)])) as Record<
    DoorPlace,
    number
  >;
}
