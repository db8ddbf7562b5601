import { beforeAll, describe, expect, it } from 'vitest';
import { writeDeck } from '../../shared/engine/deck/write-deck.ts';
import { exactMeter } from '../../shared/instruments/draw-meter.ts';
import { manual2000 } from '../../shared/instruments/manual-2000.ts';
import { meterBranch } from '../../shared/instruments/meter-branch.ts';
import type { Reading } from '../../shared/instruments/meter.ts';
import { read } from '../../shared/instruments/read.ts';
import { assemble, nodeOf } from '../../shared/oven/assemble.ts';
import { drawOven } from '../../shared/oven/draw.ts';
import type { AppliedFault } from '../../shared/oven/fault.ts';
import type { OvenState } from '../../shared/oven/oven-state.ts';
import { runNgspice } from '../support/ngspice.ts';
import { settled } from './lc-28.ts';
import { or16, or16Cold } from './or-16.ts';

// The same assembled circuit, drawn from a seed, solved by ngspice 39: what the meter then shows.

interface Pair {
  red: string;
  black: string;
  setting: string;
  state: OvenState;
}

const pair = (
  red: string,
  black: string,
  setting: string,
  lift: readonly string[] = [],
  faults: readonly AppliedFault[] = [],
  change: Partial<OvenState> = {},
): Pair => ({ red, black, setting, state: or16Cold({ lift, ...change }, faults) });

const ventApart = ['W26/b', 'W27/b'];

const pairs: Pair[] = [
  pair('P1.L', 'P1.N', 'ohms-2k'),
  pair('P1.E', 'CH.1', 'ohms-200'),
  pair('F2.1', 'F2.2', 'ohms-200', ['W14/b'], [{ on: 'F2', fault: 'high-resistance' }]),
  pair('M3.1', 'M3.2', 'ohms-200', ventApart),
  pair('M3.3', 'M3.2', 'ohms-200', ventApart),
  pair('M3.3', 'M3.2', 'ohms-200', ventApart, [{ on: 'M3', fault: 'shorted-turns' }]),
  pair('M3.1', 'M3.2', 'ohms-200'),
  pair('M1.1', 'M1.2', 'ohms-200', ['W21/b']),
  pair('E1.1', 'E1.2', 'ohms-200'),
  pair('E2.1', 'E2.2', 'ohms-200', ['W29/b']),
  pair('K3.A1', 'K3.A2', 'ohms-2k'),
  pair('S4.COM', 'S4.NO', 'ohms-200k', ['W41/a'], [{ on: 'S4', fault: 'film' }], {
    pressed: ['S4'],
  }),
  pair('A1.5', 'A1.6', 'ohms-20k', ['W41/a']),
  pair('T1.1', 'T1.2', 'ohms-200'),
  pair('T2.1', 'T2.2', 'ohms-2k', ['W7/b']),
  pair('C1.1', 'C1.2', 'ohms-20M'),
  pair('C1.2', 'CH.2', 'ohms-20M'),
  pair('D1.a', 'D1.k', 'ohms-2000M', ['W35/b']),
];

const seedOf = (index: number) => 300 + index;

function ngspiceJob({ red, black, setting, state }: Pair, index: number) {
  const branch = meterBranch(manual2000, setting, red, black);
  const deck = writeDeck(assemble(drawOven(or16, seedOf(index)), state, branch ? [branch] : []));
  // As for the LC-28: our conductance of 1e-12 S from every node to ground, and tolerances that settle.
  const options = { reltol: '1e-4', abstol: '1e-12', vntol: '1e-7' };
  const held = [...deck.nodes.values()]
    .filter((node) => node !== '0')
    .map((node, place) => `rhold${place} ${node} 0 1e12`);
  const at = (target: string) => deck.nodes.get(nodeOf(state, target)) ?? 'missing';
  const lines = [...deck.lines, ...held];
  return { lines, options, commands: ['op'], red: at(red), black: at(black) };
}

const shownFor = (settingId: string, volts: number): Reading =>
  read({
    meter: manual2000,
    unit: exactMeter(),
    settingId,
    trace: { time: [0, 1], volts: [volts, volts] },
    lagState: null,
    relative: null,
    readingNumber: 0,
  }).reading;

describe('readings of the OR-16 beside ngspice', () => {
  let theirs: Reading[] = [];
  beforeAll(() => {
    const jobs = pairs.map(ngspiceJob);
    theirs = runNgspice(jobs).map(({ op = {} }, index) => {
      const { red, black } = jobs[index]!;
      const at = (node: string) => (node === '0' ? 0 : (op[`v(${node})`] ?? Number.NaN));
      return shownFor(pairs[index]!.setting, at(red) - at(black));
    });
  }, 120_000);

  it('compares at least 12 pairs with digits', () => {
    expect(theirs.filter(({ counts }) => counts !== null).length).toBeGreaterThanOrEqual(12);
  });

  it.each(pairs.map((entry, index) => [entry.red, entry.black, entry.setting, index] as const))(
    '%s to %s on %s shows the same to one count',
    (red, black, setting, index) => {
      const oven = drawOven(or16, seedOf(index));
      const ours = settled({ state: pairs[index]!.state, red, black, setting, oven });
      const other = theirs[index]!;
      expect(ours.isOverRange).toBe(other.isOverRange);
      expect(Math.abs((ours.counts ?? 0) - (other.counts ?? 0))).toBeLessThanOrEqual(1);
    },
  );
});
