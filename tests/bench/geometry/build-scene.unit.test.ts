import { describe, expect, it } from 'vitest';
import type {
  BenchScene,
  SceneLead,
  SceneTerminal,
} from '../../../src/bench/geometry/bench-scene.ts';
import { flatten, smoothPath } from '../../../src/bench/geometry/smooth-path.ts';
import { definition, fitted, layout, sceneOf, withLeads } from '../../support/larkfield.ts';

const leadOf = (scene: BenchScene, ref: string): SceneLead =>
  scene.leads.find((lead) => lead.ref === ref)!;
const terminalOf = (scene: BenchScene, target: string): SceneTerminal | undefined =>
  scene.terminals.find((terminal) => terminal.target === target);
const placeOf = (target: string): readonly [number, number] => layout.terminals[target]!.at;

describe('a fitted oven', () => {
  it('lands both ends of every drawn curve exactly on their terminals', () => {
    const scene = sceneOf();
    expect(scene.leads).toHaveLength(32);
    for (const lead of definition.leads) {
      const curve = flatten(smoothPath(leadOf(scene, lead.ref).path));
      expect(curve[0], lead.ref).toEqual(placeOf(lead.ends[0]));
      expect(curve.at(-1), lead.ref).toEqual(placeOf(lead.ends[1]));
    }
  });

  it('has no loose ends and a varnished spot on each core', () => {
    const { terminals } = sceneOf();
    expect(terminals.filter(({ state }) => state === 'loose-end')).toEqual([]);
    expect(
      terminals.filter(({ state }) => state === 'varnished').map(({ target }) => target),
    ).toEqual(['T2.core', 'T1.core']);
  });
});

describe('a lifted lead end', () => {
  const scene = sceneOf(withLeads({ 'W23/a': null }), { labels: { 'W23/a': '1 HV' } });

  it('lies where the layout hangs it, and is a target of its own', () => {
    const [dx, dy] = layout.leads['W23']!.hangs![0];
    const [x, y] = placeOf('T1.HV');
    const end = leadOf(scene, 'W23').ends[0];
    expect(end).toMatchObject({
      target: 'W23/a',
      seatedOn: null,
      at: [x + dx, y + dy],
      label: '1 HV',
    });
    expect(terminalOf(scene, 'W23/a')).toMatchObject({ state: 'loose-end', at: end.at });
    expect(leadOf(scene, 'W23').path[0]).toEqual(end.at);
  });

  it('leaves its terminal and its other end where they are', () => {
    expect(terminalOf(scene, 'T1.HV')).toMatchObject({ at: placeOf('T1.HV'), state: 'bare' });
    expect(leadOf(scene, 'W23').path.at(-1)).toEqual(placeOf('C1.1'));
  });
});

describe('a refitted lead end', () => {
  it('goes home as if it had never been lifted', () => {
    expect(sceneOf(withLeads({ 'W10/a': 'S1.NO' }))).toEqual(sceneOf());
  });

  it('sits on a wrong terminal if that is where it was fitted', () => {
    const scene = sceneOf(withLeads({ 'W10/a': 'S2.COM', 'W13/a': 'S1.NO' }));
    expect(leadOf(scene, 'W10')).toMatchObject({
      ends: [{ seatedOn: 'S2.COM' }, { seatedOn: 'K1.1' }],
    });
    expect(leadOf(scene, 'W10').path[0]).toEqual(placeOf('S2.COM'));
    expect(leadOf(scene, 'W13').path[0]).toEqual(placeOf('S1.NO'));
    expect(terminalOf(scene, 'W10/a')).toBeUndefined();
  });

  it('reaches over to a far terminal without going home first', () => {
    const path = leadOf(sceneOf(withLeads({ 'W11/b': 'C1.1' })), 'W11').path;
    expect(path.at(-1)).toEqual(placeOf('C1.1'));
    // The last point of the way home, beside T1.1, is no longer on it.
    expect(path).not.toContainEqual(layout.leads['W11']!.via.at(-1));
  });
});

describe('hand and tools', () => {
  it('puts a probe exactly on what it touches, also on a lifted end', () => {
    const scene = sceneOf(withLeads({ 'W23/a': null }), {
      probes: { red: 'W23/a', black: 'T1.core' },
      holds: { red: 'handle', black: 'clip' },
    });
    expect(scene.probes).toEqual([
      { colour: 'red', at: terminalOf(scene, 'W23/a')!.at, isInHand: false, hold: 'handle' },
      { colour: 'black', at: placeOf('T1.core'), isInHand: false, hold: 'clip' },
    ]);
    expect(terminalOf(scene, 'T1.core')!.probes).toEqual(['black']);
  });

  it('shows a cleaned spot, a pressed switch and an open door', () => {
    const scene = sceneOf({
      ...fitted,
      cleaned: ['T1.core'],
      pressed: ['S1'],
      isDoorClosed: false,
    });
    expect(terminalOf(scene, 'T1.core')!.state).toBe('cleaned');
    expect(scene.isDoorOpen).toBe(true);
    const actuated = scene.parts.filter(
      ({ kind, isActuated }) => kind === 'door-switch' && isActuated,
    );
    expect(actuated.map(({ ref }) => ref)).toEqual(['S1']);
  });

  it('reaches only the plug and the battery with the cover on, and no pin that is in the outlet', () => {
    const reachable = (scene: BenchScene): string[] =>
      scene.terminals.filter(({ isReachable }) => isReachable).map(({ target }) => target);
    const battery = ['BAT.pos', 'BAT.neg', 'BAT.1k'];
    expect(reachable(sceneOf(fitted, { isCoverOn: true }))).toEqual([
      'P1.L',
      'P1.N',
      'P1.E',
      ...battery,
    ]);
    expect(reachable(sceneOf(fitted, { isCoverOn: true, isCordIn: true }))).toEqual(battery);
  });

  it('moves the plug and the ends of its three leads into the outlet together', () => {
    const out = sceneOf();
    const inside = sceneOf(fitted, { isCordIn: true });
    const shift = [
      inside.parts.find(({ ref }) => ref === 'P1')!.at[0] -
        out.parts.find(({ ref }) => ref === 'P1')!.at[0],
      inside.parts.find(({ ref }) => ref === 'P1')!.at[1] -
        out.parts.find(({ ref }) => ref === 'P1')!.at[1],
    ];
    expect(shift).not.toEqual([0, 0]);
    for (const ref of ['W1', 'W2', 'W3']) {
      const [x, y] = leadOf(out, ref).path[0]!;
      expect(leadOf(inside, ref).path[0]).toEqual([x + shift[0]!, y + shift[1]!]);
    }
  });
});
