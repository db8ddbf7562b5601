import { describe, expect, it } from 'vitest';
import { faultsOf } from '../../shared/oven/check-faults.ts';
import { solve } from './lc-28.ts';
import { or16, or16OnBench } from './or-16.ts';

const { cold: or16Cold, nominal: or16Nominal } = or16OnBench;

const refs = [...or16.parts, ...or16.leads].map(({ ref }) => ref);
const singles = refs.flatMap((ref) =>
  (faultsOf(or16, ref) ?? []).map((kind) => ({ on: ref, fault: kind.id, kind })),
);
const has = (on: string, fault: string): boolean =>
  singles.some((one) => one.on === on && one.fault === fault);

// PRODUCT 6: at least 60 single faults per oven, over every part and lead.
describe('faults of the OR-16', () => {
  it('has at least 60 in its parts alone, and some on every part and lead', () => {
    expect(singles.filter(({ on }) => !on.startsWith('W')).length).toBeGreaterThanOrEqual(60);
    const spared = refs.filter((ref) => !singles.some(({ on }) => on === ref));
    expect(spared).toEqual([]);
  });

  it('gives a part only the faults of its variant', () => {
    expect(has('S4', 'film')).toBe(true);
    expect(has('S1', 'film')).toBe(false);
    expect(has('M3', 'auxiliary-open')).toBe(true);
    expect(has('M1', 'auxiliary-open')).toBe(false);
    expect(has('A1', 'door-line-open')).toBe(true);
  });

  it('each alone gives a circuit that can be solved, door open and closed', () => {
    for (const { on, fault } of singles)
      for (const isDoorClosed of [false, true]) {
        const state = or16Cold({ isDoorClosed }, [{ on, fault }]);
        const { voltages } = solve(state, [], or16Nominal);
        expect(Object.values(voltages).every(Number.isFinite)).toBe(true);
      }
  }, 60_000);
});
