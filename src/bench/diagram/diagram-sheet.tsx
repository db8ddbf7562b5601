import { useMemo, type KeyboardEvent, type ReactNode } from 'react';
import { useBench, useBenchApi } from '../../simulation/bench-context.ts';
import type { Diagram } from './build-diagram.ts';
import { contactsOf } from './contacts-of.ts';
import type { DiagramEntry } from './diagram-entries.ts';
import { ink } from './diagram-ink.ts';
import { DiagramLabels } from './diagram-labels.tsx';
import type { DiagramLead } from './diagram-leads.ts';
import { jointsOf } from './joints.ts';
import { LeadLine } from './lead-line.tsx';
import { SymbolStrokes } from './symbol-strokes.tsx';
import { TargetMark } from './target-mark.tsx';

interface Props {
  diagram: Diagram;
  leads: readonly DiagramLead[];
  entries: readonly DiagramEntry[];
  /** the one that Tab comes to */ stop: string | null;
  scale: number;
  onPick: (entry: DiagramEntry) => void;
  onArrive: (entry: DiagramEntry) => void;
  onKeyDown: (event: KeyboardEvent) => void;
}

/** The drawn sheet. Parts, terminals, lifted ends and leads are buttons in it, one tab stop for all. */
export const DiagramSheet = (props: Props) => {
  const { diagram, leads, entries, stop, scale, onPick, onArrive, onKeyDown } = props;
  const bench = useBenchApi();
  const definition = useBench(({ setup }) => setup.oven.definition);
  const oven = useBench(({ state }) => state.oven);
  const probes = useBench(({ state }) => state.probes);
  const hovered = useBench((store) => store.hovered);
  const focused = useBench((store) => store.focused);
  const [width, height] = diagram.size;
  const joints = useMemo(
    () =>
      jointsOf(
        leads.map(({ way }) => way),
        Object.values(diagram.places),
      ),
    [leads, diagram],
  );
  const byRef = new Map(entries.map((entry) => [entry.ref, entry]));
  const isMarked = (ref: string): boolean => ref === hovered || ref === focused;

  const button = (ref: string, children: ReactNode): ReactNode => {
    const entry = byRef.get(ref);
    if (!entry) return null;
    return (
      <g
        key={ref}
        role="button"
        tabIndex={ref === stop ? 0 : -1}
        aria-label={entry.name}
        aria-disabled={entry.isShut}
        data-diagram={ref}
        className="cursor-pointer outline-none"
        onPointerEnter={() => bench.getState().hover(ref)}
        onPointerLeave={() => bench.getState().hover(null)}
        onFocus={() => onArrive(entry)}
        onClick={() => onPick(entry)}
      >
        <title>{entry.name}</title>
        {children}
      </g>
    );
  };
  const ends = leads.flatMap(({ lead, open }) =>
    open.flatMap((at, i) => (at ? [{ ref: `${lead.ref}/${i === 0 ? 'a' : 'b'}`, at }] : [])),
  );
  const target = (ref: string, at: readonly [number, number], isOpenEnd: boolean): ReactNode =>
    button(
      ref,
      <TargetMark
        at={at}
        isOpenEnd={isOpenEnd}
        isMarked={isMarked(ref)}
        probes={(['red', 'black'] as const).filter((colour) => probes[colour] === ref)}
      />,
    );

  return (
    <svg
      role="group"
      aria-label={`Wiring diagram of the ${definition.maker} ${definition.model}`}
      viewBox={`0 0 ${width} ${height}`}
      width={width * scale}
      height={height * scale}
      className="block max-w-none select-none"
      onKeyDown={onKeyDown}
      onBlur={(event) => {
        if (!event.currentTarget.contains(event.relatedTarget)) bench.getState().focus(null);
      }}
    >
      <rect width={width} height={height} fill={ink.paper} />
      {diagram.symbols.map((placed) =>
        button(
          placed.part.ref,
          <>
            <rect
              x={placed.body.at[0] - 2}
              y={placed.body.at[1] - 2}
              width={placed.body.size[0] + 4}
              height={placed.body.size[1] + 4}
              rx={4}
              fill={isMarked(placed.part.ref) ? ink.mark : 'transparent'}
              fillOpacity={0.16}
              stroke={isMarked(placed.part.ref) ? ink.mark : 'none'}
              strokeWidth={2}
            />
            <SymbolStrokes placed={placed} stands={JSON.stringify(contactsOf(placed.part, oven))} />
          </>,
        ),
      )}
      {leads.map((line) =>
        button(line.lead.ref, <LeadLine line={line} isMarked={isMarked(line.lead.ref)} />),
      )}
      {joints.map(([x, y]) => (
        <circle key={`${x} ${y}`} cx={x} cy={y} r={3} fill={ink.line} pointerEvents="none" />
      ))}
      <g pointerEvents="none">
        <DiagramLabels labels={diagram.labels} />
      </g>
      {Object.entries(diagram.places).map(([ref, at]) => target(ref, at, false))}
      {ends.map(({ ref, at }) => target(ref, at, true))}
    </svg>
  );
};
