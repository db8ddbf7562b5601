import type { BenchPoint } from '../geometry/bench-point.ts';
import type { BenchScene } from '../geometry/bench-scene.ts';

/** Where on the bench a target, part or lead is; null: nowhere in the picture. */
export function placeOf(scene: BenchScene, ref: string): BenchPoint | null {
  const terminal = scene.terminals.find(({ target }) => target === ref);
  if (terminal) return terminal.at;
  const part = scene.parts.find((one) => one.ref === ref);
  if (part) return [part.at[0] + part.size[0] / 2, part.at[1] + part.size[1] / 2];
  const path = scene.leads.find((one) => one.ref === ref)?.path;
  return path?.[Math.floor(path.length / 2)] ?? null;
}
