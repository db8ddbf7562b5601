import { describe, expect, it } from 'vitest';
import type { BenchPoint } from '../../../src/bench/geometry/bench-point.ts';
import { hitClosedOven } from '../../../src/bench/geometry/closed-oven.ts';
import { hitLead, hitPart, hitTarget, hitTest } from '../../../src/bench/geometry/hit-test.ts';
import { fitted, layout, sceneOf, withLeads } from '../../support/larkfield.ts';

const scene = sceneOf();
const at = (target: string, dx = 0, dy = 0): BenchPoint => {
  const [x, y] = layout.terminals[target]!.at;
  return [x + dx, y + dy];
};

describe('hitting a target', () => {
  it.each(Object.keys(layout.terminals))(
    'finds %s within 12 px, at zoom 1 and at zoom 2',
    (target) => {
      for (let i = 0; i < 12; i++) {
        const [dx, dy] = [Math.cos((i * Math.PI) / 6) * 11.9, Math.sin((i * Math.PI) / 6) * 11.9];
        expect(hitTest(scene, at(target, dx, dy), 1)).toEqual({ kind: 'target', target });
        expect(hitTest(scene, at(target, dx / 2, dy / 2), 2)).toEqual({ kind: 'target', target });
      }
    },
  );

  it('reaches 24 px on the screen whatever the zoom', () => {
    expect(hitTarget(scene, at('CH.3', 0, -23), 1)).toBe('CH.3');
    expect(hitTarget(scene, at('CH.3', 0, -25), 1)).toBeNull();
    expect(hitTarget(scene, at('CH.3', 0, -47), 0.5)).toBe('CH.3');
    expect(hitTarget(scene, at('CH.3', 0, -13), 2)).toBeNull();
  });

  it('takes the nearer of two', () => {
    // H1 and H2 lie 36 units apart, one above the other.
    expect(hitTarget(scene, at('T1.H1', -4, 17), 1)).toBe('T1.H1');
    expect(hitTarget(scene, at('T1.H1', -4, 19), 1)).toBe('T1.H2');
  });

  it('finds a lifted end, and nothing that cannot be reached', () => {
    const lifted = sceneOf(withLeads({ 'W23/a': null }));
    const loose = lifted.terminals.find(({ target }) => target === 'W23/a')!;
    expect(hitTest(lifted, loose.at, 1)).toEqual({ kind: 'target', target: 'W23/a' });
    expect(hitTest(sceneOf(fitted, { isCoverOn: true }), at('C1.1'), 1)).toBeNull();
  });
});

describe('hitting a lead or a part', () => {
  it('finds every longer lead at the middle of its way', () => {
    for (const lead of scene.leads.filter(({ isInCord }) => !isInCord)) {
      const middle = lead.path[Math.floor(lead.path.length / 2)]!;
      if (lead.path.length > 4) expect(hitLead(scene, middle, 4)?.ref).toBe(lead.ref);
    }
  });

  it('says which end of the lead is nearer', () => {
    const way = layout.leads['W11']!.via;
    expect(hitLead(scene, way[0]!, 4)).toEqual({ ref: 'W11', nearEnd: 'a' });
    expect(hitLead(scene, way.at(-1)!, 4)).toEqual({ ref: 'W11', nearEnd: 'b' });
  });

  it('takes a lead that passes 13 px from a terminal, and the terminal itself closer in', () => {
    const red = layout.leads['W25']!.via[0]!;
    expect(hitTest(scene, red, 1)).toMatchObject({ kind: 'lead', ref: 'W25' });
    expect(hitTest(scene, at('T1.H1', -11, 0), 1)).toEqual({ kind: 'target', target: 'T1.H1' });
  });

  it('takes the part that lies on the board, not the board', () => {
    expect(hitPart(scene, [627, 205])).toBe('K1');
    expect(hitPart(scene, [675, 205])).toBe('A1');
    expect(hitPart(scene, [300, 300])).toBeNull();
  });
});

it('finds door, keys and cover of the closed oven', () => {
  expect(hitClosedOven(layout.chassis, [400, 400])).toBe('door');
  expect(hitClosedOven(layout.chassis, [815, 571])).toBe('stop');
  expect(hitClosedOven(layout.chassis, [907, 571])).toBe('start');
  expect(hitClosedOven(layout.chassis, [500, 140])).toBe('cover');
  expect(hitClosedOven(layout.chassis, [500, 740])).toBeNull();
});
