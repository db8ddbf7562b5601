import { describe, expect, it } from 'vitest';
import { faultsOf } from '../../shared/oven/check-faults.ts';
import type { AppliedFault } from '../../shared/oven/fault.ts';
import { leadFaults } from '../../shared/oven/lead-faults.ts';
import { partKindName } from '../../shared/oven/oven.ts';
import { partKinds } from '../../shared/oven/parts/catalogue.ts';
import { cold, lc28, solve } from './lc-28.ts';

const kinds = Object.entries(partKinds);
const allFaults = [...kinds.flatMap(([, kind]) => kind.faults), ...leadFaults];
const singles: AppliedFault[] = [...lc28.parts, ...lc28.leads].flatMap(({ ref }) =>
  (faultsOf(lc28, ref) ?? []).map(({ id }) => ({ on: ref, fault: id })),
);

describe('catalogue of part kinds', () => {
  it('has every kind the oven format knows, under its own name', () => {
    expect(kinds.map(([name]) => name).sort()).toEqual([...partKindName.options].sort());
    for (const [name, kind] of kinds) expect(kind.kind).toBe(name);
  });

  it('names each fault and terminal of a kind once', () => {
    const repeated = (names: string[]) => names.length - new Set(names).size;
    for (const [, kind] of kinds) {
      expect(repeated(kind.faults.map(({ id }) => id))).toBe(0);
      for (const variant of kind.variants ?? [undefined])
        expect(repeated(kind.terminals(variant).map(({ id }) => id))).toBe(0);
    }
  });

  it('gives every fault parameter a usual value inside its limits, and every fault a weight', () => {
    for (const fault of allFaults) {
      expect(fault.weight).toBeGreaterThan(0);
      expect(fault.source).not.toBe('');
      for (const { min, usual, max } of Object.values(fault.parameters ?? {})) {
        expect(usual).toBeGreaterThanOrEqual(min);
        expect(usual).toBeLessThanOrEqual(max);
      }
    }
  });

  it('names a source for every value', () => {
    for (const [, kind] of kinds)
      for (const { source, tolerance } of Object.values(kind.values)) {
        expect(source).not.toBe('');
        expect(tolerance).toBeLessThan(1);
      }
  });
});

describe('faults of the LC-28', () => {
  // PRODUCT 6: at least 60 single faults per oven.
  it('has at least 60 in its parts alone', () => {
    expect(singles.filter(({ on }) => !on.startsWith('W')).length).toBeGreaterThanOrEqual(60);
  });

  it('each alone gives a circuit that can be solved', () => {
    for (const fault of singles) {
      const { voltages } = solve(cold({}, [fault]), []);
      expect(Object.values(voltages).every(Number.isFinite)).toBe(true);
    }
  }, 60_000);

  it('at both limits of every parameter too', () => {
    for (const part of lc28.parts)
      for (const { id, parameters = {} } of partKinds[part.kind].faults)
        for (const limit of ['min', 'max'] as const) {
          const values = Object.fromEntries(
            Object.entries(parameters).map(([name, range]) => [name, range[limit]]),
          );
          const state = cold({ isDoorClosed: true }, [{ on: part.ref, fault: id, values }]);
          const meter = { name: 'm', from: 'C1.2', to: 'CH.2', resistance: 1e4, volts: 3 };
          expect(Number.isFinite(solve(state, [meter]).voltages['C1.2'])).toBe(true);
        }
  }, 60_000);
});
