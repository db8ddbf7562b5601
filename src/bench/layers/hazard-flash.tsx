import type Konva from 'konva/lib/Core.js';
import { useEffect, useRef } from 'react';
import { Shape } from 'react-konva/lib/ReactKonvaCore.js';
import type { BenchPoint } from '../geometry/bench-point.ts';
import { paintFlash } from '../glyphs/terminal/paint-flash.ts';

const flashMs = 700;

/** Marks a terminal in danger red: one flash that settles into a ring; with less motion only the ring. */
export function HazardFlash({ at, reducesMotion }: { at: BenchPoint; reducesMotion: boolean }) {
  const node = useRef<Konva.Shape>(null);
  const share = useRef(1);
  const [x, y] = at;
  useEffect(() => {
    const show = (next: number): void => {
      share.current = next;
      node.current?.getLayer()?.batchDraw();
    };
    if (reducesMotion) return show(1);
    let began: number | null = null;
    let frame = requestAnimationFrame(function step(now) {
      began ??= now;
      show(Math.min(1, (now - began) / flashMs));
      if (share.current < 1) frame = requestAnimationFrame(step);
    });
    return () => cancelAnimationFrame(frame);
  }, [x, y, reducesMotion]);
  return (
    <Shape
      ref={node}
      listening={false}
      perfectDrawEnabled={false}
      sceneFunc={({ _context: pen }) => paintFlash(pen, [x, y], share.current)}
    />
  );
}
