import type { OvenLayout } from '../../../shared/oven/layout.ts';
import type { OvenDefinition, PartKindName } from '../../../shared/oven/oven.ts';
import { isInBox, type BenchBox } from './bench-box.ts';
import { batteryTargets, benchSize, outlet } from './bench-furniture.ts';
import type { BenchPoint } from './bench-point.ts';
import type { SceneLabel } from './bench-scene.ts';
import { partWish, terminalWish } from './label-wishes.ts';
import { leadPath } from './lead-path.ts';
import { placeLabels, type PlacedLabel } from './place-labels.ts';
import { flatten, smoothPath } from './smooth-path.ts';

/** What of the picture never changes while an oven is on the bench: places and labels. Made once per oven. */
export interface BenchDrawing {
  definition: OvenDefinition;
  layout: OvenLayout;
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
  lamp: false,
  motor: false,
  'hv-transformer': true,
  'hv-capacitor': false,
  'hv-diode': false,
  magnetron: true,
};

/** Places every label of an oven on its bench. Pure; takes some milliseconds, so keep the result. */
export const drawBench = (definition: OvenDefinition, layout: OvenLayout): BenchDrawing => {
  const points = targetPoints(layout);
  const placed = placeLabels(
    [
      ...[...points].map(([target, at]) =>
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
      points: [...points.values()],
      clearance: 8,
      boxes: [outlet],
      chains: homeChains(definition, layout),
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
    terminalLabels: new Map(labels.filter(([id]) => points.has(id))),
    partLabels: new Map(labels.filter(([id]) => !points.has(id))),
  };
};

/** Every place a probe can touch while all leads are at home: the oven's terminals and the battery's. */
export const targetPoints = (layout: OvenLayout): ReadonlyMap<string, BenchPoint> =>
  new Map([
    ...Object.entries(layout.terminals).map(([target, { at }]) => [target, at] as const),
    ...Object.entries(batteryTargets),
  ]);

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
