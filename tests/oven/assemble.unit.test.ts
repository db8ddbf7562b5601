import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { operatingPoint } from '../../shared/engine/analyses/operating-point.ts';
import { assemble, nodeOf } from '../../shared/oven/assemble.ts';
import { faultsOf } from '../../shared/oven/check-faults.ts';
import { drawOven } from '../../shared/oven/draw.ts';
import type { AppliedFault } from '../../shared/oven/fault.ts';
import { asFitted } from '../../shared/oven/initial-state.ts';
import type { BenchBranch, OvenState } from '../../shared/oven/oven-state.ts';
import { describeTarget, liftedEnds, targetsOf, terminalsOf } from '../../shared/oven/targets.ts';
import { cold, lc28, nominal, ohmsBetween, solve } from './lc-28.ts';

const terminals = terminalsOf(lc28).map(({ ref }) => ref);
const leadEnds = lc28.leads.flatMap(({ ref }) => [`${ref}/a`, `${ref}/b`]);
const refs = lc28.parts.map(({ ref }) => ref);

const faults: AppliedFault[] = [...lc28.parts, ...lc28.leads].flatMap(({ ref }) =>
  (faultsOf(lc28, ref) ?? []).map(({ id }) => ({ on: ref, fault: id })),
);

const moved = fc.dictionary(
  fc.constantFrom(...leadEnds),
  fc.oneof({ weight: 3, arbitrary: fc.constant(null) }, fc.constantFrom(...terminals)),
  { maxKeys: 12 },
);

const anyState: fc.Arbitrary<OvenState> = fc
  .record({
    faults: fc.uniqueArray(fc.constantFrom(...faults), { maxLength: 5 }),
    moved,
    isDoorClosed: fc.boolean(),
    pressed: fc.subarray(['S1', 'S2', 'S3']),
    opened: fc.subarray(['F1', 'F2', 'F3']),
    energised: fc.subarray(['K1', 'K2']),
    cleaned: fc.subarray(['T1.core', 'T2.core']),
    hot: fc.subarray(['V1']),
  })
  .map(({ moved: ends, ...rest }) => {
    const fitted = asFitted(lc28, rest.faults);
    return { ...fitted, ...rest, leadEnds: { ...fitted.leadEnds, ...ends } };
  });

const touched = fc.constantFrom(...terminals, ...leadEnds, 'BAT.pos', 'BAT.neg', 'BAT.1k');
const anyBranches: fc.Arbitrary<BenchBranch[]> = fc
  .array(
    fc.record({
      from: touched,
      to: touched,
      resistance: fc.constantFrom(0, 0.2, 1000, 20e3, 10e6),
      volts: fc.constantFrom(0, 0, 0.65, 3),
    }),
    { maxLength: 3 },
  )
  .map((branches) => branches.map((branch, index) => ({ ...branch, name: `tool-${index}` })));

describe('assembling', () => {
  it('gives a legal circuit with finite voltages for every legal state', () => {
    fc.assert(
      fc.property(anyState, anyBranches, fc.nat(1000), (state, branches, seed) => {
        const solved = operatingPoint(assemble(drawOven(lc28, seed), state, branches));
        expect(solved.ok ? '' : solved.failure.message).toBe('');
        if (solved.ok)
          for (const volts of Object.values(solved.value.voltages)) {
            expect(Number.isFinite(volts)).toBe(true);
            expect(Math.abs(volts)).toBeLessThan(4e3);
          }
      }),
      { seed: 20261, numRuns: 150 },
    );
  }, 60_000);

  it('has every terminal as a node, whatever is lifted', () => {
    const { voltages } = solve(cold({ lift: leadEnds }), []);
    for (const terminal of terminals) expect(voltages).toHaveProperty([terminal]);
    for (const end of leadEnds) expect(voltages).toHaveProperty([end]);
  });

  it('stands at zero when nothing drives it', () => {
    const { voltages } = solve(cold(), []);
    for (const [node, volts] of Object.entries(voltages))
      if (!node.startsWith('BAT')) expect(Math.abs(volts)).toBeLessThan(1e-9);
  });

  it('has the battery on the bench: 12.6 V, in series with 1 kOhm at its clip', () => {
    const { voltages } = solve(cold(), []);
    expect((voltages['BAT.pos'] ?? 0) - (voltages['BAT.neg'] ?? 0)).toBeCloseTo(12.6, 6);
    expect(ohmsBetween(cold(), 'BAT.pos', 'BAT.1k', 1000)).toBeCloseTo(1000, 3);
  });

  it('bolts every body to the chassis', () => {
    for (const body of ['C1.can', 'V1.body'])
      expect(ohmsBetween(cold(), body, 'CH.1', 1)).toBeCloseTo(0.006, 6);
    const cleaned = cold({ cleaned: ['T1.core', 'T2.core'] });
    for (const core of ['T1.core', 'T2.core'])
      expect(ohmsBetween(cleaned, core, 'CH.1', 1)).toBeCloseTo(0.007, 6);
    expect(ohmsBetween(cold(), 'T1.core', 'CH.1', 1e9)).toBeGreaterThan(4e11);
  });

  it('makes a lead of its wire and two connectors', () => {
    const alone = cold({ lift: ['W22/a', 'W20/a', 'W21/b'] });
    expect(ohmsBetween(cold({ lift: ['W10/b'] }), 'S3.COM', 'S1.NO', 1)).toBeCloseTo(0.011, 5);
    expect(ohmsBetween(alone, 'W22/a', 'Z1.4', 1)).toBeCloseTo(0.033, 5);
  });

  it('closes door switches with the door or a hand, the monitor the other way', () => {
    const across = (state: OvenState, name: string, contact: string) =>
      ohmsBetween(state, `${name}.COM`, `${name}.${contact}`, 1e3) < 1;
    const lift = ['W7/b', 'W13/a', 'W14/b'];
    const open = cold({ lift });
    const closed = cold({ lift, isDoorClosed: true });
    const pressed = cold({ lift, pressed: ['S1', 'S3'] });
    const table = [open, closed, pressed].map((state) => [
      across(state, 'S1', 'NO'),
      across(state, 'S2', 'NO'),
      across(state, 'S3', 'NC'),
    ]);
    expect(table).toEqual([
      [false, false, true],
      [true, true, false],
      [true, false, false],
    ]);
  });

  it('lets the monitor short line to neutral when the primary switch is welded and the door opens', () => {
    const lift = ['W8/b', 'W16/b', 'W4/b'];
    const line = (state: OvenState) => ohmsBetween(state, 'F2.2', 'Z1.4', 10);
    const weld: AppliedFault[] = [{ on: 'S1', fault: 'welded' }];
    expect(line(cold({ lift }, weld))).toBeLessThan(0.2);
    expect(line(cold({ lift }))).toBeGreaterThan(500);
    expect(line(cold({ lift, isDoorClosed: true }, weld))).toBeGreaterThan(500);
  });

  it('conducts in the magnetron only with a hot heater', () => {
    const supply = { name: 'supply', from: 'V1.1', to: 'V1.body', resistance: 10, volts: -4000 };
    const lift = ['W24/b', 'W25/b', 'W26/b'];
    const across = (hot: string[]) => {
      const { voltages } = solve(cold({ lift, hot }), [supply]);
      return (voltages['V1.1'] ?? 0) - (voltages['V1.body'] ?? 0);
    };
    expect(across([])).toBeCloseTo(-4000, 0);
    // I = (4000 - 3650 - about 0.7) / 360 = 0.97 A
    expect(across(['V1'])).toBeCloseTo(-4000 + 10 * 0.97, 0);
  });
});

describe('targets', () => {
  it('are terminals, lifted lead ends and the battery clips', () => {
    const state = cold({ lift: ['W24/a'] });
    expect(liftedEnds(state)).toEqual(['W24/a']);
    const targets = targetsOf(lc28, state);
    expect(targets).toContain('C1.2');
    expect(targets).toContain('W24/a');
    expect(targets).toContain('BAT.1k');
    expect(targets).not.toContain('W24/b');
    expect(targets).toHaveLength(terminals.length + 4);
  });

  it('have words', () => {
    expect(describeTarget(lc28, 'C1.2')).toBe('C1.2, High-voltage capacitor, diode side');
    expect(describeTarget(lc28, 'W24/b')).toBe('W24/b, capacitor to magnetron, end for V1.1');
    expect(describeTarget(lc28, 'BAT.neg')).toBe('battery, negative pole');
    expect(describeTarget(lc28, 'C1.9')).toBeNull();
    expect(refs.every((ref) => terminals.some((terminal) => terminal.startsWith(`${ref}.`)))).toBe(
      true,
    );
  });

  it('of a seated lead end are its terminal', () => {
    expect(nodeOf(cold(), 'W24/a')).toBe('C1.2');
    expect(nodeOf(cold({ lift: ['W24/a'] }), 'W24/a')).toBe('W24/a');
  });
});

describe('an oven as it comes in', () => {
  it('has its door closed, every lead seated, and the lead that a fault left off', () => {
    const state = asFitted(lc28, [{ on: 'W30', fault: 'off-b' }]);
    expect(state.isDoorClosed).toBe(true);
    expect(state.leadEnds['W30/b']).toBeNull();
    expect(state.leadEnds['W30/a']).toBe('T2.4');
    expect(liftedEnds(state)).toEqual(['W30/b']);
    expect(nominal.definition.leads).toHaveLength(Object.keys(state.leadEnds).length / 2);
  });
});
