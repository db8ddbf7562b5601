import type { OvenLayout } from '../../../shared/oven/layout.ts';
import type { OvenPart } from '../../../shared/oven/oven.ts';
import type { BenchBox } from '../geometry/bench-box.ts';
import type { BenchPoint } from '../geometry/bench-point.ts';
import { partSymbols } from './symbols/catalogue.ts';
import type { PartSymbol } from './symbols/symbol.ts';

/** A symbol where it stands in the diagram. */
export interface PlacedSymbol {
  part: OvenPart;
  symbol: PartSymbol;
  /** SVG transform from the symbol's own units */ transform: string;
  body: BenchBox;
  /** by full reference: `C1.1` */ terminals: Readonly<Record<string, BenchPoint>>;
  letters: readonly { text: string; at: BenchPoint; size: number }[];
}

type Turn = 0 | 90 | 180 | 270;

const turned = ([x, y]: BenchPoint, [w, h]: BenchPoint, turn: Turn): BenchPoint => {
  switch (turn) {
    case 0:
      return [x, y];
    case 90:
      return [h - y, x];
    case 180:
      return [w - x, h - y];
    case 270:
      return [y, w - x];
  }
};

/** Where the corner of the symbol's own axes comes to lie. */
const origin = (size: BenchPoint, turn: Turn): BenchPoint => turned([0, 0], size, turn);

/** Puts a part's symbol at its place, turned clockwise within its box. */
export function placeSymbol(
  part: OvenPart,
  { at, turn = 0 }: OvenLayout['diagram']['parts'][string],
): PlacedSymbol {
  const symbol = partSymbols[part.kind](part.variant);
  const put = (point: BenchPoint): BenchPoint => {
    const [x, y] = turned(point, symbol.size, turn);
    return [at[0] + x, at[1] + y];
  };
  const { body } = symbol;
  const one = put(body.at);
  const other = put([body.at[0] + body.size[0], body.at[1] + body.size[1]]);
  const [ox, oy] = origin(symbol.size, turn);
  return {
    part,
    symbol,
    transform: `translate(${at[0] + ox} ${at[1] + oy}) rotate(${turn})`,
    body: {
      at: [Math.min(one[0], other[0]), Math.min(one[1], other[1])],
      size: [Math.abs(one[0] - other[0]), Math.abs(one[1] - other[1])],
    },
    terminals: Object.fromEntries(
      Object.entries(symbol.terminals).map(([id, point]) => [`${part.ref}.${id}`, put(point)]),
    ),
    letters: (symbol.letters ?? []).map((letter) => ({ ...letter, at: put(letter.at) })),
  };
}
