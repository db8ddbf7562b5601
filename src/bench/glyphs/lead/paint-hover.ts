import type { SceneLead, ScenePart } from '../../geometry/bench-scene.ts';
import { palette, shade } from '../../../styles/tokens.ts';
import { roundRect, stroke } from '../paint/outline.ts';
import { apart, type Pen } from '../paint/pen.ts';
import { traceCurve } from './paint-curve.ts';
import { paintInsulated } from './paint-insulated.ts';
import { leadWidth } from './paint-lead.ts';

/** Marks the lead or part under the hand or with the keyboard's focus: blue on white. */
export const paintHover = (
  pen: Pen,
  lead: SceneLead | null,
  part: ScenePart | null,
  isFocused: boolean,
): void => {
  const more = isFocused ? 1.4 : 0;
  if (lead !== null) {
    const width = leadWidth(lead);
    pen.lineCap = 'round';
    traceCurve(pen, lead.path);
    stroke(pen, palette.sheet, width + 7 + more);
    traceCurve(pen, lead.path);
    stroke(pen, palette.act, width + 4 + more);
    paintInsulated(pen, lead, width, shade.clear);
  }
  if (part !== null)
    apart(pen, () => {
      const [width, height] = part.size;
      pen.translate(part.at[0] + width / 2, part.at[1] + height / 2);
      pen.rotate((part.angle * Math.PI) / 180);
      const rect = [-width / 2 - 4, -height / 2 - 4, width + 8, height + 8] as const;
      roundRect(pen, rect, 8);
      stroke(pen, palette.sheet, 4.4 + more);
      roundRect(pen, rect, 8);
      stroke(pen, palette.act, 2.2 + more);
    });
};
