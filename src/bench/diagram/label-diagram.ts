import type { OvenDefinition, OvenLead } from '../../../shared/oven/oven.ts';
import { boxAround, type BenchBox } from '../geometry/bench-box.ts';
import type { BenchPoint } from '../geometry/bench-point.ts';
import { mapLeads } from '../geometry/lead-map.ts';
import { placeLabels, type LabelWish, type PlacedLabel } from '../geometry/place-labels.ts';
import { colourCodes } from './lead-colours.ts';
import type { PlacedSymbol } from './place-symbol.ts';
import { corners } from './routing/corners.ts';
import type { Routes } from './routing/route-leads.ts';

/** Type sizes in units of the diagram. Widths are reckoned, so that placing needs no canvas. */
export const labelSizes = { part: 14, name: 11.5, terminal: 10.5, lead: 9.5 } as const;

const monoAdvance = 0.6;
const sansAdvance = 0.5;
const lineHeight = 14;

/** Places the names of parts, terminals and leads: none over another, over a terminal or over a symbol. */
export function labelDiagram(
  definition: OvenDefinition,
  size: BenchPoint,
  symbols: readonly PlacedSymbol[],
  routes: Routes,
): Map<string, PlacedLabel> {
  const obstacles = {
    points: symbols.flatMap(({ terminals }) => Object.values(terminals)),
    clearance: 4,
    boxes: symbols.map(({ body }) => body),
    leads: mapLeads([...routes.values()]),
    within: { at: [2, 2] as const, size: [size[0] - 4, size[1] - 4] as const },
  };
  const first = placeLabels(
    symbols.flatMap((one) => [
      partWish(one, symbols),
      ...Object.entries(one.terminals).map(terminalWish),
    ]),
    obstacles,
  );
  const leads = placeLabels(
    definition.leads.flatMap((lead) => leadWish(lead, routes.get(lead.ref) ?? [])),
    { ...obstacles, boxes: [...obstacles.boxes, ...[...first.values()].map(({ box }) => box)] },
  );
  return new Map([...first, ...leads]);
}

/** The name behind its reference, in one line, broken in two, or the reference alone. */
function partTexts(ref: string, name: string): { text: string; size: BenchPoint; dear: number }[] {
  const refWidth = ref.length * labelSizes.part * monoAdvance;
  const wide = (text: string): number => text.length * labelSizes.name * sansAdvance;
  const words = name.split(' ');
  const half = words.findIndex((_, i) => words.slice(0, i + 1).join(' ').length * 2 >= name.length);
  const [upper, lower] = [words.slice(0, half + 1).join(' '), words.slice(half + 1).join(' ')];
  const line = refWidth + 5 + wide(name);
  return [
    { text: `${ref} ${name}`, size: [line, lineHeight], dear: 0 },
    ...(lower === ''
      ? []
      : [
          {
            text: `${ref} ${upper}\n${lower}`,
            size: [Math.max(refWidth + 5 + wide(upper), wide(lower)), 2 * lineHeight] as const,
            dear: 6,
          },
        ]),
    { text: ref, size: [refWidth, lineHeight], dear: 60 },
  ];
}

/** What a name costs that stands nearer to another part than to its own. */
const strayCost = 12;

function partWish({ part, body }: PlacedSymbol, all: readonly PlacedSymbol[]): LabelWish {
  const others = all.filter((one) => one.part !== part && one.part.kind !== 'chassis');
  const choices = partTexts(part.ref, part.name).flatMap(({ text, size, dear }) =>
    around(body, size).map(({ at, cost }) => {
      const box = boxAround(at, size);
      const near = gapBetween(box, body);
      const isStray = others.some((one) => gapBetween(box, one.body) <= near);
      return { text, size, at, cost: cost + dear + (isStray ? strayCost : 0) };
    }),
  );
  return { id: part.ref, choices };
}

/** Units between two boxes, 0 where they meet. */
const gapBetween = (a: BenchBox, b: BenchBox): number =>
  Math.hypot(
    Math.max(a.at[0] - b.at[0] - b.size[0], b.at[0] - a.at[0] - a.size[0], 0),
    Math.max(a.at[1] - b.at[1] - b.size[1], b.at[1] - a.at[1] - a.size[1], 0),
  );

function around(
  { at: [x, y], size: [w, h] }: BenchBox,
  [lw, lh]: BenchPoint,
): { at: BenchPoint; cost: number }[] {
  const columns = [x + w / 2, x + lw / 2, x + w - lw / 2];
  const rows = [y + h / 2, y + lh / 2, y + h - lh / 2];
  return [0, 6, 12, 20].flatMap((more) => [
    ...columns.map((at, i) => ({ at: [at, y - lh / 2 - 3 - more] as const, cost: i + more / 2 })),
    ...rows.map((at, i) => ({
      at: [x + w + lw / 2 + 8 + more, at] as const,
      cost: 2 + i + more / 2,
    })),
    ...columns.map((at, i) => ({
      at: [at, y + h + lh / 2 + 3 + more] as const,
      cost: 3 + i + more / 2,
    })),
    ...rows.map((at, i) => ({ at: [x - lw / 2 - 8 - more, at] as const, cost: 4 + i + more / 2 })),
  ]);
}

function terminalWish([ref, [x, y]]: [string, BenchPoint]): LabelWish {
  const text = ref.slice(ref.indexOf('.') + 1);
  const size: BenchPoint = [text.length * labelSizes.terminal * monoAdvance, labelSizes.terminal];
  const aside = size[0] / 2 + 4;
  const places: [number, number, number][] = [
    [aside, -8, 0],
    [-aside, -8, 0],
    [aside, 9, 1],
    [-aside, 9, 1],
    [0, -11, 2],
    [0, 12, 3],
    [aside + 3, 0, 4],
    [-aside - 3, 0, 4],
  ];
  return {
    id: ref,
    choices: [0, 4, 9].flatMap((more) =>
      places.map(([dx, dy, cost]) => ({
        text,
        size,
        at: [x + dx + Math.sign(dx) * more, y + dy + Math.sign(dy) * more] as BenchPoint,
        cost: cost + more,
      })),
    ),
  };
}

/** Number and colour, over or beside the long straight pieces of its way. */
function leadWish(lead: OvenLead, way: readonly BenchPoint[]): LabelWish[] {
  const text = `${lead.ref} ${colourCodes[lead.insulation]}`;
  const size: BenchPoint = [text.length * labelSizes.lead * monoAdvance, labelSizes.lead];
  const points = corners(way);
  const pieces = points.flatMap((to, i) => {
    const from = points[i - 1];
    return from
      ? [{ from, to, length: Math.abs(to[0] - from[0]) + Math.abs(to[1] - from[1]) }]
      : [];
  });
  const choices = pieces
    .filter(({ from, to, length }) => length > (from[1] === to[1] ? size[0] : 20))
    .flatMap(({ from, to, length }) =>
      [0.5, 0.3, 0.7, 0.15, 0.85].flatMap((share) => {
        const [x, y] = [from[0] + (to[0] - from[0]) * share, from[1] + (to[1] - from[1]) * share];
        const isLevel = from[1] === to[1];
        const off = isLevel ? [0, size[1] / 2 + 4.5] : [size[0] / 2 + 4, 0];
        return [-1, 1].map((side) => ({
          text,
          size,
          at: [x + side * off[0]!, y + side * off[1]!] as BenchPoint,
          cost: 200 / length + Math.abs(share - 0.5) * 4 + (isLevel ? 0 : 6) + (side > 0 ? 1 : 0),
        }));
      }),
    );
  return choices.length > 0 ? [{ id: lead.ref, choices }] : [];
}
