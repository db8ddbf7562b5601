import type { BenchPoint } from '../../geometry/bench-point.ts';
import { material, shade } from '../../../styles/tokens.ts';
import { box, chain, disc, fill, rule, stroke } from '../paint/outline.ts';
import { apart, cast, linear, type Pen } from '../paint/pen.ts';

/** A crocodile clip biting on a point; `angle`: radians, from its jaws back along its lead. */
export const paintClip = (
  pen: Pen,
  at: BenchPoint,
  angle: number,
  tones: readonly string[],
): void =>
  apart(pen, () => {
    pen.translate(at[0], at[1]);
    pen.rotate(angle);
    const jaws = (): void => {
      chain(pen, [
        [-3, -1.6],
        [4, -3.4],
        [16, -5],
        [16, 5],
        [4, 3.4],
        [-3, 1.6],
      ]);
      pen.closePath();
    };
    cast(pen, 2.4, () => {
      jaws();
      fill(pen, shade.soft);
    });
    jaws();
    fill(pen, linear(pen, [0, -5, 0, 5], material.tin));
    stroke(pen, material.tin[3], 0.7);
    for (let i = 0; i < 5; i++) rule(pen, [i * 2.2, -1.4, i * 2.2, 1.4], material.tin[3], 0.8);
    cast(pen, 2.4, () => box(pen, [13, -6, 26, 12], 5, shade.soft));
    box(
      pen,
      [13, -6, 26, 12],
      5,
      linear(pen, [0, -6, 0, 6], [tones[0]!, tones[1]!, tones[1]!, tones[2]!]),
      tones[2]!,
      0.8,
    );
    for (let i = 0; i < 4; i++) rule(pen, [19 + i * 4.4, -5, 19 + i * 4.4, 5], tones[2]!, 1);
    disc(pen, [15, 0, 1.6], material.tin[3]);
  });
