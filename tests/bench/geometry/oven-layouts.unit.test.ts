import { readdirSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { partKinds } from '../../../shared/oven/parts/catalogue.ts';
import { boxesOverlap, distanceToBox } from '../../../src/bench/geometry/bench-box.ts';
import { benchSize } from '../../../src/bench/geometry/bench-furniture.ts';
import { distance } from '../../../src/bench/geometry/bench-point.ts';
import type { SceneTerminal } from '../../../src/bench/geometry/bench-scene.ts';
import { distanceToChain, flatten, smoothPath } from '../../../src/bench/geometry/smooth-path.ts';
import { ovenDrawing } from '../../support/oven-drawing.ts';

const everyPair = <T>(items: readonly T[]): [T, T][] =>
  items.flatMap((a, i) => items.slice(i + 1).map((b): [T, T] => [a, b]));

const ids = readdirSync('scenarios/ovens')
  .filter((name) => name.endsWith('.layout.json'))
  .map((name) => name.replace('.layout.json', ''));

describe.each(ids)('the layout of the %s', (id) => {
  const { definition, drawing, layout, sceneOf, withLeads } = ovenDrawing(id);
  /** Every target of the oven and the battery, and where it is. */
  const places = [...drawing.targets].map(([target, { at }]) => [target, at] as const);
  const allEnds = definition.leads.flatMap(({ ref }) => [`${ref}/a`, `${ref}/b`]);

  it('has a place for every part, terminal and lead of the oven and for nothing else', () => {
    const terminals = definition.parts.flatMap((part) =>
      partKinds[part.kind].terminals(part.variant).map(({ id }) => `${part.ref}.${id}`),
    );
    expect(Object.keys(layout.terminals).sort()).toEqual(terminals.sort());
    expect(Object.keys(layout.parts).sort()).toEqual(definition.parts.map(({ ref }) => ref).sort());
    expect(Object.keys(layout.leads).sort()).toEqual(definition.leads.map(({ ref }) => ref).sort());
    expect(layout.oven).toBe(definition.id);
    expect(layout.size).toEqual(benchSize);
  });

  it('keeps every two targets at least 26 units apart, so that 24 px targets never overlap at zoom 1', () => {
    for (const [[a, at], [b, bt]] of everyPair(places))
      expect(distance(at, bt), `${a} and ${b}`).toBeGreaterThanOrEqual(26);
  });

  it('keeps every lifted end at least 26 units from every target and every other lifted end', () => {
    const lifted = withLeads(Object.fromEntries(allEnds.map((end) => [end, null])));
    const { terminals } = sceneOf(lifted);
    expect(terminals.filter(({ state }) => state === 'loose-end')).toHaveLength(allEnds.length);
    for (const [a, b] of everyPair<SceneTerminal>(terminals))
      expect(distance(a.at, b.at), `${a.target} and ${b.target}`).toBeGreaterThanOrEqual(26);
  });

  it('lets no lead run over a terminal that is not its own', () => {
    for (const lead of sceneOf().leads) {
      const chain = flatten(smoothPath(lead.path), 24);
      const own = lead.ends.map(({ seatedOn }) => seatedOn);
      for (const [target, at] of places)
        if (!own.includes(target))
          expect(distanceToChain(at, chain), `${lead.ref} over ${target}`).toBeGreaterThan(9);
    }
  });

  it('keeps every target and every lead on the bench', () => {
    const onBench = ([x, y]: readonly [number, number]): boolean =>
      x > 12 && y > 12 && x < benchSize[0] - 12 && y < benchSize[1] - 12;
    for (const [target, at] of places) expect(onBench(at), target).toBe(true);
    for (const lead of sceneOf().leads)
      expect(flatten(smoothPath(lead.path)).every(onBench), lead.ref).toBe(true);
  });
});

describe.each(ids)('the labels of the %s', (id) => {
  const { definition, drawing, sceneOf, withLeads } = ovenDrawing(id);
  const places = [...drawing.targets].map(([target, { at }]) => [target, at] as const);
  const { terminalLabels, partLabels } = drawing;
  const labels = [...terminalLabels, ...partLabels];

  it('names every target in full and every part', () => {
    for (const target of drawing.targets.keys())
      expect(terminalLabels.get(target)?.text).toBe(target);
    for (const { ref, kind } of definition.parts)
      if (kind !== 'chassis') expect(partLabels.get(ref)?.text).toContain(ref);
  });

  it('never lets a label cover another label', () => {
    for (const [[a, one], [b, other]] of everyPair(labels))
      expect(boxesOverlap(one.box, other.box), `${a} and ${b}`).toBe(false);
  });

  it('never lets a label cover a target', () => {
    for (const [name, { box }] of labels)
      for (const [target, at] of places)
        expect(distanceToBox(at, box), `${name} over ${target}`).toBeGreaterThanOrEqual(8);
  });

  it('ties tags to lifted ends that cover no target, no label and no other tag', () => {
    const ends = ['W23/a', 'W24/b', 'W7/a', 'W8/a', 'W11/b', 'W5/a', 'W17/a', 'W18/a', 'W19/a'];
    expect(definition.leads.length).toBeGreaterThan(24);
    const oven = withLeads(Object.fromEntries(ends.map((end) => [end, null])));
    const scene = sceneOf(oven, {
      labels: Object.fromEntries(ends.map((end, i) => [end, `${i + 1} TAG`])),
    });
    const tags = scene.leads.flatMap((lead) => lead.ends.flatMap(({ tag }) => tag ?? []));
    expect(tags.map(({ text }) => text).sort()).toEqual(ends.map((_, i) => `${i + 1} TAG`));
    for (const [a, b] of everyPair(tags)) expect(boxesOverlap(a.box, b.box)).toBe(false);
    for (const { box, text } of tags) {
      for (const { at, target } of scene.terminals)
        expect(distanceToBox(at, box), `${text} over ${target}`).toBeGreaterThanOrEqual(9);
      for (const [name, label] of labels)
        expect(boxesOverlap(box, label.box), `${text} over ${name}`).toBe(false);
    }
  });
});
