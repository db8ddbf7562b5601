import { diagramGrid } from '../../../../shared/oven/layout.ts';
import type { BenchPoint } from '../../geometry/bench-point.ts';
import type { PlacedSymbol } from '../place-symbol.ts';

/** Right, down, left, up. */
export const steps: readonly BenchPoint[] = [
  [1, 0],
  [0, 1],
  [-1, 0],
  [0, -1],
];

/** The lines on which leads run, and what stands on them. Nodes are numbered row by row. */
export interface Grid {
  columns: number;
  rows: number;
  /** 1: a symbol's body or the margin */ blocked: Uint8Array;
  /** 1: a terminal, only for its own leads */ isTerminal: Uint8Array;
  /** 1: beside a terminal, where its name goes */ isBeside: Uint8Array;
  nodeOf: (point: BenchPoint) => number;
  pointOf: (node: number) => BenchPoint;
}

export function makeGrid(size: BenchPoint, symbols: readonly PlacedSymbol[]): Grid {
  const columns = size[0] / diagramGrid + 1;
  const rows = size[1] / diagramGrid + 1;
  const nodeOf = ([x, y]: BenchPoint): number =>
    Math.round(y / diagramGrid) * columns + Math.round(x / diagramGrid);
  const blocked = new Uint8Array(columns * rows);
  const isTerminal = new Uint8Array(columns * rows);
  const isBeside = new Uint8Array(columns * rows);
  for (let column = 0; column < columns; column += 1) {
    blocked[column] = 1;
    blocked[(rows - 1) * columns + column] = 1;
  }
  for (let row = 0; row < rows; row += 1) {
    blocked[row * columns] = 1;
    blocked[row * columns + columns - 1] = 1;
  }
  for (const { body, terminals } of symbols) {
    for (let x = body.at[0]; x <= body.at[0] + body.size[0]; x += diagramGrid)
      for (let y = body.at[1]; y <= body.at[1] + body.size[1]; y += diagramGrid)
        blocked[nodeOf([x, y])] = 1;
    for (const place of Object.values(terminals)) {
      const node = nodeOf(place);
      isTerminal[node] = 1;
      for (const [dx, dy] of steps) isBeside[node + dx + dy * columns] = 1;
    }
  }
  return {
    columns,
    rows,
    blocked,
    isTerminal,
    isBeside,
    nodeOf,
    pointOf: (node) => [(node % columns) * diagramGrid, Math.floor(node / columns) * diagramGrid],
  };
}
