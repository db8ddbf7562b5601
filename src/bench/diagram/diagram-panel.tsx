import { useEffect, useMemo, useRef, useState } from 'react';
import type { OvenLayout } from '../../../shared/oven/layout.ts';
import { useBench, useBenchApi } from '../../simulation/bench-context.ts';
import { useBoxSize } from '../panels/use-box-size.ts';
import { useWide } from '../panels/use-wide.ts';
import { buildDiagram } from './build-diagram.ts';
import { DiagramBar } from './diagram-bar.tsx';
import { diagramEntries, type DiagramEntry } from './diagram-entries.ts';
import { pressDiagramKey } from './diagram-keys.ts';
import { diagramLeads } from './diagram-leads.ts';
import { DiagramSheet } from './diagram-sheet.tsx';
import './diagram.css';

/** px per unit at which the smallest names can still be read */
const readable = 0.85;
const scales = { least: 0.25, most: 3 } as const;

interface Props {
  layout: OvenLayout;
  onClose: () => void;
}

/** The oven's wiring diagram beside the bench, or over it where there is no room for both. */
export const DiagramPanel = ({ layout, onClose }: Props) => {
  const bench = useBenchApi();
  const definition = useBench(({ setup }) => setup.oven.definition);
  const state = useBench((store) => store.state);
  const hovered = useBench((store) => store.hovered);
  const [isWhole, setIsWhole] = useState(false);
  const [chosen, setChosen] = useState<number | 'fit' | null>(null);
  const [current, setCurrent] = useState<string | null>(null);
  const sheet = useRef<HTMLDivElement>(null);
  const isPointerInside = useRef(false);
  const view = useBoxSize(sheet);
  const isBeside = useWide(1100) && !isWhole;

  const diagram = useMemo(() => buildDiagram(definition, layout), [definition, layout]);
  const { leadEnds } = state.oven;
  const leads = useMemo(
    () => diagramLeads(diagram, definition, { leadEnds }),
    [diagram, definition, leadEnds],
  );
  const entries = useMemo(
    () => diagramEntries(definition, state, diagram, leads),
    [definition, state, diagram, leads],
  );
  const stop = entries.find(({ ref }) => ref === current) ?? entries[0];

  const whole = Math.min(view.width / diagram.size[0], view.height / diagram.size[1]);
  const fit = view.width === 0 ? readable : whole;
  const scale = chosen === 'fit' ? fit : (chosen ?? Math.max(fit, readable));
  const zoom = (by: number): void =>
    setChosen(Math.min(scales.most, Math.max(scales.least, scale * by)));

  useEffect(() => sheet.current?.focus({ preventScroll: true }), []);

  // What is pointed at on the bench comes into view; the sheet under the pointer never moves of itself.
  useEffect(() => {
    if (hovered === null || isPointerInside.current) return;
    const drawn = sheet.current?.querySelector(`[data-diagram="${CSS.escape(hovered)}"]`);
    drawn?.scrollIntoView({ block: 'nearest', inline: 'nearest' });
  }, [hovered]);

  const focusOn = (entry: DiagramEntry | null | undefined): void =>
    sheet.current
      ?.querySelector<SVGElement>(`[data-diagram="${CSS.escape(entry?.ref ?? '')}"]`)
      ?.focus();
  const pick = (entry: DiagramEntry): void => {
    if (entry.isShut) return;
    const { tap, select } = bench.getState();
    if (entry.kind === 'target') tap(entry.ref);
    else select({ kind: entry.kind, ref: entry.ref });
    // What can be done there is said on the mat.
    if (!isBeside && bench.getState().selection) onClose();
  };
  const { maker, model, supply, cautions } = definition;
  return (
    <section
      aria-label="Wiring diagram"
      className={`flex min-h-0 min-w-0 flex-col border-l border-bench-line bg-mat-deep text-bench-ink ${
        isBeside ? 'w-1/2' : 'absolute inset-0 z-[7]'
      }`}
      onKeyDown={(event) => {
        if (event.key !== 'Escape' || bench.getState().hand.kind !== 'empty') return;
        event.stopPropagation();
        onClose();
      }}
      onPointerEnter={() => (isPointerInside.current = true)}
      onPointerLeave={() => (isPointerInside.current = false)}
    >
      <DiagramBar
        zoom={zoom}
        onFit={() => setChosen('fit')}
        isWhole={isWhole}
        onWhole={() => {
          setIsWhole(!isWhole);
          setChosen(isWhole ? null : 'fit');
        }}
        onClose={onClose}
      />
      <div className="flex min-h-0 min-w-0 flex-1 flex-col" data-diagram-print>
        <p data-print-only className="hidden">
          {maker} {model}, {supply.volts} V {supply.hertz} Hz: wiring diagram
        </p>
        <div
          ref={sheet}
          tabIndex={-1}
          className="min-h-0 flex-1 overflow-auto bg-white outline-none"
        >
          <DiagramSheet
            diagram={diagram}
            leads={leads}
            entries={entries}
            stop={stop?.ref ?? null}
            scale={scale}
            onPick={pick}
            onArrive={(entry) => {
              setCurrent(entry.ref);
              bench.getState().focus(entry.ref);
            }}
            onKeyDown={(event) => pressDiagramKey(event, { entries, stop, focusOn, pick })}
          />
        </div>
        <p className="px-2.5 py-1 text-xs leading-snug text-bench-ink-2" data-print-small>
          Drawn as the bench stands; a blown fuse or an open cut-out is not to be seen and not
          drawn. <b>{cautions[0]}</b>
        </p>
      </div>
    </section>
  );
};
