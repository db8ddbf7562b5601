import { labelType } from '../../geometry/label-wishes.ts';
import type { SceneLabel } from '../../geometry/bench-scene.ts';
import { palette, shade, tint } from '../../../styles/tokens.ts';
import { write, type Lettering } from '../paint/lettering.ts';
import type { Pen } from '../paint/pen.ts';

const inkOn = (tone: SceneLabel['tone']): Pick<Lettering, 'ink' | 'halo'> =>
  tone === 'on-light'
    ? { ink: palette.ink, halo: shade['label-light'] }
    : { ink: tint['bench-ink'], halo: shade['label-dark'] };

/** The name of a terminal or a part, with a band around it that keeps it readable on leads. */
export const paintLabel = (pen: Pen, label: SceneLabel, kind: keyof typeof labelType): void =>
  write(pen, label.text, label.at[0], label.at[1], {
    size: labelType[kind].size,
    weight: 600,
    family: kind === 'part' ? 'sans' : 'mono',
    ...inkOn(label.tone),
  });

/** A part's reference alone, for a view from far. `size`: units. */
export const paintReference = (
  pen: Pen,
  reference: string,
  { at, tone }: Pick<SceneLabel, 'at' | 'tone'>,
  size: number,
): void =>
  write(pen, reference, at[0], at[1], { size, weight: 600, family: 'mono', ...inkOn(tone) });
