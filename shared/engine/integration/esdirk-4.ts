import type { Tableau } from './tableau.ts';

/**
 * ESDIRK4(3)6L[2]SA: fourth order, L-stable, stiffly accurate, third-order companion. For the smooth
 * minutes of a capacitor draining, where the second order would need ten times the steps.
 *
 * Source: C. A. Kennedy and M. H. Carpenter, Appl. Numer. Math. 44 (2003) 139-181, the implicit half
 * of ARK4(3)6L[2]SA (coefficients from memory; the order conditions are checked in the tests).
 */
const b = [82889 / 524892, 0, 15625 / 83664, 69875 / 102672, -2260 / 8211, 1 / 4];
const companion = [
  4586570599 / 29645900160,
  0,
  178811875 / 945068544,
  814220225 / 1159782912,
  -3700637 / 11593932,
  61727 / 225920,
];

export const esdirk4: Tableau = {
  name: 'ESDIRK4(3)6L[2]SA',
  stages: 6,
  gamma: 1 / 4,
  c: [0, 1 / 2, 83 / 250, 31 / 50, 17 / 20, 1],
  a: [
    [],
    [1 / 4],
    [8611 / 62500, -1743 / 31250],
    [5012029 / 34652500, -654441 / 2922500, 174375 / 388108],
    [15267082809 / 155376265600, -71443401 / 120774400, 730878875 / 902184768, 2285395 / 8070912],
    b.slice(0, 5),
  ],
  errorWeights: b.map((weight, stage) => weight - companion[stage]!),
  quadrature: b,
  errorPower: 4,
};
