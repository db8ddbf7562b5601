import { describe, expect, it } from 'vitest';
import type { BenchPoint } from '../../../src/bench/geometry/bench-point.ts';
import { rest } from '../../../src/bench/geometry/bench-furniture.ts';
import { buildScene } from '../../../src/bench/geometry/build-scene.ts';
import { drawBench } from '../../../src/bench/geometry/draw-bench.ts';
import { placeOf } from '../../../src/bench/panels/place-of.ts';
import { sceneHand } from '../../../src/bench/panels/scene-hand.ts';
import { act, worldOf } from '../../../src/bench/tools/bench-world.ts';
import {
  cancelGesture,
  followGesture,
  resting,
  type Effect,
  type Gesture,
  type GestureEvent,
} from '../../../src/bench/tools/gesture.ts';
import { layout, oven } from '../../support/client-fixtures.ts';
import { benchOnPage, openBenchOnPage, type BenchOnPage } from '../../support/bench-on-page.ts';

const drawing = drawBench(oven, layout);
const zoom = 0.8;

/** A bench without a screen: a pointer on it, and what the pointer meets. */
function headless(page: BenchOnPage, pointerType: GestureEvent['pointerType'] = 'mouse') {
  const { bench } = page;
  let gesture: Gesture = resting;
  const pans: BenchPoint[] = [];
  const scene = () => {
    const { state } = bench.getState();
    return buildScene(drawing, state.oven, sceneHand(oven, state));
  };
  const go = (step: { gesture: Gesture; effects: Effect[] }) => {
    gesture = step.gesture;
    for (const effect of step.effects) {
      if (effect.kind === 'pan') pans.push(effect.by);
      else act(bench, effect);
    }
  };
  const send = (kind: GestureEvent['kind'], at: BenchPoint, more: Partial<GestureEvent> = {}) =>
    go(
      followGesture(
        gesture,
        {
          kind,
          at,
          screen: [at[0] * zoom, at[1] * zoom],
          pointerType,
          pointerId: 1,
          button: kind === 'move' ? -1 : 0,
          ...more,
        },
        worldOf(bench, scene(), zoom),
      ),
    );
  const at = (ref: string): BenchPoint => {
    const place = placeOf(scene(), ref);
    if (!place) throw new Error(`${ref} is not in the picture`);
    return place;
  };
  return {
    bench,
    pans,
    at,
    send,
    tap: (ref: string) => {
      send('down', at(ref));
      send('up', at(ref));
    },
    drag: (from: BenchPoint, to: BenchPoint) => {
      send('down', from);
      send('move', [(from[0] + to[0]) / 2, (from[1] + to[1]) / 2]);
      send('move', to);
      send('up', to);
    },
    cancel: () => go(cancelGesture(gesture)),
  };
}

describe('a tap', () => {
  it('does nothing before it is let go', () => {
    const { bench, send, at } = headless(openBenchOnPage());
    send('down', at('C1.1'));
    expect(bench.getState().selection).toBeNull();
    send('up', at('C1.1'));
    expect(bench.getState().selection).toEqual({ kind: 'target', ref: 'C1.1' });
  });

  it('is none when it is let go elsewhere or cancelled', () => {
    const { bench, send, at, cancel } = headless(openBenchOnPage());
    send('down', at('C1.1'));
    send('up', at('T1.1'));
    expect(bench.getState().selection).toBeNull();
    send('down', at('C1.1'));
    cancel();
    send('up', at('C1.1'));
    expect(bench.getState().selection).toBeNull();
  });

  it('picks out a part by its middle, and takes what was picked out back on the mat', () => {
    const { bench, tap, send } = headless(openBenchOnPage());
    tap('M2');
    expect(bench.getState().selection).toEqual({ kind: 'part', ref: 'M2' });
    send('down', [150, 740]);
    send('up', [150, 740]);
    expect(bench.getState().selection).toBeNull();
  });

  it('takes a tool that lies on the mat', () => {
    const { bench, send } = headless(openBenchOnPage());
    send('down', rest.probe.red);
    send('up', rest.probe.red);
    expect(bench.getState().hand).toEqual({ kind: 'probe', probe: 'red' });
  });

  it('meets nothing inside while the cover is on', () => {
    const { bench, send } = headless(benchOnPage());
    const at = layout.terminals['C1.1']?.at ?? [0, 0];
    send('down', at);
    send('up', at);
    expect(bench.getState().selection).toBeNull();
  });

  it('works with a finger that strays a little', () => {
    const { bench, send, at } = headless(openBenchOnPage(), 'touch');
    const [x, y] = at('C1.1');
    send('down', [x, y]);
    send('move', [x + 8, y + 4]);
    send('up', [x + 8, y + 4]);
    expect(bench.getState().selection).toEqual({ kind: 'target', ref: 'C1.1' });
  });
});

describe('click, click: a measurement without dragging', () => {
  it('puts both probes where they were tapped', () => {
    const { bench, tap, send } = headless(openBenchOnPage());
    send('down', rest.probe.red);
    send('up', rest.probe.red);
    tap('T1.1');
    tap('T1.2');
    expect(bench.getState().state.probes).toEqual({ red: 'T1.1', black: 'T1.2' });
  });

  it('discharges the capacitor terminal by terminal', () => {
    const { bench, tap } = headless(openBenchOnPage());
    bench.getState().take({ kind: 'discharge-clip' });
    for (const target of ['CH.2', 'C1.1', 'C1.2']) tap(target);
    expect(bench.getState().state.discharge).toEqual({ clip: 'CH.2', tip: 'C1.2' });
  });

  it('labels the end of a lead that lies nearest', () => {
    const { bench, send, at } = headless(openBenchOnPage());
    bench.getState().take({ kind: 'label' });
    send('down', at('W23'));
    send('up', at('W23'));
    expect(Object.keys(bench.getState().state.labels)).toHaveLength(1);
    expect(Object.keys(bench.getState().state.labels)[0]).toMatch(/^W23\/[ab]$/);
  });
});

describe('a drag', () => {
  it('carries a probe from the mat to a terminal, and from there to another one', () => {
    const { bench, drag, at } = headless(openBenchOnPage());
    drag(rest.probe.red, at('T1.1'));
    expect(bench.getState().state.probes).toEqual({ red: 'T1.1', black: null });
    expect(bench.getState().hand).toEqual({ kind: 'empty' });
    drag(at('T1.1'), at('T1.H1'));
    expect(bench.getState().state.probes.red).toBe('T1.H1');
  });

  it('puts a probe down that is let go over nothing, or cancelled', () => {
    const { bench, drag, at, send, cancel } = headless(openBenchOnPage());
    drag(rest.probe.red, at('T1.1'));
    drag(at('T1.1'), [150, 730]);
    expect(bench.getState().state.probes.red).toBeNull();
    send('down', rest.probe.red);
    send('move', at('T1.1'));
    cancel();
    expect(bench.getState().state.probes.red).toBeNull();
    expect(bench.getState().hand).toEqual({ kind: 'empty' });
  });

  it('carries a lifted lead end to a terminal', () => {
    const { bench, drag, at } = headless(openBenchOnPage());
    bench.getState().run({ type: 'LiftLead', data: { end: 'W23/a' } });
    drag(at('W23/a'), at('T1.HV'));
    expect(bench.getState().state.oven.leadEnds['W23/a']).toBe('T1.HV');
  });

  it('moves the view where there is nothing to carry', () => {
    const { bench, drag, pans } = headless(openBenchOnPage());
    drag([150, 730], [200, 730]);
    expect(pans.length).toBeGreaterThan(0);
    expect(bench.getState().selection).toBeNull();
  });

  it('belongs to the finger that began it', () => {
    const { bench, send, at } = headless(openBenchOnPage(), 'touch');
    send('down', rest.probe.red);
    send('move', at('T1.1'));
    send('up', at('T1.2'), { pointerId: 2 });
    expect(bench.getState().state.probes.red).toBeNull();
    send('up', at('T1.1'));
    expect(bench.getState().state.probes.red).toBe('T1.1');
  });
});

it('names what is under the pointer, with an empty hand and a full one', () => {
  const { bench, send, at } = headless(openBenchOnPage());
  send('move', at('C1.2'));
  expect(bench.getState().hovered).toBe('C1.2');
  send('move', at('M2'));
  expect(bench.getState().hovered).toBe('M2');
  bench.getState().take({ kind: 'probe', probe: 'red' });
  send('move', at('M2'));
  expect(bench.getState().hovered).toBeNull();
  send('leave', [0, 0]);
  expect(bench.getState().hovered).toBeNull();
});
