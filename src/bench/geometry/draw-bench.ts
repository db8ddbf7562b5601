import type { OvenLayout } from '../../../shared/oven/layout.ts';
import type {
  OvenDefinition,
  OvenPart,
  PartKindName,
  PartRef,
  TargetRef,
} from '../../../shared/oven/oven.ts';
import { isInBox, type BenchBox } from './bench-box.ts';
import { benchSize, outlet } from './bench-furniture.ts';
import type { BenchPoint } from './bench-point.ts';
import type { SceneLabel } from './bench-scene.ts';
import { partWish, terminalWish } from './label-wishes.ts';
import { leadPath } from './lead-path.ts';
import { mapLeads } from './lead-map.ts';
import { placeLabels, type PlacedLabel } from './place-labels.ts';
import { flatten, smoothPath } from './smooth-path.ts';
import { targetTraits, type TargetTraits } from './target-traits.ts';

/** What of the picture never changes while an oven is on the bench: places and labels. Made once per oven. */
export interface BenchDrawing {
  definition: OvenDefinition;
  layout: OvenLayout;
  targets: ReadonlyMap<TargetRef, TargetTraits>;
  /** in the order of drawing */ partsByHeight: readonly OvenPart[];
  /** by part: its terminals by id, from the part's upper left corner */
  partTerminals: ReadonlyMap<PartRef, Readonly<Record<string, BenchPoint>>>;
  /** by target */ terminalLabels: ReadonlyMap<string, SceneLabel>;
  /** by part reference */ partLabels: ReadonlyMap<string, SceneLabel>;
}

/** Kinds that are dark to print on. */
const isDark: Readonly<Record<PartKindName, boolean>> = {
  plug: true,
  chassis: false,
  fuse: true,
  'filter-board': true,
  'cut-out': false,
  'door-switch': true,
  relay: true,
  'board-transformer': true,
  'control-board': true,
  'mechanical-timer': false,
  resistor: false,
  lamp: false,
  motor: false,
  'hv-transformer': true,
  'hv-fuse': false,
  'hv-capacitor': false,
  'hv-diode': false,
  magnetron: true,
};

/** Places every label of an oven on its bench. Pure; takes some milliseconds, so keep the result. */
export const drawBench = (definition: OvenDefinition, layout: OvenLayout): BenchDrawing => {
  const targets = targetTraits(definition, layout);
  const placed = placeLabels(
    [
      ...[...targets].map(([target, { at }]) =>
        terminalWish(target, at, layout.terminals[target]?.label),
      ),
      ...definition.parts.flatMap((part) => {
        const place = layout.parts[part.ref];
        return place === undefined || part.kind === 'chassis'
          ? []
          : [partWish(part, place, otherParts(part.ref, definition, layout))];
      }),
    ],
    {
      points: [...targets.values()].map(({ at }) => at),
      clearance: 8,
      boxes: [outlet],
      leads: mapLeads(homeChains(definition, layout)),
      within: { at: [2, 52], size: [benchSize[0] - 4, benchSize[1] - 54] },
    },
  );
  const toned = (id: string, label: PlacedLabel): [string, SceneLabel] => [
    id,
    { ...label, tone: toneAt(label.at, definition, layout) },
  ];
  const labels = [...placed].map(([id, label]) => toned(id, label));
  return {
    definition,
    layout,
    targets,
    partsByHeight: [...definition.parts].sort(byHeight),
    partTerminals: partTerminals(layout, targets),
    terminalLabels: new Map(labels.filter(([id]) => targets.has(id))),
    partLabels: new Map(labels.filter(([id]) => !targets.has(id))),
  };
};

/** Boards and the chassis carry other parts, so they are drawn first. */
const carries: readonly PartKindName[] = ['chassis', 'filter-board', 'control-board'];

const byHeight = (a: OvenPart, b: OvenPart): number =>
  Number(carries.includes(b.kind)) - Number(carries.includes(a.kind));

const partTerminals = (
  layout: OvenLayout,
  targets: ReadonlyMap<TargetRef, TargetTraits>,
): BenchDrawing['partTerminals'] =>
  new Map(
    Object.entries(layout.parts).map(([ref, place]) => {
      const own = [...targets.values()].filter(({ part }) => part === ref);
      const local = own.map(({ id, at }): [string, BenchPoint] => [
        id,
        [at[0] - place.at[0], at[1] - place.at[1]],
      ]);
      return [ref, Object.fromEntries(local)];
    }),
  );

const otherParts = (
  own: string,
  definition: OvenDefinition,
  layout: OvenLayout,
): { box: BenchBox; isBoard: boolean }[] =>
  definition.parts.flatMap(({ ref, kind }) => {
    const box = layout.parts[ref];
    if (box === undefined || ref === own || kind === 'chassis') return [];
    return [{ box, isBoard: kind === 'control-board' || kind === 'filter-board' }];
  });

const homeChains = (definition: OvenDefinition, layout: OvenLayout): BenchPoint[][] =>
  definition.leads.flatMap((lead) => {
    const a = layout.terminals[lead.ends[0]];
    const b = layout.terminals[lead.ends[1]];
    const way = layout.leads[lead.ref];
    if (a === undefined || b === undefined || way === undefined) return [];
    return [flatten(smoothPath(leadPath(a.at, way.via, b.at, [true, true])))];
  });

const toneAt = (
  at: BenchPoint,
  definition: OvenDefinition,
  layout: OvenLayout,
): SceneLabel['tone'] => {
  let tone: SceneLabel['tone'] = isInBox(at, layout.chassis) ? 'on-light' : 'on-dark';
  for (const part of definition.parts) {
    const place = layout.parts[part.ref];
    if (part.kind === 'chassis' || place === undefined) continue;
    const box: BenchBox = { at: place.at, size: place.size };
    if (isInBox(at, box)) tone = isDark[part.kind] ? 'on-dark' : 'on-light';
  }
  return tone;
};
