import type { Tableau } from './tableau.ts';

/**
 * Trapezoidal rule to gamma h, then the second-order backward formula to h; gamma = 2 - sqrt 2 makes
 * both stages share one matrix. Second order, L-stable: what a break excites dies at once.
 *
 * Sources: R. E. Bank et al., IEEE Trans. CAD 4 (1985) 436-451; the third-order companion for the
 * error: M. E. Hosea and L. F. Shampine, Appl. Numer. Math. 20 (1996) 21-37 (from memory; the order
 * conditions are checked in the tests).
 */
const gamma = 2 - Math.SQRT2;
const w = Math.SQRT2 / 4;
const d = gamma / 2;
const companion = [(1 - w) / 3, (3 * w + 1) / 3, d / 3] as const;

export const trBdf2: Tableau = {
  name: 'TR-BDF2',
  stages: 3,
  gamma: d,
  c: [0, gamma, 1],
  a: [[], [d], [w, w]],
  errorWeights: [w - companion[0], w - companion[1], d - companion[2]],
  quadrature: companion,
  errorPower: 3,
};
