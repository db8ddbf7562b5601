import type { ScenePart } from '../geometry/bench-scene.ts';
import type { Pen } from './paint/pen.ts';

/** What a glyph needs of its part; lengths in units, places from the part's upper left corner. */
export type GlyphPart = Pick<
  ScenePart,
  | 'ref'
  | 'variant'
  | 'size'
  | 'stamp'
  | 'looks'
  | 'terminals'
  | 'isActuated'
  | 'isLit'
  | 'isTurning'
  | 'isReplaced'
  | 'isPressed'
>;

/** Draws one kind of part. */
export type Glyph = (pen: Pen, part: GlyphPart) => void;
