/**
 * Constants of physics, SI 2019 (exact by definition; k as read in CODATA, q from memory).
 */
/** J/K */
export const BOLTZMANN = 1.380649e-23;
/** C */
export const ELEMENTARY_CHARGE = 1.602176634e-19;
/** K; the one temperature of the whole engine: every junction is at 300 K, 25.852 mV */
export const JUNCTION_TEMPERATURE = 300;

/** Vt = k T / q, V, at `temperature` K. */
export function thermalVoltage(temperature: number = JUNCTION_TEMPERATURE): number {
  return (BOLTZMANN * temperature) / ELEMENTARY_CHARGE;
}
