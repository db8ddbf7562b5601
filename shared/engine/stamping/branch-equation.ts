import { REFERENCE, type System } from './system.ts';

/**
 * Writes branch k as V = resistance x I + offset, both in SI units:
 * alpha (V_from - V_to) - beta I' = rho with I' = REFERENCE x I, scaled to a largest coefficient of 1.
 */
export function setResistiveBranch(
  system: System,
  k: number,
  resistance: number,
  offset: number,
): void {
  if (resistance <= REFERENCE) {
    setBranch(system, k, 1, resistance / REFERENCE);
    system.rho[k] = offset;
  } else {
    const alpha = REFERENCE / resistance;
    setBranch(system, k, alpha, 1);
    system.rho[k] = alpha * offset;
  }
}

/** Writes branch k as I = conductance x V + current, both in SI units; a conductance of 0 is an open. */
export function setConductiveBranch(
  system: System,
  k: number,
  conductance: number,
  current: number,
): void {
  const alpha = conductance * REFERENCE;
  if (alpha <= 1) {
    setBranch(system, k, alpha, 1);
    system.rho[k] = -REFERENCE * current;
  } else {
    setBranch(system, k, 1, 1 / alpha);
    system.rho[k] = -current / conductance;
  }
}

/** The coefficients alone; the right-hand side is left as it is. */
export function setBranch(system: System, k: number, alpha: number, beta: number): void {
  if (system.alpha[k] === alpha && system.beta[k] === beta) return;
  const { values } = system;
  system.isStale = true;
  system.alpha[k] = alpha;
  system.beta[k] = beta;
  values[system.fromSlot[k]!] = alpha;
  values[system.toSlot[k]!] = -alpha;
  values[system.ownSlot[k]!] = -beta;
}

/** mu of coupling c in its first (side 0) or second (side 1) inductor's row, already scaled. */
export function setMutual(system: System, c: number, side: 0 | 1, mu: number): void {
  if (system.mu[2 * c + side] === mu) return;
  system.isStale = true;
  system.mu[2 * c + side] = mu;
  system.values[system.mutualSlot[2 * c + side]!] = -mu;
}
