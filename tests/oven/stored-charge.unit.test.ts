import { describe, expect, it } from 'vitest';
import { advance } from '../../shared/engine/analyses/advance.ts';
import { assemble } from '../../shared/oven/assemble.ts';
import type { AppliedFault } from '../../shared/oven/fault.ts';
import type { BenchBranch } from '../../shared/oven/oven-state.ts';
import { cold, nominal } from './lc-28.ts';

// FACTS 1.2 (CALC): v(t) = V0 exp(-t / RC), V0 = 2969.85 V, the worst case of a 2100 V capacitor.
const V0 = 2969.85;
const apart = ['W23/b', 'W24/a', 'W27/a'];

interface Case {
  microfarads: number;
  megohms?: number;
  branches?: BenchBranch[];
  faults?: AppliedFault[];
  lift?: string[];
}

/** V on the capacitor after `seconds`, the whole oven around it. */
function left(seconds: number, { microfarads, megohms = 10, ...more }: Case): number {
  const { branches = [], faults = [], lift = apart } = more;
  const values = {
    ...nominal.values,
    C1: { ...nominal.values['C1'], capacitance: microfarads * 1e-6, bleeder: megohms * 1e6 },
  };
  const circuit = assemble({ ...nominal, values }, cold({ lift }, faults), branches);
  const storage = { voltages: { 'C1:foils': V0 }, currents: {} };
  const passed = advance(circuit, storage, seconds);
  if (!passed.ok) throw new Error(passed.failure.message);
  return passed.value.storage.voltages['C1:foils'] ?? Number.NaN;
}

const meter: BenchBranch = {
  name: 'meter',
  from: 'C1.1',
  to: 'C1.2',
  resistance: 10e6,
  volts: 0,
};
const lead = (from: string, to: string, resistance = 20e3): BenchBranch => ({
  name: 'discharge',
  from,
  to,
  resistance,
  volts: 0,
});

/** The rows of the discharge lead are worked without a bleeder beside it. */
const noBleeder: AppliedFault[] = [{ on: 'C1', fault: 'bleeder-open' }];

describe('charge left on the capacitor', () => {
  it.each([
    ['1 µF, 10 MΩ after 30 s', 30, { microfarads: 1 }, 147.86],
    ['1 µF, 10 MΩ after 60 s', 60, { microfarads: 1 }, 7.36],
    ['1 µF, 10 MΩ after 40.84 s', 40.84, { microfarads: 1 }, 50],
    ['1 µF, 10 MΩ after 44.70 s', 44.7, { microfarads: 1 }, 34],
    ['1 µF, 9 MΩ after 30 s', 30, { microfarads: 1, megohms: 9 }, 105.95],
    ['0.65 µF after 30 s', 30, { microfarads: 0.65 }, 29.4],
    ['0.90 µF after 30 s', 30, { microfarads: 0.9 }, 105.9],
    ['1.10 µF after 30 s', 30, { microfarads: 1.1 }, 194.2],
    ['1.20 µF after 30 s', 30, { microfarads: 1.2 }, 243.8],
    ['good bleeder and a 10 MΩ meter after 10 s', 10, { microfarads: 1, branches: [meter] }, 401.9],
    [
      '20 kΩ lead after 81.7 ms',
      0.0817,
      { microfarads: 1, faults: noBleeder, branches: [lead('C1.1', 'C1.2')] },
      50,
    ],
    [
      '20 kΩ lead after 159.9 ms',
      0.1599,
      { microfarads: 1, faults: noBleeder, branches: [lead('C1.1', 'C1.2')] },
      1,
    ],
    [
      '47 kΩ lead after 192 ms',
      0.192,
      { microfarads: 1, faults: noBleeder, branches: [lead('C1.1', 'C1.2', 47e3)] },
      50,
    ],
  ] as [string, number, Case, number][])('%s', (_, seconds, what, expected) => {
    expect(Math.abs(left(seconds, what) / expected - 1)).toBeLessThan(0.005);
  });

  // FACTS 1.2: with an open bleeder the meter itself drains it, at the rate of a good bleeder alone.
  it('open bleeder: holds for a minute, and a 10 MΩ meter drains it with the time constant of a good bleeder alone', () => {
    const faults = [{ on: 'C1', fault: 'bleeder-open' }];
    expect(left(60, { microfarads: 1, faults })).toBeGreaterThan(0.99 * V0);
    const drained = left(30, { microfarads: 1, faults, branches: [meter] });
    expect(Math.abs(drained / 147.86 - 1)).toBeLessThan(0.005);
  });

  it('assembled in the oven the charge decays as it does apart', () => {
    expect(Math.abs(left(30, { microfarads: 1, lift: [] }) / 147.86 - 1)).toBeLessThan(0.01);
  });

  // FACTS 13: 20 kOhm from each terminal to chassis. C1.1 is at the chassis already, through the winding.
  it('a 20 kΩ lead from C1.2 to chassis empties it through the winding', () => {
    const branches = [lead('C1.2', 'CH.2')];
    expect(left(0.2, { microfarads: 1, lift: [], branches })).toBeLessThan(1);
  });

  it('the same lead from C1.1 to chassis does not: the charge stands behind the diode', () => {
    const branches = [lead('C1.1', 'CH.2')];
    expect(left(0.2, { microfarads: 1, lift: [], branches })).toBeGreaterThan(0.9 * V0);
  });
});
