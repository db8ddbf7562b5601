/**
 * A magnetron as one lump of metal that takes up what does not become microwaves:
 *   C dT/dt = P − G (T − T0), in fixed steps, so that every machine comes to the same degrees.
 * P: W left in it; G: W/K to the air. Source: judgement, one sentence at each constant; its cut-out
 * opens at 138 °C and closes at 82 °C (service sheet SM-5, FACTS 8).
 */

/** °C of the workshop and of an oven that has stood for an hour. */
export const roomCelsius = 22;
/** J/K: about a kilogram of copper, steel and aluminium, of which the fins follow at once. */
const heatCapacity = 400;
/** W/K with the fan on the fins: 380 W in them then end near 100 °C, well below the cut-out. */
const blown = 5;
/** W/K in still air: too hot to touch for some ten minutes after a run. */
const still = 0.8;
/** s; a five-hundredth of the fastest change. */
const step = 0.1;

export interface Warming {
  /** W that stay in the magnetron */ watts: number;
  isFanTurning: boolean;
}

/** °C after `seconds` more of this warming, or cooling. */
export function warmed(celsius: number, warming: Warming, seconds: number): number {
  const conductance = warming.isFanTurning ? blown : still;
  let reached = celsius;
  for (let left = seconds; left > 1e-9; left -= step) {
    const flow = warming.watts - conductance * (reached - roomCelsius);
    reached += (flow * Math.min(step, left)) / heatCapacity;
  }
  return reached;
}

/** s until a magnetron at rest in still air has cooled to `target` °C; Infinity when it never will. */
export function coolingTime(celsius: number, target: number): number {
  if (celsius <= target) return 0;
  if (target <= roomCelsius) return Infinity;
  let reached = celsius;
  let seconds = 0;
  for (; reached > target; seconds += step)
    reached = warmed(reached, { watts: 0, isFanTurning: false }, step);
  return seconds;
}
