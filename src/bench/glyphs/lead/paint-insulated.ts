import type { SceneLead } from '../../geometry/bench-scene.ts';
import { insulation } from '../../../styles/tokens.ts';
import { apart, type Pen } from '../paint/pen.ts';
import { paintWire, traceCurve } from './paint-curve.ts';

/** A lead's wire in the colour of its insulation; protective earth is striped (IEC 60446: green-and-yellow is for it alone, from memory). */
export const paintInsulated = (
  pen: Pen,
  lead: Pick<SceneLead, 'path' | 'insulation'>,
  width: number,
  shadow: string,
): void => {
  const tones = insulation[lead.insulation];
  if (lead.insulation !== 'green-yellow') return paintWire(pen, lead.path, width, tones, shadow);
  paintWire(pen, lead.path, width, [tones[1], tones[1], tones[2]], shadow);
  apart(pen, () => {
    pen.lineCap = 'butt';
    pen.setLineDash([5, 5]);
    traceCurve(pen, lead.path);
    pen.strokeStyle = tones[0];
    pen.lineWidth = width - 0.5;
    pen.stroke();
  });
};
