/**
 * An implicit Runge-Kutta method whose first stage is the last of the step before and whose other
 * stages share one coefficient gamma (ESDIRK), so a step of a linear circuit needs one factoring:
 *   y_s = y_n + h sum_{r<s} a[s][r] k_r + h gamma k_s,   k = dy/dt,   y_{n+1} = the last stage.
 * The difference of two sums over the same stages estimates the error: h sum (b - bHat) k.
 */
export interface Tableau {
  readonly name: string;
  readonly stages: number;
  readonly gamma: number;
  /** share of the step at which each stage stands */ readonly c: readonly number[];
  /** coefficients of earlier stages, by stage */ readonly a: readonly (readonly number[])[];
  /** b - bHat, by stage */ readonly errorWeights: readonly number[];
  /** weights that integrate a quantity over the step from its stage values */
  readonly quadrature: readonly number[];
  /** the error estimate falls as h to this power */ readonly errorPower: number;
}
