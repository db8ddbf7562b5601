import { material, shade } from '../../../styles/tokens.ts';
import { chain, circle, disc, fill, stroke } from '../paint/outline.ts';
import { radial, raised, type Pen } from '../paint/pen.ts';

/** A brass wheel of the gear. `teeth`: how many. */
export const paintWheel = (
  pen: Pen,
  [x, y, radius]: readonly [number, number, number],
  teeth: number,
): void => {
  const trace = (): void => {
    chain(
      pen,
      Array.from({ length: teeth * 4 }, (_, i): [number, number] => {
        const angle = (i / (teeth * 4)) * 2 * Math.PI;
        const reach = i % 4 < 2 ? radius : radius - 3;
        return [x + Math.cos(angle) * reach, y + Math.sin(angle) * reach];
      }),
    );
    pen.closePath();
  };
  raised(pen, 3, shade.drop, () => {
    trace();
    fill(pen, material.brass[2]);
  });
  trace();
  fill(pen, radial(pen, [x, y, radius], material.brass.slice(0, 3)));
  stroke(pen, material.brass[3], 0.7);
  for (let i = 0; i < 4; i++) {
    const angle = 0.4 + (i * Math.PI) / 2;
    disc(
      pen,
      [x + Math.cos(angle) * radius * 0.52, y + Math.sin(angle) * radius * 0.52, radius * 0.2],
      material.lamination[1],
      material.brass[3],
      0.6,
    );
  }
  circle(pen, x, y, radius * 0.2);
  fill(pen, material.tin[1]);
  stroke(pen, material.tin[3], 0.8);
};
