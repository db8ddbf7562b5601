import { readdirSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { terminalsOf } from '../../../shared/oven/targets.ts';
import { buildDiagram } from '../../../src/bench/diagram/build-diagram.ts';
import { boxesOverlap, isInBox } from '../../../src/bench/geometry/bench-box.ts';
import type { BenchPoint } from '../../../src/bench/geometry/bench-point.ts';
import { ovenDrawing } from '../../support/oven-drawing.ts';

const ids = readdirSync('scenarios/ovens')
  .filter((name) => name.endsWith('.layout.json'))
  .map((name) => name.replace('.layout.json', ''));

/** Terminals that leads join, spelt alike: the nets of the sheet. */
function netsOf(leads: readonly { ends: readonly [string, string] }[]): (ref: string) => string {
  const parent = new Map<string, string>();
  const find = (ref: string): string => {
    const up = parent.get(ref) ?? ref;
    return up === ref ? ref : find(up);
  };
  for (const { ends } of leads) parent.set(find(ends[0]), find(ends[1]));
  return find;
}

const stepsOf = (way: readonly BenchPoint[]): string[] =>
  way.slice(1).map((point, i) => [way[i]!.join(), point.join()].sort().join(' '));

const isStep = ([ax, ay]: BenchPoint, [bx, by]: BenchPoint): boolean =>
  Math.abs(ax - bx) + Math.abs(ay - by) === 10 && (ax === bx || ay === by);

describe.each(ids)('the wiring diagram of the %s', (id) => {
  const { definition, layout } = ovenDrawing(id);
  const diagram = buildDiagram(definition, layout);
  const wayOf = (ref: string): readonly BenchPoint[] => diagram.routes.get(ref) ?? [];

  it('has a symbol for every part, a point on the grid for every terminal, all on the sheet', () => {
    expect(diagram.symbols.map(({ part }) => part.ref)).toEqual(
      definition.parts.map(({ ref }) => ref),
    );
    expect(Object.keys(diagram.places).sort()).toEqual(
      terminalsOf(definition)
        .map(({ ref }) => ref)
        .sort(),
    );
    for (const [ref, [x, y]] of Object.entries(diagram.places)) {
      expect([x % 10, y % 10], ref).toEqual([0, 0]);
      expect(x > 0 && y > 0 && x < diagram.size[0] && y < diagram.size[1], ref).toBe(true);
    }
  });

  it('lets no two symbols overlap and no symbol cover a terminal', () => {
    diagram.symbols.forEach((one, i) => {
      for (const other of diagram.symbols.slice(i + 1))
        expect(boxesOverlap(one.body, other.body), `${one.part.ref} ${other.part.ref}`).toBe(false);
      for (const [ref, at] of Object.entries(diagram.places))
        expect(isInBox(at, one.body), `${one.part.ref} over ${ref}`).toBe(false);
    });
  });

  it('leads every lead from its first terminal to its other one, step by step along the grid', () => {
    for (const { ref, ends } of definition.leads) {
      const way = wayOf(ref);
      expect(way[0], ref).toEqual(diagram.places[ends[0]]);
      expect(way.at(-1), ref).toEqual(diagram.places[ends[1]]);
      way.slice(1).forEach((point, i) => expect(isStep(way[i]!, point), ref).toBe(true));
    }
  });

  it('lets no lead run over or along a symbol, or over a terminal that is not its own', () => {
    for (const { ref, ends } of definition.leads)
      for (const point of wayOf(ref)) {
        for (const { body, part } of diagram.symbols)
          expect(isInBox(point, body), `${ref} over ${part.ref}`).toBe(false);
        for (const [terminal, at] of Object.entries(diagram.places))
          if (!ends.includes(terminal))
            expect(at.join() === point.join(), `${ref} over ${terminal}`).toBe(false);
      }
  });

  it('lets no two leads of different nets share a step, or touch but to cross', () => {
    const net = netsOf(definition.leads);
    definition.leads.forEach((one, i) => {
      const steps = new Set(stepsOf(wayOf(one.ref)));
      for (const other of definition.leads.slice(i + 1)) {
        if (net(one.ends[0]) === net(other.ends[0])) continue;
        expect(
          stepsOf(wayOf(other.ref)).filter((step) => steps.has(step)),
          `${one.ref} along ${other.ref}`,
        ).toEqual([]);
        const corner = new Set(bendsOf(wayOf(other.ref)));
        const own = new Set(bendsOf(wayOf(one.ref)));
        for (const point of wayOf(one.ref))
          expect(corner.has(point.join()), `${one.ref} at a corner of ${other.ref}`).toBe(false);
        for (const point of wayOf(other.ref))
          expect(own.has(point.join()), `${other.ref} at a corner of ${one.ref}`).toBe(false);
      }
    });
  });

  it('names every part with its reference and every terminal, no name over another or over a symbol', () => {
    for (const { ref } of definition.parts)
      expect(diagram.labels.get(ref)?.text.split(/\s/)[0]).toBe(ref);
    for (const ref of Object.keys(diagram.places))
      expect(diagram.labels.get(ref)?.text).toBe(ref.split('.')[1]);
    const labels = [...diagram.labels];
    labels.forEach(([ref, { box }], i) => {
      for (const [other, { box: otherBox }] of labels.slice(i + 1))
        expect(boxesOverlap(box, otherBox), `${ref} over ${other}`).toBe(false);
      for (const { body, part } of diagram.symbols)
        expect(boxesOverlap(box, body), `${ref} over the symbol of ${part.ref}`).toBe(false);
    });
  });

  it('comes out the same each time', () => {
    expect([...buildDiagram(definition, layout).routes]).toEqual([...diagram.routes]);
  });
});

function bendsOf(way: readonly BenchPoint[]): string[] {
  return way
    .filter((point, i) => {
      const [before, after] = [way[i - 1], way[i + 1]];
      if (!before || !after) return true;
      return before[0] !== after[0] && before[1] !== after[1];
    })
    .map((point) => point.join());
}
