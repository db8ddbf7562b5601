import type Konva from 'konva/lib/Core.js';
import { useEffect, type RefObject } from 'react';

/** More than 2 device px per CSS px cannot be seen at a bench's distance and costs the square in memory. */
const most = 2;

/**
 * Gives every layer the screen's pixel ratio, at most 2, now and whenever it changes: a window dragged
 * to another screen, a page zoomed. A resolution query fires once for one ratio, so it is armed again.
 */
export const usePixelRatio = (stage: RefObject<Konva.Stage | null>): void => {
  useEffect(() => {
    let list: MediaQueryList | null = null;
    const apply = (): void => {
      const ratio = window.devicePixelRatio;
      for (const layer of stage.current?.getLayers() ?? []) {
        layer.getCanvas().setPixelRatio(Math.min(most, ratio));
        layer.batchDraw();
      }
      list?.removeEventListener('change', apply);
      list = window.matchMedia(`(resolution: ${ratio}dppx)`);
      list.addEventListener('change', apply);
    };
    apply();
    return () => list?.removeEventListener('change', apply);
  }, [stage]);
};
