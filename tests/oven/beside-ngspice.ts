import { beforeAll, expect, it } from 'vitest';
import { writeDeck } from '../../shared/engine/deck/write-deck.ts';
import { manual2000 } from '../../shared/instruments/manual-2000.ts';
import { meterBranch } from '../../shared/instruments/meter-branch.ts';
import type { Reading } from '../../shared/instruments/meter.ts';
import { assemble, nodeOf } from '../../shared/oven/assemble.ts';
import { drawOven } from '../../shared/oven/draw.ts';
import type { AppliedFault } from '../../shared/oven/fault.ts';
import type { OvenState } from '../../shared/oven/oven-state.ts';
import { runNgspice } from '../support/ngspice.ts';
import { shownFor, type OnBench } from './oven-on-bench.ts';

export interface Pair {
  red: string;
  black: string;
  setting: string;
  state: OvenState;
}

/** A probe pair on an oven, cord out and door open unless the change says otherwise. */
export const pairOn =
  ({ cold }: OnBench) =>
  (
    red: string,
    black: string,
    setting: string,
    lift: readonly string[] = [],
    faults: readonly AppliedFault[] = [],
    change: Partial<OvenState> = {},
  ): Pair => ({ red, black, setting, state: cold({ lift, ...change }, faults) });

/**
 * Tests that the same assembled circuit, each drawn from a seed of its own, solved by ngspice 39
 * shows the same on the meter to one count.
 */
export function agreesWithNgspice(
  { definition, settled }: OnBench,
  pairs: readonly Pair[],
  least: { pairs: number; withDigits: number; firstSeed: number },
): void {
  const drawn = (index: number) => drawOven(definition, least.firstSeed + index);
  const jobs = pairs.map(({ red, black, setting, state }, index) => {
    const branch = meterBranch(manual2000, setting, red, black);
    const deck = writeDeck(assemble(drawn(index), state, branch ? [branch] : []));
    // ngspice puts no conductance from a node to ground: ours is 1e-12 S. With tolerances far below a
    // count it does not settle on the bridge of the board, so here they are near its own.
    const options = { reltol: '1e-4', abstol: '1e-12', vntol: '1e-7' };
    const held = [...deck.nodes.values()]
      .filter((node) => node !== '0')
      .map((node, place) => `rhold${place} ${node} 0 1e12`);
    const at = (target: string) => deck.nodes.get(nodeOf(state, target)) ?? 'missing';
    const lines = [...deck.lines, ...held];
    return { lines, options, commands: ['op'], red: at(red), black: at(black) };
  });

  let theirs: Reading[] = [];
  beforeAll(() => {
    theirs = runNgspice(jobs).map(({ op = {} }, index) => {
      const { red, black } = jobs[index]!;
      const at = (node: string) => (node === '0' ? 0 : (op[`v(${node})`] ?? Number.NaN));
      return shownFor(pairs[index]!.setting, at(red) - at(black));
    });
  }, 120_000);

  it(`compares at least ${least.pairs} pairs, most of them with digits`, () => {
    expect(pairs.length).toBeGreaterThanOrEqual(least.pairs);
    const withDigits = theirs.filter(({ counts }) => counts !== null);
    expect(withDigits.length).toBeGreaterThanOrEqual(least.withDigits);
  });

  it.each(pairs.map((entry, index) => [entry.red, entry.black, entry.setting, index] as const))(
    '%s to %s on %s shows the same to one count',
    (red, black, setting, index) => {
      const ours = settled(pairs[index]!.state, { red, black, setting, oven: drawn(index) });
      const other = theirs[index]!;
      expect(ours.isOverRange).toBe(other.isOverRange);
      expect(Math.abs((ours.counts ?? 0) - (other.counts ?? 0))).toBeLessThanOrEqual(1);
    },
  );
}
