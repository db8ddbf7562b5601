import { isInBox, type BenchBox } from './bench-box.ts';
import type { BenchPoint } from './bench-point.ts';

/** What can be pressed or opened on the closed oven. */
export type ClosedOvenControl = 'door' | 'start' | 'stop' | 'cover';

export interface ClosedOvenShape {
  /** the front */ front: BenchBox;
  /** how far the top face rises behind the front, units */ rise: number;
  door: BenchBox;
  window: BenchBox;
  panel: BenchBox;
  display: BenchBox;
  start: BenchBox;
  stop: BenchBox;
  /** number keys, row by row */ keys: readonly BenchBox[];
}

/** The closed oven seen from the front, in the place of the open one. */
export const closedOvenShape = (chassis: BenchBox): ClosedOvenShape => {
  const [x, y] = chassis.at;
  const [width, height] = chassis.size;
  const rise = height * 0.17;
  const front: BenchBox = { at: [x + 10, y + rise + 24], size: [width - 20, height - rise - 60] };
  const [fx, fy] = front.at;
  const [fw, fh] = front.size;
  const panel: BenchBox = { at: [fx + fw * 0.735, fy + 12], size: [fw * 0.253, fh - 24] };
  const door: BenchBox = { at: [fx + 10, fy + 12], size: [fw * 0.72, fh - 24] };
  const [px, py] = panel.at;
  const [pw, ph] = panel.size;
  const key: BenchPoint = [(pw - 56) / 3, ph * 0.085];
  const keys = Array.from({ length: 12 }, (_, i): BenchBox => ({
    at: [px + 18 + (i % 3) * (key[0] + 10), py + ph * 0.3 + Math.floor(i / 3) * (key[1] + 10)],
    size: key,
  }));
  const wide: BenchPoint = [(pw - 46) / 2, ph * 0.12];
  return {
    front,
    rise,
    door,
    window: {
      at: [door.at[0] + 46, door.at[1] + 48],
      size: [door.size[0] - 138, door.size[1] - 96],
    },
    panel,
    display: { at: [px + 18, py + 24], size: [pw - 36, ph * 0.14] },
    stop: { at: [px + 18, py + ph * 0.78], size: wide },
    start: { at: [px + 28 + wide[0], py + ph * 0.78], size: wide },
    keys,
  };
};

/** What lies under a point of the closed oven; its top face stands for the cover. Null: nothing to use. */
export const hitClosedOven = (chassis: BenchBox, at: BenchPoint): ClosedOvenControl | null => {
  const shape = closedOvenShape(chassis);
  if (isInBox(at, shape.start)) return 'start';
  if (isInBox(at, shape.stop)) return 'stop';
  if (isInBox(at, shape.door)) return 'door';
  const [x, y] = shape.front.at;
  const top: BenchBox = { at: [x, y - shape.rise], size: [shape.front.size[0], shape.rise] };
  return isInBox(at, top) ? 'cover' : null;
};
