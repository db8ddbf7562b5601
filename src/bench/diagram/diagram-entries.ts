import type { BenchState } from '../../../shared/bench/bench-state.ts';
import type { OvenDefinition, OvenLead, OvenPart } from '../../../shared/oven/oven.ts';
import { describeTarget } from '../../../shared/oven/targets.ts';
import type { BenchPoint } from '../geometry/bench-point.ts';
import { boxCentre } from '../geometry/bench-box.ts';
import { marksOn } from '../mirror/mirror-entries.ts';
import type { Diagram } from './build-diagram.ts';
import { contactsOf } from './contacts-of.ts';
import type { DiagramLead } from './diagram-leads.ts';

/** One thing in the diagram that can be hovered, focused and picked out. */
export interface DiagramEntry {
  kind: 'target' | 'part' | 'lead';
  ref: string;
  name: string;
  at: BenchPoint;
  /** behind the cover, while it is on */ isShut: boolean;
}

/** Part by part its terminals, then lifted ends, then leads: the order of the page keys. */
export function diagramEntries(
  definition: OvenDefinition,
  state: BenchState,
  diagram: Diagram,
  leads: readonly DiagramLead[],
): DiagramEntry[] {
  const isShut = (part?: OvenPart): boolean => state.isCoverOn && part?.isOutside !== true;
  const target = (ref: string, at: BenchPoint, part?: OvenPart): DiagramEntry => ({
    kind: 'target',
    ref,
    name: [describeTarget(definition, ref) ?? ref, ...marksOn(state, ref)].join(', '),
    at,
    isShut: isShut(part),
  });
  return [
    ...diagram.symbols.flatMap(({ part, body, terminals }): DiagramEntry[] => [
      {
        kind: 'part',
        ref: part.ref,
        name: [`${part.ref}, ${part.name}`, ...contactWords(part, state)].join(', '),
        at: boxCentre(body),
        isShut: isShut(part),
      },
      ...Object.entries(terminals).map(([ref, at]) => target(ref, at, part)),
    ]),
    ...leads.flatMap(({ lead, open }) =>
      (['a', 'b'] as const).flatMap((side, i) => {
        const at = open[i];
        return at ? [target(`${lead.ref}/${side}`, at)] : [];
      }),
    ),
    ...leads.map(({ lead, way }) => ({
      kind: 'lead' as const,
      ref: lead.ref,
      name: leadWords(lead, state),
      at: way[Math.floor(way.length / 2)] ?? ([0, 0] as const),
      isShut: isShut(),
    })),
  ];
}

const contactWords = (part: OvenPart, { oven }: BenchState): string[] =>
  Object.entries(contactsOf(part, oven)).map(
    ([name, isClosed]) =>
      `${name === 'contact' ? name : `${name} contact`} ${isClosed ? 'closed' : 'open'}`,
  );

/** "W7, lead, line to primary door switch, black, F2.2 to S1.COM", or "on F2.2, lifted from S1.COM". */
function leadWords({ ref, name, insulation, ends }: OvenLead, { oven }: BenchState): string {
  const seats = [oven.leadEnds[`${ref}/a`] ?? null, oven.leadEnds[`${ref}/b`] ?? null];
  const where = seats.includes(null)
    ? seats.map((seat, i) => (seat === null ? `lifted from ${ends[i]}` : `on ${seat}`)).join(', ')
    : seats.join(' to ');
  return `${ref}, lead, ${name}, ${insulation}, ${where}`;
}
