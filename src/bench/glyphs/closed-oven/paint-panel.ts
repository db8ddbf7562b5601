import type { BenchBox } from '../../geometry/bench-box.ts';
import type { ClosedOvenShape } from '../../geometry/closed-oven.ts';
import { material, palette, shade } from '../../../styles/tokens.ts';
import { write } from '../paint/lettering.ts';
import { box, rule, type Rect } from '../paint/outline.ts';
import { apart, linear, raised, type Pen } from '../paint/pen.ts';

const keyNames = ['1', '2', '3', '4', '5', '6', '7', '8', '9', 'Clock', '0', 'Power'] as const;

/** The control panel: display, number keys, Stop and Start. */
export const paintPanel = (
  pen: Pen,
  shape: ClosedOvenShape,
  isLit: boolean,
  text: string | null,
): void => {
  const [x, y, width, height]: Rect = [...shape.panel.at, ...shape.panel.size];
  box(
    pen,
    [x, y, width, height],
    10,
    linear(
      pen,
      [x, y, x + width, y + height],
      [material.plastic[1], material.plastic[2], material.plastic[3]],
    ),
    material.plastic[3],
    1,
  );
  rule(pen, [x + 10, y + 1.5, x + width - 10, y + 1.5], shade.sheen, 1.4);
  paintDisplay(pen, shape.display, isLit, text ?? '--:--');
  shape.keys.forEach((key, i) => paintKey(pen, key, keyNames[i] ?? '', 15));
  paintKey(pen, shape.stop, 'Stop', 17);
  paintKey(pen, shape.start, 'Start', 17);
};

const paintDisplay = (pen: Pen, { at, size }: BenchBox, isLit: boolean, text: string): void => {
  box(pen, [...at, ...size], 5, palette.ink, material.plastic[0], 1);
  apart(pen, () => {
    if (isLit) {
      pen.shadowColor = material.segment[1];
      pen.shadowBlur = 14;
    }
    write(pen, text, at[0] + size[0] / 2, at[1] + size[1] / 2, {
      size: size[1] * 0.56,
      weight: 800,
      ink: isLit ? material.segment[0] : material.segment[3],
    });
  });
};

/** One key with its word. */
export const paintKey = (
  pen: Pen,
  { at, size }: BenchBox,
  text: string,
  lettering: number,
): void => {
  raised(pen, 2, shade.drop, () => box(pen, [...at, ...size], 7, material.plastic[1]));
  box(
    pen,
    [...at, ...size],
    7,
    linear(pen, [0, at[1], 0, at[1] + size[1]], [material.plastic[0], material.plastic[1]]),
    material.plastic[3],
    1,
  );
  write(pen, text, at[0] + size[0] / 2, at[1] + size[1] / 2, {
    size: text.length > 2 && lettering < 16 ? 12 : lettering,
    family: 'sans',
    ink: material.nylon[1],
  });
};
