import { useContext, useRef, type PointerEvent } from 'react';
import { useBenchApi } from '../../simulation/bench-context.ts';
import type { Hand } from '../tools/tool.ts';
import { MatContext } from './mat-context.ts';

/** px */
const slop = 8;

export interface ToolDrag {
  onPointerDown: (event: PointerEvent) => void;
  onClickCapture: (event: { preventDefault: () => void; stopPropagation: () => void }) => void;
}

/** Lets a tool be dragged from its card onto the bench; a plain press stays a press. */
export function useToolDrag(hand: Hand): ToolDrag {
  const bench = useBenchApi();
  const mat = useContext(MatContext);
  const wasDragged = useRef(false);
  return {
    onPointerDown: (down) => {
      wasDragged.current = false;
      if (down.button !== 0) return;
      const isThis = (event: globalThis.PointerEvent): boolean =>
        event.pointerId === down.pointerId;
      const move = (event: globalThis.PointerEvent): void => {
        if (!isThis(event)) return;
        const away = Math.hypot(event.clientX - down.clientX, event.clientY - down.clientY);
        if (!wasDragged.current && away > slop) {
          wasDragged.current = true;
          bench.getState().take(hand);
        }
        if (wasDragged.current) mat.hover(event.clientX, event.clientY);
      };
      const end = (event: globalThis.PointerEvent): void => {
        if (!isThis(event)) return;
        window.removeEventListener('pointermove', move);
        window.removeEventListener('pointerup', end);
        window.removeEventListener('pointercancel', end);
        if (!wasDragged.current) return;
        if (event.type === 'pointerup') mat.drop(event.clientX, event.clientY);
        else bench.getState().putDown();
      };
      window.addEventListener('pointermove', move);
      window.addEventListener('pointerup', end);
      window.addEventListener('pointercancel', end);
    },
    onClickCapture: (event) => {
      if (!wasDragged.current) return;
      // The click that ends a drag is no press.
      wasDragged.current = false;
      event.preventDefault();
      event.stopPropagation();
    },
  };
}
