import type { DiodeModel } from '../circuit/circuit.ts';
import { log, log1p } from '../elementary/logarithm.ts';

/**
 * Where other simulators let breakdown begin, V: x such that IS exp(-(v + x) / a) meets IBV at -BV,
 *   x = BV - a log(IBV / IS + 1 - x / Vt),
 * found by repeating it. With an IBV below IS BV / Vt it is BV itself.
 * Source: ngspice manual and the known behaviour of that program, chapter on diodes.
 */
export function matchBreakdown(model: DiodeModel, thermalVoltage: number): number {
  const { breakdownVoltage = Infinity, saturationCurrent, emission } = model;
  const current = model.breakdownCurrent ?? DEFAULT_CURRENT;
  if (breakdownVoltage === Infinity) return Infinity;
  if (current < (saturationCurrent * breakdownVoltage) / thermalVoltage) return breakdownVoltage;
  const slope = emission * thermalVoltage;
  let start = breakdownVoltage - slope * log1p(current / saturationCurrent);
  for (let round = 0; round < 25; round += 1) {
    const share = current / saturationCurrent + 1 - start / thermalVoltage;
    start = breakdownVoltage - slope * log(share);
  }
  return start;
}

/** A; the usual default of IBV in a model card. */
export const DEFAULT_CURRENT = 1e-3;
