import { describe, expect, it } from 'vitest';
import { coolingTime, warmed } from '../../../shared/bench/powered-run/magnetron-heat.ts';

// Closed form of C dT/dt = P − G (T − T0): T = T0 + P/G (1 − e^(−Gt/C)), with 400 J/K, 5 W/K blown on, 0.8 W/K still.
describe('a magnetron', () => {
  it('is at 1 − 1/e of its rise after one time constant: 22 + 76 x 0.632 °C after 80 s of 380 W', () => {
    expect(warmed(22, { watts: 380, isFanTurning: true }, 80)).toBeCloseTo(70.04, 1);
  });

  it('ends near 98 °C with its fan, under the 138 °C of its cut-out, and passes that without', () => {
    expect(warmed(22, { watts: 380, isFanTurning: true }, 3600)).toBeCloseTo(98, 1);
    expect(warmed(22, { watts: 380, isFanTurning: false }, 150)).toBeGreaterThan(138);
  });

  it('cools in still air from 138 to 82 °C in 500 s x ln(116 / 60) = 330 s', () => {
    expect(coolingTime(138, 82)).toBeCloseTo(329.6, 0);
  });

  it('is never as cold as a one-shot wants it', () => {
    expect(coolingTime(138, -273)).toBe(Infinity);
  });
});
