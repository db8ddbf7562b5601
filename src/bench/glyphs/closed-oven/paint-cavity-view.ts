import { material, shade } from '../../../styles/tokens.ts';
import { box, chain, fill, roundRect, stroke, type Rect } from '../paint/outline.ts';
import { apart, linear, radial, type Pen } from '../paint/pen.ts';

export interface CavityView {
  isLit: boolean;
  isTurning: boolean;
  /** 0 to 1: how well it is seen unlit, through the door's screen or through nothing */
  clarity: number;
}

/** The inside of the cavity seen from the front: five walls, the feed cover, lamp light, the turntable. */
export const paintCavityView = (
  pen: Pen,
  rect: Rect,
  { isLit, isTurning, clarity }: CavityView,
): void =>
  apart(pen, () => {
    const [x, y, width, height] = rect;
    roundRect(pen, rect, 12);
    pen.clip();
    pen.fillStyle = material.plastic[3];
    pen.fillRect(x, y, width, height);
    pen.globalAlpha = isLit ? 1 : 0.5 * clarity * clarity;
    const back: Rect = [x + width * 0.14, y + height * 0.12, width * 0.72, height * 0.62];
    paintWalls(pen, rect, back);
    box(
      pen,
      [back[0] + back[2] + 12, back[1] + back[3] * 0.3, width * 0.06, back[3] * 0.4],
      2,
      material.paper[1],
      material.paper[3],
      1,
    );
    if (isLit) {
      pen.fillStyle = radial(
        pen,
        [x + width * 0.72, y + height * 0.2, width * 0.75],
        [
          [0, material.glow[1]],
          [0.4, shade.sheen],
          [1, shade.clear],
        ],
      );
      pen.fillRect(x, y, width, height);
    }
    paintTray(pen, x + width / 2, y + height * 0.83, width * 0.33, isTurning);
  });

/** Ceiling, left, right, back and floor. */
const paintWalls = (pen: Pen, [x, y, width, height]: Rect, [bx, by, bw, bh]: Rect): void => {
  const near = [
    [x, y],
    [x + width, y],
    [x + width, y + height],
    [x, y + height],
  ] as const;
  const far = [
    [bx, by],
    [bx + bw, by],
    [bx + bw, by + bh],
    [bx, by + bh],
  ] as const;
  const wall = (points: readonly (readonly [number, number])[], tone: string): void => {
    chain(pen, points);
    pen.closePath();
    fill(pen, tone);
    stroke(pen, material.enamel[3], 1);
  };
  wall([near[0], far[0], far[1], near[1]], material.enamel[2]);
  wall([near[0], far[0], far[3], near[3]], material.enamel[1]);
  wall([near[1], far[1], far[2], near[2]], material.enamel[2]);
  wall(far, material.enamel[1]);
  wall([near[3], far[3], far[2], near[2]], material.enamel[0]);
};

const paintTray = (pen: Pen, x: number, y: number, radius: number, isTurning: boolean): void => {
  pen.beginPath();
  pen.ellipse(x, y + 7, radius, radius * 0.22, 0, 0, Math.PI * 2);
  fill(pen, shade.soft);
  pen.beginPath();
  pen.ellipse(x, y, radius, radius * 0.22, 0, 0, Math.PI * 2);
  fill(
    pen,
    linear(
      pen,
      [x - radius, 0, x + radius, 0],
      [material.glass[2], material.glass[0], material.glass[1]],
    ),
  );
  stroke(pen, material.glass[3], 1.4);
  pen.beginPath();
  pen.ellipse(x, y - 2, radius * 0.86, radius * 0.17, 0, 0, Math.PI * 2);
  stroke(pen, shade.gleam, 2);
  if (isTurning) {
    pen.beginPath();
    pen.ellipse(x, y, radius * 0.6, radius * 0.12, 0, 0.3, 2.4);
    stroke(pen, material.plastic[1], 3);
    const tip = [x + Math.cos(2.4) * radius * 0.6, y + Math.sin(2.4) * radius * 0.12] as const;
    chain(pen, [[tip[0] + 12, tip[1] - 4], tip, [tip[0] + 14, tip[1] + 10]]);
    stroke(pen, material.plastic[1], 3);
  }
};
