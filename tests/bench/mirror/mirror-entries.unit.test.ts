import { describe, expect, it } from 'vitest';
import type { BenchState } from '../../../shared/bench/bench-state.ts';
import { untouched } from '../../../shared/bench/fold.ts';
import { terminalsOf } from '../../../shared/oven/targets.ts';
import { buildScene } from '../../../src/bench/geometry/build-scene.ts';
import type { BenchScene } from '../../../src/bench/geometry/bench-scene.ts';
import { drawBench } from '../../../src/bench/geometry/draw-bench.ts';
import { hitTest, type BenchHit } from '../../../src/bench/geometry/hit-test.ts';
import { mirrorGroups, type MirrorEntry } from '../../../src/bench/mirror/mirror-entries.ts';
import { sceneHand } from '../../../src/bench/panels/scene-hand.ts';
import { setupWith } from '../../support/bench.ts';
import { layout, oven } from '../../support/client-fixtures.ts';

const drawing = drawBench(oven, layout);
const fresh = untouched(setupWith());

const lifted = (...ends: string[]): BenchState['oven'] => ({
  ...fresh.oven,
  leadEnds: { ...fresh.oven.leadEnds, ...Object.fromEntries(ends.map((end) => [end, null])) },
});

const states: [string, BenchState][] = [
  ['cover on, cord in', fresh],
  ['cover on, cord out', { ...fresh, isCordIn: false }],
  ['open', { ...fresh, isCordIn: false, isCoverOn: false }],
  [
    'open, leads lifted',
    { ...fresh, isCordIn: false, isCoverOn: false, oven: lifted('W23/a', 'W24/a', 'W12/b') },
  ],
];

const sceneOf = (state: BenchState): BenchScene =>
  buildScene(drawing, state.oven, sceneHand(oven, state));
const entriesOf = (state: BenchState): MirrorEntry[] =>
  mirrorGroups(oven, state, sceneOf(state)).flatMap(({ entries }) => entries);
const keyOf = (hit: BenchHit): string =>
  hit.kind === 'target' ? `target ${hit.target}` : `${hit.kind} ${hit.ref}`;

/** Everything that a pointer meets on a fine grid over the bench, and exactly on what is drawn. */
const metBy = (scene: BenchScene): Set<string> => {
  const points: [number, number][] = [];
  for (let x = 0; x <= 1000; x += 9) for (let y = 0; y <= 760; y += 9) points.push([x, y]);
  for (const { at } of scene.terminals) points.push([at[0], at[1]]);
  const hits = points.map((point) => hitTest(scene, point, 1));
  return new Set(hits.filter((hit) => hit !== null).map(keyOf));
};

describe.each(states)('%s', (_name, state) => {
  it('has a button for all that a pointer can meet, and for nothing else that it cannot tap', () => {
    const met = metBy(sceneOf(state));
    const buttons = new Set(entriesOf(state).map(({ kind, ref }) => `${kind} ${ref}`));
    expect([...met].filter((one) => !buttons.has(one))).toEqual([]);
    // A lead or part may lie wholly under others; a target never may.
    expect([...buttons].filter((one) => one.startsWith('target ') && !met.has(one))).toEqual([]);
  });

  it('names every button differently', () => {
    const names = entriesOf(state).map(({ name }) => name);
    expect(new Set(names).size).toBe(names.length);
  });
});

it('has every terminal of the oven once it is open', () => {
  const [, open] = states[2] ?? ['', fresh];
  const refs = new Set(entriesOf(open).map(({ ref }) => ref));
  expect(terminalsOf(oven).filter(({ ref }) => !refs.has(ref))).toEqual([]);
});

it('says in the name what sits on a terminal', () => {
  const state: BenchState = {
    ...fresh,
    isCordIn: false,
    isCoverOn: false,
    oven: lifted('W24/a'),
    labels: { 'W24/a': '2 cap' },
    probes: { red: 'C1.2', black: 'W24/a' },
    holds: { red: 'handle', black: 'clip' },
    discharge: { clip: 'CH.2', tip: null },
  };
  const nameOf = (ref: string) => entriesOf(state).find((one) => one.ref === ref)?.name;
  expect(nameOf('C1.2')).toBe(
    'C1.2, High-voltage capacitor, diode side, red probe on it, W27 on it',
  );
  expect(nameOf('W24/a')).toBe(
    'W24/a, capacitor to magnetron, end for C1.2, black probe on it, through a clip lead, labelled 2 cap',
  );
  expect(nameOf('CH.2')).toContain('discharge clip on it');
});
