import type { View } from '../camera/camera.ts';
import type { BenchPoint } from '../geometry/bench-point.ts';

/** Puts the name of what is hovered beside the pointer, on the side where there is room. `at` null: away. */
export function placeHover(label: HTMLElement, at: BenchPoint | null, view: View): void {
  label.dataset['off'] = String(at === null);
  if (at === null) return;
  const isRight = at[0] + label.offsetWidth + 28 > view.width;
  const isLow = at[1] > view.height - label.offsetHeight - 40;
  const x = at[0] + (isRight ? -label.offsetWidth - 18 : 18);
  const y = at[1] + (isLow ? -label.offsetHeight - 14 : 20);
  label.style.transform = `translate(${x}px, ${y}px)`;
}
