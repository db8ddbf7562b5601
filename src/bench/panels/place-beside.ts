import type { CSSProperties } from 'react';
import type { View } from '../camera/camera.ts';
import type { BenchPoint } from '../geometry/bench-point.ts';

const gap = 22;
const edge = 8;

/**
 * Where a panel goes beside what it is about, without covering it: towards the middle of the view, and
 * no higher than the room there. `width`: px of the panel.
 */
export function placeBeside([x, y]: BenchPoint, view: View, width: number): CSSProperties {
  const isLeft = x < view.width / 2;
  const left = isLeft ? x + gap : x - gap - width;
  const clamped = Math.max(edge, Math.min(view.width - width - edge, left));
  // Pushed back over its own subject by a narrow view: go below or above it.
  const covers = clamped < x + gap && clamped + width > x - gap;
  const isHigh = y < view.height / 2;
  const start = covers ? gap : -gap;
  const room = isHigh ? view.height - y - start - edge : y - start - edge;
  return {
    width,
    left: clamped,
    maxHeight: Math.max(160, room),
    ...(isHigh ? { top: y + start } : { bottom: view.height - y + start }),
  };
}
