import type { SceneLabel } from '../../geometry/bench-scene.ts';
import { palette, shade } from '../../../styles/tokens.ts';
import { disc, fill, stroke } from '../paint/outline.ts';
import { write } from '../paint/lettering.ts';
import { raised, type Pen } from '../paint/pen.ts';

/** The yellow tag tied to a lead: an eyelet, a text. */
export const paintTag = (pen: Pen, tag: SceneLabel): void => {
  const [x, y] = tag.box.at;
  const [width, height] = tag.box.size;
  const cut = 5;
  const trace = (): void => {
    pen.beginPath();
    pen.moveTo(x + cut, y);
    pen.lineTo(x + width, y);
    pen.lineTo(x + width, y + height);
    pen.lineTo(x + cut, y + height);
    pen.lineTo(x, y + height - cut);
    pen.lineTo(x, y + cut);
    pen.closePath();
  };
  raised(pen, 2, shade.drop, () => {
    trace();
    fill(pen, palette.tag);
  });
  trace();
  stroke(pen, palette.eyelet, 0.9);
  disc(pen, [x + 6.5, y + height / 2, 2], palette['mat-deep'], palette.eyelet, 1.5);
  write(pen, tag.text, x + 11 + (width - 14) / 2, y + height / 2, {
    size: 10.5,
    ink: palette.ink,
    weight: 800,
  });
};
