import type { BenchPoint } from '../../geometry/bench-point.ts';
import { insulation, material, palette, shade } from '../../../styles/tokens.ts';
import { apart, linear, type Pen } from '../paint/pen.ts';
import { box, disc, rule } from '../paint/outline.ts';

export interface Connector {
  /** the mouth: exactly on the terminal, or where the lifted end lies */ at: BenchPoint;
  /** radians, from the mouth back along the lead */ angle: number;
  isHighVoltage: boolean;
  isLifted: boolean;
}

/** A push-on receptacle in its sleeve. Seated it shows the sleeve behind the terminal; lifted it shows its brass mouth. */
export const paintConnector = (pen: Pen, { at, angle, isHighVoltage, isLifted }: Connector): void =>
  apart(pen, () => {
    pen.translate(at[0], at[1]);
    pen.rotate(angle);
    const half = isHighVoltage ? 5 : 4.2;
    const [from, to] = isLifted ? [7, 24] : [4, 17];
    const sleeve = isHighVoltage
      ? insulation.red
      : [material.nylon[0], material.nylon[1], material.nylon[3]];
    box(pen, [from + 1, -half + 2.4, to - from + 1, half * 2], 2.4, shade.soft);
    if (isLifted) {
      box(
        pen,
        [-3, -4, 12, 8],
        1.6,
        linear(pen, [0, -4, 0, 4], material.brass),
        material.brass[3],
        0.8,
      );
      rule(pen, [-2.4, 0, 5, 0], material.brass[3], 1.4);
    }
    box(
      pen,
      [from, -half, to - from, half * 2],
      2.2,
      linear(pen, [0, -half, 0, half], [sleeve[0]!, sleeve[1]!, sleeve[1]!, sleeve[2]!]),
      sleeve[2]!,
      0.8,
    );
    rule(pen, [to - 4, -half + 0.8, to - 4, half - 0.8], sleeve[2]!, 0.8);
    rule(pen, [to - 6.4, -half + 0.8, to - 6.4, half - 0.8], sleeve[2]!, 0.6);
    if (isLifted) disc(pen, [0, 0, 1.7], palette['mat-deep']);
  });
