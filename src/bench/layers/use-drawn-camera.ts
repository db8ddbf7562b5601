import type Konva from 'konva/lib/Core.js';
import { useEffect, useLayoutEffect, useRef, useState, type RefObject } from 'react';
import type { Camera } from '../camera/camera.ts';

/** ms without a camera move after which the layers are drawn sharp again. */
const rest = 90;
/** ms of one long gesture after which they are drawn anyway: the picture's edge has come into view. */
const longest = 300;

const isSameCamera = (a: Camera, b: Camera): boolean =>
  a.zoom === b.zoom && a.x === b.x && a.y === b.y;

/**
 * The camera the layers are drawn with. While the bench is panned or zoomed the finished picture is
 * moved and scaled as a whole; it is drawn anew when the camera rests. So a gesture costs the same
 * however much lies on the bench. A change of the view's size draws at once.
 */
export const useDrawnCamera = (
  stage: RefObject<Konva.Stage | null>,
  camera: Camera,
  width: number,
  height: number,
): Camera => {
  const [drawn, draw] = useState({ camera, width, height });
  const isResized = drawn.width !== width || drawn.height !== height;
  const shown = isResized ? camera : drawn.camera;
  if (isResized) draw({ camera, width, height });
  const drawnAt = useRef(0);
  useLayoutEffect(() => {
    const content = stage.current?.content;
    if (content === undefined) return;
    const scale = camera.zoom / shown.zoom;
    const [x, y] = [camera.x - shown.x * scale, camera.y - shown.y * scale];
    const transform = isSameCamera(camera, shown)
      ? ''
      : `translate(${x}px, ${y}px) scale(${scale})`;
    // Drawn now and not in the next frame, or the old picture would show for one frame without its transform.
    if (transform === '' && content.style.transform !== '') stage.current?.draw();
    content.style.transformOrigin = '0 0';
    content.style.transform = transform;
  }, [stage, camera, shown]);
  useEffect(() => {
    drawnAt.current = performance.now();
  }, [shown]);
  useEffect(() => {
    if (isSameCamera(camera, shown)) return;
    const left = longest - (performance.now() - drawnAt.current);
    const timer = setTimeout(
      () => draw({ camera, width, height }),
      Math.max(0, Math.min(rest, left)),
    );
    return () => clearTimeout(timer);
  }, [camera, shown, width, height]);
  return shown;
};
