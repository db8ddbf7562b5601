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
import { cold, lc28, settled } from './lc-28.ts';

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
): Pair => ({ red, black, setting, state: cold({ lift, ...change }, faults) });

const capacitorApart = ['W23/b', 'W24/a', 'W27/a'];
const heaterApart = ['W24/b', 'W25/b', 'W26/b'];
const clean = { cleaned: ['T1.core', 'T2.core'] };

const pairs: Pair[] = [
  pair('P1.L', 'P1.N', 'ohms-2k'),
  pair('P1.E', 'CH.1', 'ohms-200'),
  pair('F1.1', 'F1.2', 'ohms-200'),
  pair('F1.1', 'F1.2', 'ohms-20M', ['W4/a'], [{ on: 'F1', fault: 'open' }]),
  pair('Z1.1', 'Z1.2', 'ohms-2M', ['W4/b', 'W5/a']),
  pair('F2.1', 'F2.2', 'ohms-200', [], [{ on: 'F2', fault: 'high-resistance' }]),
  pair('S1.COM', 'S1.NO', 'ohms-2k'),
  pair('S1.COM', 'S1.NO', 'beep', ['W7/b'], [], { pressed: ['S1'] }),
  pair('S2.COM', 'S2.NO', 'ohms-20M', ['W13/a'], [{ on: 'S2', fault: 'leaky' }]),
  pair('S3.COM', 'S3.NC', 'beep'),
  pair('K1.A1', 'K1.A2', 'ohms-2k'),
  pair('E1.1', 'E1.2', 'ohms-200'),
  pair('E1.1', 'E1.2', 'ohms-200', ['W17/b']),
  pair('M1.1', 'M1.2', 'ohms-200', ['W18/b']),
  pair('M2.1', 'M2.2', 'ohms-20k', ['W19/b']),
  pair('T2.1', 'T2.2', 'ohms-2k', ['W8/b'], [{ on: 'T2', fault: 'shorted-turns' }]),
  pair('T2.3', 'T2.4', 'ohms-200'),
  pair('T2.5', 'T2.6', 'ohms-200'),
  pair('T2.1', 'T2.core', 'ohms-20M', [], [{ on: 'T2', fault: 'primary-leaky-to-core' }], clean),
  pair('A1.1', 'A1.2', 'diode', ['W29/b']),
  pair('T1.1', 'T1.2', 'ohms-200'),
  pair('T1.HV', 'T1.core', 'ohms-200', ['W23/a'], [], clean),
  pair(
    'T1.HV',
    'T1.core',
    'ohms-200',
    ['W23/a'],
    [{ on: 'T1', fault: 'hv-shorted-to-core' }],
    clean,
  ),
  pair('C1.1', 'C1.2', 'ohms-20M', capacitorApart),
  pair('C1.1', 'C1.2', 'ohms-20M'),
  pair('C1.2', 'CH.2', 'ohms-20M'),
  pair('CH.2', 'C1.2', 'ohms-20M'),
  pair('C1.2', 'CH.2', 'ohms-2000M'),
  pair('C1.2', 'CH.2', 'ohms-200', [], [{ on: 'C1', fault: 'shorted' }]),
  pair('C1.1', 'C1.can', 'ohms-20M', capacitorApart, [{ on: 'C1', fault: 'leaky-to-can' }]),
  pair('D1.a', 'D1.k', 'ohms-2000M', ['W27/b']),
  pair('D1.k', 'D1.a', 'ohms-2000M', ['W27/b']),
  pair('D1.k', 'D1.a', 'ohms-2000M', ['W27/b'], [{ on: 'D1', fault: 'leaky' }]),
  pair('V1.1', 'V1.2', 'ohms-200', heaterApart),
  pair('V1.1', 'V1.2', 'ohms-200', [], [{ on: 'V1', fault: 'heater-open' }]),
  pair('V1.1', 'V1.body', 'ohms-20M', heaterApart, [{ on: 'V1', fault: 'leaky' }]),
  pair('W24/a', 'CH.3', 'ohms-20M', ['W24/a']),
  pair('BAT.1k', 'BAT.neg', 'dc-20'),
];

const seedOf = (index: number) => 100 + index;

function ngspiceJob({ red, black, setting, state }: Pair, index: number) {
  const branch = meterBranch(manual2000, setting, red, black);
  const circuit = assemble(drawOven(lc28, seedOf(index)), state, branch ? [branch] : []);
  const deck = writeDeck(circuit);
  // ngspice puts no conductance from a node to ground: ours is 1e-12 S. With tolerances far below a
  // count it does not settle on the bridge of the board, so here they are near its own.
  const options = { reltol: '1e-4', abstol: '1e-12', vntol: '1e-7' };
  const held = [...deck.nodes.values()]
    .filter((node) => node !== '0')
    .map((node, place) => `rhold${place} ${node} 0 1e12`);
  const at = (target: string) => deck.nodes.get(nodeOf(state, target)) ?? 'missing';
  return {
    lines: [...deck.lines, ...held],
    options,
    commands: ['op'],
    red: at(red),
    black: at(black),
  };
}

function shownFor(setting: string, volts: number): Reading {
  return read({
    meter: manual2000,
    unit: exactMeter(),
    settingId: setting,
    trace: { time: [0, 1], volts: [volts, volts] },
    lagState: null,
    relative: null,
    readingNumber: 0,
  }).reading;
}

describe('readings beside ngspice', () => {
  let theirs: Reading[] = [];
  beforeAll(() => {
    const jobs = pairs.map(ngspiceJob);
    theirs = runNgspice(jobs).map(({ op = {} }, index) => {
      const { red, black } = jobs[index]!;
      const at = (node: string) => (node === '0' ? 0 : (op[`v(${node})`] ?? Number.NaN));
      const volts = at(red) - at(black);
      return shownFor(pairs[index]!.setting, volts);
    });
  }, 120_000);

  it('compares at least 20 pairs, most of them with digits', () => {
    expect(pairs.length).toBeGreaterThanOrEqual(20);
    expect(theirs.filter(({ counts }) => counts !== null).length).toBeGreaterThanOrEqual(30);
  });

  it.each(pairs.map((entry, index) => [entry.red, entry.black, entry.setting, index] as const))(
    '%s to %s on %s shows the same to one count',
    (red, black, setting, index) => {
      const oven = drawOven(lc28, seedOf(index));
      const ours = settled({ state: pairs[index]!.state, red, black, setting, oven });
      const other = theirs[index]!;
      expect(ours.isOverRange).toBe(other.isOverRange);
      expect(Math.abs((ours.counts ?? 0) - (other.counts ?? 0))).toBeLessThanOrEqual(1);
    },
  );
});
