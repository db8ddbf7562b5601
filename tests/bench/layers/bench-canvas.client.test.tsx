import { act, fireEvent, render } from '@testing-library/react';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { fitCamera, toScreen, type Camera } from '../../../src/bench/camera/camera.ts';
import { benchSize } from '../../../src/bench/geometry/bench-furniture.ts';
import { along, type BenchPoint } from '../../../src/bench/geometry/bench-point.ts';
import type { BenchScene } from '../../../src/bench/geometry/bench-scene.ts';
import { hitTest } from '../../../src/bench/geometry/hit-test.ts';
import { probeAngle } from '../../../src/bench/geometry/probe-pose.ts';
import { BenchCanvas } from '../../../src/bench/layers/bench-canvas.tsx';
import type { BenchPointerEvent } from '../../../src/bench/layers/use-stage-events.ts';
import { fitted, layout, sceneOf, withLeads } from '../../support/larkfield.ts';

const view = { width: 1000, height: 760 };
const camera = fitCamera(view, benchSize);

const mount = async (scene: BenchScene) => {
  const handlers = { onPointer: vi.fn(), onWheel: vi.fn(), onPinch: vi.fn() };
  const draw = (next: BenchScene, seenBy = camera) => (
    <BenchCanvas scene={next} camera={seenBy} {...view} {...handlers} />
  );
  const page = render(draw(scene));
  await frames();
  const content = page.container.querySelector('.konvajs-content')!;
  return {
    ...handlers,
    page,
    content,
    look: (seenBy: Camera) => page.rerender(draw(scene, seenBy)),
    show: async (next: BenchScene) => {
      page.rerender(draw(next));
      await frames();
    },
    pixel: (layer: number, at: BenchPoint): Uint8ClampedArray => {
      const canvas = content.querySelectorAll('canvas')[layer]!;
      const [x, y] = toScreen(camera, at);
      return canvas.getContext('2d')!.getImageData(Math.round(x), Math.round(y), 1, 1).data;
    },
  };
};

/** Long enough for a batched draw and for a lead's swing. */
const frames = (): Promise<void> =>
  act(async () => {
    await new Promise((done) => setTimeout(done, 260));
  });

const pointer = (kind: string, at: BenchPoint, more: PointerEventInit = {}): Event => {
  const [clientX, clientY] = toScreen(camera, at);
  return new PointerEvent(kind, { clientX, clientY, pointerId: 1, bubbles: true, ...more });
};

const placeOf = (target: string): BenchPoint => layout.terminals[target]!.at;
const red = 0;
const alpha = 3;
const layers = { parts: 0, leads: 1, terminals: 2, live: 3 } as const;

afterEach(() => vi.restoreAllMocks());

describe('pointing at the bench', () => {
  it('reports where the pointer is in bench units, and our geometry finds what is there', async () => {
    const scene = sceneOf();
    const bench = await mount(scene);
    for (const target of ['C1.1', 'T1.core', 'S3.NC', 'P1.E']) {
      fireEvent(bench.content, pointer('pointerdown', placeOf(target)));
      const event = bench.onPointer.mock.lastCall![0] as BenchPointerEvent;
      expect(event).toMatchObject({ kind: 'down', pointerType: 'mouse', pointerId: 1 });
      expect(hitTest(scene, event.at, camera.zoom)).toEqual({ kind: 'target', target });
    }
    fireEvent(bench.content, pointer('pointermove', placeOf('C1.2')));
    fireEvent(bench.content, pointer('pointerup', placeOf('C1.2')));
    const kinds = bench.onPointer.mock.calls.map(([event]) => (event as BenchPointerEvent).kind);
    expect(kinds).toEqual(['down', 'down', 'down', 'down', 'move', 'up']);
  });

  it('cancels a touch when a second finger lands, and then reports the pinch', async () => {
    const bench = await mount(sceneOf());
    const touch = (kind: string, id: number, at: BenchPoint): boolean =>
      fireEvent(bench.content, pointer(kind, at, { pointerId: id, pointerType: 'touch' }));
    touch('pointerdown', 1, [300, 300]);
    touch('pointerdown', 2, [400, 300]);
    touch('pointermove', 2, [500, 300]);
    const kinds = bench.onPointer.mock.calls.map(([event]) => (event as BenchPointerEvent).kind);
    expect(kinds).toEqual(['down', 'cancel']);
    expect(bench.onPinch).toHaveBeenCalledExactlyOnceWith({
      before: [
        [300, 300],
        [400, 300],
      ],
      after: [
        [300, 300],
        [500, 300],
      ],
    });
  });

  it('reports the wheel and keeps the page from scrolling', async () => {
    const bench = await mount(sceneOf());
    const wheel = new WheelEvent('wheel', {
      clientX: 40,
      clientY: 50,
      deltaY: -100,
      ctrlKey: true,
      cancelable: true,
      bubbles: true,
    });
    fireEvent(bench.content, wheel);
    expect(bench.onWheel).toHaveBeenCalledExactlyOnceWith({
      screen: [40, 50],
      deltaX: 0,
      deltaY: -100,
      isPinch: true,
    });
    expect(wheel.defaultPrevented).toBe(true);
  });
});

describe('what is drawn', () => {
  it('draws the tip of a probe exactly on its terminal', async () => {
    const scene = sceneOf(fitted, { probes: { red: 'T1.HV', black: null } });
    const bench = await mount(scene);
    const tip = placeOf('T1.HV');
    const targets = scene.terminals.filter(({ isReachable }) => isReachable).map(({ at }) => at);
    const angle = probeAngle('red', tip, null, targets, benchSize);
    expect(bench.pixel(layers.live, tip)[alpha]).toBeGreaterThan(60);
    expect(bench.pixel(layers.live, along(tip, angle, 12))[alpha]).toBe(255);
    expect(bench.pixel(layers.live, along(tip, angle + Math.PI, 3))[alpha]).toBe(0);
    const handle = bench.pixel(layers.live, along(tip, angle, 105));
    expect(handle[red]).toBeGreaterThan(150);
  });

  it('draws every terminal at its place: a light face in a dark ring', async () => {
    const bench = await mount(sceneOf());
    for (const target of Object.keys(layout.terminals).filter((name) => !name.endsWith('.core'))) {
      const face = bench.pixel(layers.terminals, placeOf(target));
      expect([...face], target).toEqual([255, 253, 246, 255]);
      const [x, y] = placeOf(target);
      expect(bench.pixel(layers.terminals, [x + 5, y])[red], target).toBeLessThan(90);
    }
  });

  it('draws a lead to its terminal, and away from it once it is lifted', async () => {
    const bench = await mount(sceneOf());
    const end = [...layout.leads['W11']!.via].at(-1)!;
    expect(bench.pixel(layers.leads, end)[alpha]).toBe(255);
    const lifted = sceneOf(withLeads({ 'W23/a': null }));
    const loose = lifted.terminals.find(({ target }) => target === 'W23/a')!.at;
    expect(bench.pixel(layers.leads, loose)[alpha]).toBe(0);
    await bench.show(lifted);
    // The swing takes 180 ms of frames, and frames are slow where every pixel is drawn in software.
    await vi.waitFor(() => expect(bench.pixel(layers.leads, loose)[alpha]).toBe(255), 4000);
  });

  it('shows the closed oven while the cover is on: no part, no lead, no terminal inside', async () => {
    const bench = await mount(sceneOf(fitted, { isCoverOn: true }));
    // Mat, closed oven, cord, terminals, live: the door lies where the turntable motor was.
    expect(bench.content.querySelectorAll('canvas')).toHaveLength(5);
    expect(bench.pixel(1, [317, 500])[alpha]).toBe(255);
    expect(bench.pixel(2, layout.leads['W11']!.via[1]!)[alpha]).toBe(0);
    expect(bench.pixel(3, placeOf('C1.1'))[alpha]).toBe(0);
    expect(bench.pixel(3, placeOf('P1.L'))[alpha]).toBe(255);
  });

  it('is a picture only: hidden from assistive technology', async () => {
    const bench = await mount(sceneOf());
    expect(bench.content.closest('[aria-hidden="true"]')).not.toBeNull();
  });
});

describe('the camera', () => {
  it('moves the finished picture during a gesture and draws it anew at rest', async () => {
    const bench = await mount(sceneOf());
    const style = (): string => (bench.content as HTMLElement).style.transform;
    expect(style()).toBe('');
    bench.look({ zoom: camera.zoom * 2, x: -30, y: 12 });
    // The first picture lies at x 0, y 0: twice its size, then shifted.
    expect(style()).toBe('translate(-30px, 12px) scale(2)');
    const [x, y] = placeOf('F1.1');
    const face = (): number[] => {
      const context = bench.content.querySelectorAll('canvas')[layers.terminals]!.getContext('2d')!;
      return [...context.getImageData(Math.round(x * 2 - 30), Math.round(y * 2 + 12), 1, 1).data];
    };
    expect(face()).not.toEqual([255, 253, 246, 255]);
    await vi.waitFor(() => expect(style()).toBe(''), 4000);
    expect(face()).toEqual([255, 253, 246, 255]);
  });
});

describe('the screen', () => {
  it('caps the pixel ratio at 2 and applies it again when it changes', async () => {
    const queries: EventTarget[] = [];
    vi.spyOn(window, 'matchMedia').mockImplementation((media) => {
      const list = Object.assign(new EventTarget(), {
        matches: false,
        media,
        onchange: null,
        addListener: vi.fn(),
        removeListener: vi.fn(),
      });
      if (media.includes('resolution')) queries.push(list);
      return list;
    });
    const ratio = vi.spyOn(window, 'devicePixelRatio', 'get').mockReturnValue(3);
    const bench = await mount(sceneOf());
    const widths = (): number[] =>
      [...bench.content.querySelectorAll('canvas')].map(({ width }) => width);
    expect(widths()).toEqual([2000, 2000, 2000, 2000]);
    ratio.mockReturnValue(1.5);
    act(() => {
      queries.at(-1)!.dispatchEvent(new Event('change'));
    });
    expect(widths()).toEqual([1500, 1500, 1500, 1500]);
  });

  it('lets a lead fall into place at once for people who want less motion', async () => {
    vi.spyOn(window, 'matchMedia').mockImplementation((media) =>
      Object.assign(new EventTarget(), {
        matches: media.includes('reduced-motion'),
        media,
        onchange: null,
        addListener: vi.fn(),
        removeListener: vi.fn(),
      }),
    );
    const bench = await mount(sceneOf());
    const asked = vi.spyOn(window, 'requestAnimationFrame');
    const before = asked.mock.calls.length;
    await bench.show(sceneOf(withLeads({ 'W23/a': null })));
    // One batched draw per layer that changed, no frames of a swing: 180 ms would be ten or more.
    expect(asked.mock.calls.length - before).toBeLessThan(6);
  });
});
