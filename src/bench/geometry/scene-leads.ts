import type { OvenLead } from '../../../shared/oven/oven.ts';
import type { OvenState } from '../../../shared/oven/oven-state.ts';
import type { BenchHand } from './bench-hand.ts';
import type { BenchPoint } from './bench-point.ts';
import type { SceneLead, SceneLeadEnd, SceneTerminal } from './bench-scene.ts';
import type { BenchDrawing } from './draw-bench.ts';
import { leadPath } from './lead-path.ts';
import { placeTags } from './place-tags.ts';

/** Every lead of the oven where its ends are now: seated, also on a wrong terminal, or lying loose. */
export const sceneLeads = (
  drawing: BenchDrawing,
  places: ReadonlyMap<string, BenchPoint>,
  oven: OvenState,
  hand: BenchHand,
): SceneLead[] =>
  drawing.definition.leads.flatMap((lead) => {
    const a = sceneEnd(drawing, places, oven, hand, lead, 0);
    const b = sceneEnd(drawing, places, oven, hand, lead, 1);
    const way = drawing.layout.leads[lead.ref];
    if (a === null || b === null || way === undefined) return [];
    const inCord = isInCord(drawing, lead);
    // A lead inside the cord cannot leave it.
    const isHome = [
      inCord || a.seatedOn === lead.ends[0],
      inCord || b.seatedOn === lead.ends[1],
    ] as const;
    return [
      {
        ref: lead.ref,
        path: leadPath(a.at, way.via, b.at, isHome),
        insulation: lead.insulation,
        isHighVoltage: lead.isHighVoltage ?? false,
        isInCord: inCord,
        ends: [a, b],
      },
    ];
  });

const sceneEnd = (
  { layout }: BenchDrawing,
  places: ReadonlyMap<string, BenchPoint>,
  oven: OvenState,
  hand: BenchHand,
  lead: OvenLead,
  i: 0 | 1,
): SceneLeadEnd | null => {
  const target = `${lead.ref}/${i === 0 ? 'a' : 'b'}`;
  const home = places.get(lead.ends[i]);
  if (home === undefined) return null;
  const [dx, dy] = layout.leads[lead.ref]?.hangs?.[i] ?? [0, 30];
  const hangsAt: BenchPoint = [home[0] + dx, home[1] + dy];
  const seatedOn = oven.leadEnds[target] ?? null;
  const at = seatedOn === null ? hangsAt : (places.get(seatedOn) ?? hangsAt);
  return { target, seatedOn, at, hangsAt, label: hand.labels[target] ?? null, tag: null };
};

const isInCord = ({ definition }: BenchDrawing, lead: OvenLead): boolean =>
  lead.ends.some((end) =>
    definition.parts.some(({ ref, kind }) => kind === 'plug' && ref === end.split('.')[0]),
  );

/** The same leads with their tags placed, clear of everything that can be touched or read. */
export const withTags = (
  drawing: BenchDrawing,
  leads: readonly SceneLead[],
  terminals: readonly SceneTerminal[],
): SceneLead[] => {
  const labels = [...drawing.terminalLabels.values(), ...drawing.partLabels.values()];
  const tags = placeTags(
    leads,
    terminals.map(({ at }) => at),
    labels.map(({ box }) => box),
  );
  const withTag = (end: SceneLeadEnd): SceneLeadEnd => ({
    ...end,
    tag: tags.get(end.target) ?? null,
  });
  return leads.map((lead) => ({ ...lead, ends: [withTag(lead.ends[0]), withTag(lead.ends[1])] }));
};
