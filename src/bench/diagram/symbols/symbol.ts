import type { BenchBox } from '../../geometry/bench-box.ts';
import type { BenchPoint } from '../../geometry/bench-point.ts';

/** How a contact stands now, by its name: true is closed. */
export type Contacts = Readonly<Record<string, boolean>>;

/** One line of a symbol, an SVG path in units of the diagram. */
export interface Stroke {
  d: string;
  /** fine is of less weight, heavy is a bar or a blade, dashed a mechanical link or an outline, filled a solid */
  kind?: 'fine' | 'heavy' | 'dashed' | 'filled';
}

/**
 * How a part of one kind is drawn in the wiring diagram: after IEC 60617, from memory. Units of the
 * diagram from the upper left corner of its box; terminals lie on the grid, outside of the body, so
 * that a lead can leave them on three sides.
 */
export interface PartSymbol {
  size: BenchPoint;
  /** no lead runs over it or along its edge */ body: BenchBox;
  terminals: Readonly<Record<string, BenchPoint>>;
  strokes: (contacts: Contacts) => readonly Stroke[];
  /** read upright however the symbol is turned */
  letters?: readonly { text: string; at: BenchPoint; size: number }[];
}

export type SymbolOf = (variant: string | undefined) => PartSymbol;
