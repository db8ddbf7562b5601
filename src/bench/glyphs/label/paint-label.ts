import { labelType } from '../../geometry/label-wishes.ts';
import type { SceneLabel } from '../../geometry/bench-scene.ts';
import { palette, shade, tint } from '../../../styles/tokens.ts';
import { write } from '../paint/lettering.ts';
import type { Pen } from '../paint/pen.ts';

/** The name of a terminal or a part, with a band around it that keeps it readable on leads. */
export const paintLabel = (pen: Pen, label: SceneLabel, kind: keyof typeof labelType): void => {
  const isOnLight = label.tone === 'on-light';
  write(pen, label.text, label.at[0], label.at[1], {
    size: labelType[kind].size,
    weight: kind === 'part' ? 800 : 600,
    family: kind === 'part' ? 'sans' : 'mono',
    ink: isOnLight ? palette.ink : tint['bench-ink'],
    halo: isOnLight ? shade['label-light'] : shade['label-dark'],
  });
};
