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
import { loadOven, onBench } from './oven-on-bench.ts';

// The TK-23 as assembled, drawn from a seed, solved by ngspice 39: what the meter then shows.

const tk23 = loadOven('tarnwick-tk-23');
const { cold, settled } = onBench(tk23);

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
): Pair => ({ red, black, setting, state: cold({ lift, ...change }, faults) });

const apart = ['W24/b', 'W25/a', 'W28/a'];

const pairs: Pair[] = [
  pair('P1.L', 'P1.N', 'ohms-20k', [], [], { isDoorClosed: true, pressed: ['K1'] }),
  pair('P1.L', 'P1.N', 'ohms-2M'),
  pair('F1.1', 'F1.2', 'ohms-200'),
  pair('F4.1', 'F4.2', 'ohms-200', ['W24/a']),
  pair('F4.1', 'F4.2', 'ohms-20M', ['W24/a'], [{ on: 'F4', fault: 'open' }]),
  pair('R1.1', 'R1.2', 'ohms-200', ['W10/b']),
  pair('R1.1', 'Z1.4', 'ohms-200', ['W10/b'], [{ on: 'R1', fault: 'drifted' }]),
  pair('S3.COM', 'Z1.4', 'ohms-200'),
  pair('K1.1', 'K1.2', 'ohms-200', ['W8/b'], [], { pressed: ['K1'] }),
  pair('K1.1', 'K1.2', 'ohms-20M', ['W8/b']),
  pair('K1.2', 'K1.3', 'ohms-200', ['W20/a'], [{ on: 'K1', fault: 'power-burnt' }]),
  pair('K1.M1', 'K1.M2', 'ohms-20k', ['W15/b']),
  pair('K1.2', 'Z1.4', 'ohms-2k'),
  pair('E1.1', 'E1.2', 'ohms-2k', ['W17/a']),
  pair('M1.1', 'M1.2', 'ohms-2k', ['W13/b']),
  pair('M2.1', 'M2.2', 'ohms-20k', ['W14/b']),
  pair('T1.1', 'T1.2', 'ohms-200', ['W20/b']),
  pair('T1.HV', 'T1.core', 'ohms-200', ['W23/a'], [], { cleaned: ['T1.core'] }),
  pair('C1.1', 'CH.2', 'ohms-200'),
  pair('C1.2', 'CH.2', 'ohms-20M'),
  pair('CH.2', 'C1.2', 'ohms-20M', [], [{ on: 'F4', fault: 'open' }]),
  pair('C1.1', 'C1.2', 'ohms-20M', apart),
  pair('D1.a', 'D1.k', 'ohms-2000M', ['W28/b']),
  pair('V1.1', 'V1.2', 'ohms-200', ['W25/b', 'W26/b', 'W27/b']),
  pair('S1.NO', 'Z1.4', 'ohms-200', [], [{ on: 'W10', fault: 'wrong-terminal-a' }]),
];

const seedOf = (index: number) => 300 + index;

function ngspiceJob({ red, black, setting, state }: Pair, index: number) {
  const branch = meterBranch(manual2000, setting, red, black);
  const circuit = assemble(drawOven(tk23, seedOf(index)), state, branch ? [branch] : []);
  const deck = writeDeck(circuit);
  const options = { reltol: '1e-4', abstol: '1e-12', vntol: '1e-7' };
  // ngspice puts no conductance from a node to ground: ours is 1e-12 S.
  const held = [...deck.nodes.values()]
    .filter((node) => node !== '0')
    .map((node, place) => `rhold${place} ${node} 0 1e12`);
  const at = (target: string) => deck.nodes.get(nodeOf(state, target)) ?? 'missing';
  const lines = [...deck.lines, ...held];
  return { lines, options, commands: ['op'], red: at(red), black: at(black) };
}

const shownFor = (setting: string, volts: number): Reading =>
  read({
    meter: manual2000,
    unit: exactMeter(),
    settingId: setting,
    trace: { time: [0, 1], volts: [volts, volts] },
    lagState: null,
    relative: null,
    readingNumber: 0,
  }).reading;

describe('readings on the TK-23 beside ngspice', () => {
  let theirs: Reading[] = [];
  beforeAll(() => {
    const jobs = pairs.map(ngspiceJob);
    theirs = runNgspice(jobs).map(({ op = {} }, index) => {
      const { red, black } = jobs[index]!;
      const at = (node: string) => (node === '0' ? 0 : (op[`v(${node})`] ?? Number.NaN));
      return shownFor(pairs[index]!.setting, at(red) - at(black));
    });
  }, 120_000);

  it('compares at least 12 pairs, most of them with digits', () => {
    expect(pairs.length).toBeGreaterThanOrEqual(12);
    expect(theirs.filter(({ counts }) => counts !== null).length).toBeGreaterThanOrEqual(18);
  });

  it.each(pairs.map((entry, index) => [entry.red, entry.black, entry.setting, index] as const))(
    '%s to %s on %s shows the same to one count',
    (red, black, setting, index) => {
      const oven = drawOven(tk23, seedOf(index));
      const ours = settled(pairs[index]!.state, { red, black, setting, oven });
      const other = theirs[index]!;
      expect(ours.isOverRange).toBe(other.isOverRange);
      expect(Math.abs((ours.counts ?? 0) - (other.counts ?? 0))).toBeLessThanOrEqual(1);
    },
  );
});
