import type { OvenLayout } from '../../../shared/oven/layout.ts';
import type { OvenPart } from '../../../shared/oven/oven.ts';
import { boxAround, boxesOverlap, type BenchBox } from './bench-box.ts';
import type { BenchPoint } from './bench-point.ts';
import type { LabelWish } from './place-labels.ts';

/** Type sizes on the bench, units. Widths are reckoned, not measured, so that placing needs no canvas. */
export const labelType = {
  terminal: { size: 11, advance: 0.6, height: 12 },
  part: { size: 13, advance: 0.55, height: 15 },
} as const;

const sizeOf = (
  text: string,
  type: { size: number; advance: number; height: number },
): BenchPoint => [text.length * type.size * type.advance + 2, type.height];

/** Directions a terminal's label may take, best first, with what each costs. */
const sides: readonly (readonly [number, number, number])[] = [
  [0, -1, 0],
  [0, 1, 1.5],
  [1, 0, 1],
  [-1, 0, 1],
  [1, -1, 3],
  [-1, -1, 3],
  [1, 1, 4],
  [-1, 1, 4],
];

const clear = 9;

/** Where the label of one terminal may go: close around it, its full name first, its short one where space is dear. */
export const terminalWish = (target: string, at: BenchPoint, wanted?: BenchPoint): LabelWish => {
  const short = target.slice(target.indexOf('.') + 1);
  const choices = [
    { text: target, dear: 0 },
    { text: short, dear: 70 },
  ].flatMap(({ text, dear }) => {
    const size = sizeOf(text, labelType.terminal);
    const around = [0, 4, 9].flatMap((more) =>
      sides.map(([dx, dy, cost]) => ({
        text,
        size,
        at: [
          at[0] + dx * (size[0] / 2 + (dy === 0 ? clear : clear - 6) + more * Math.abs(dx)),
          at[1] + dy * (size[1] / 2 + clear + more) * (dx === 0 ? 1 : 0.8),
        ] as BenchPoint,
        cost: cost + dear + more * 1.2,
      })),
    );
    return wanted === undefined
      ? around
      : [{ text, size, at: wanted, cost: dear - 1000 }, ...around];
  });
  return { id: target, choices };
};

/** What a name costs that lies on a part of another name, and on a board that carries its part. */
const foreign = { part: 90, board: 10 } as const;

/** Where the name of one part may go: under it, above it, beside it, inside it; the reference alone where space is dear. */
export const partWish = (
  part: OvenPart,
  place: OvenLayout['parts'][string],
  others: readonly { box: BenchBox; isBoard: boolean }[],
): LabelWish => {
  const texts = [
    { text: `${part.name} ${part.ref}`, dear: 0 },
    { text: part.ref, dear: 60 },
  ];
  const choices = texts.flatMap(({ text, dear }) => {
    const size = sizeOf(text, labelType.part);
    const wanted = place.label === undefined ? [] : [{ at: place.label, cost: -1000 }];
    return [...wanted, ...aroundPart(place, size)].map(({ at, cost }) => ({
      text,
      size,
      at,
      cost: cost + dear + strayCost(boxAround(at, size), others),
    }));
  });
  return { id: part.ref, choices };
};

const strayCost = (box: BenchBox, others: readonly { box: BenchBox; isBoard: boolean }[]): number =>
  others
    .filter((other) => boxesOverlap(box, other.box))
    .reduce((sum, { isBoard }) => sum + (isBoard ? foreign.board : foreign.part), 0);

const aroundPart = (
  { at: [x, y], size: [width, height] }: BenchBox,
  size: BenchPoint,
): { at: BenchPoint; cost: number }[] => {
  const [w, h] = [size[0] / 2, size[1] / 2];
  const rows = [
    { y: y + height + h + 3, cost: 0 },
    { y: y - h - 3, cost: 3 },
    { y: y + height - h - 5, cost: 8 },
    { y: y + h + 5, cost: 9 },
    { y: y + height / 2, cost: 10 },
    { y: y + height + h + 12, cost: 12 },
  ];
  const columns = [
    { x: x + w, cost: 0 },
    { x: x + width / 2, cost: 0.5 },
    { x: x + width - w, cost: 1 },
    { x: x + w + 8, cost: 2 },
    { x: x + width - w - 8, cost: 2 },
    { x: x + width + w + 5, cost: 5 },
    { x: x - w - 5, cost: 6 },
  ];
  return rows.flatMap((row) =>
    columns.map((column) => ({
      at: [column.x, row.y] as BenchPoint,
      cost: row.cost + column.cost,
    })),
  );
};
