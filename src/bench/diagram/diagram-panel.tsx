import { Maximize, Minus, Plus } from 'lucide-react';
import { useEffect, useMemo, useRef, useState, type KeyboardEvent } from 'react';
import type { OvenLayout } from '../../../shared/oven/layout.ts';
import { useBench, useBenchApi } from '../../simulation/bench-context.ts';
import { neighbour, type Direction } from '../mirror/neighbour.ts';
import { BenchButton } from '../panels/bench-button.tsx';
import { IconX } from '../panels/icon-x.tsx';
import { useBoxSize } from '../panels/use-box-size.ts';
import { useWide } from '../panels/use-wide.ts';
import { buildDiagram } from './build-diagram.ts';
import { diagramEntries, type DiagramEntry } from './diagram-entries.ts';
import { diagramLeads } from './diagram-leads.ts';
import { DiagramSheet } from './diagram-sheet.tsx';
import './diagram.css';

const arrows: Readonly<Record<string, Direction>> = {
  ArrowLeft: 'left',
  ArrowRight: 'right',
  ArrowUp: 'up',
  ArrowDown: 'down',
};

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
  const leads = useMemo(
    () => diagramLeads(diagram, definition, { leadEnds: state.oven.leadEnds }),
    [diagram, definition, state.oven.leadEnds],
  );
  const entries = useMemo(
    () => diagramEntries(definition, state, diagram, leads),
    [definition, state, diagram, leads],
  );
  const stop = entries.find(({ ref }) => ref === current) ?? entries[0];

  const fit = Math.min(view.width / diagram.size[0], view.height / diagram.size[1]);
  const scale =
    view.width === 0 ? readable : chosen === 'fit' ? fit : (chosen ?? Math.max(fit, readable));
  const zoom = (by: number): void =>
    setChosen(Math.min(scales.most, Math.max(scales.least, scale * by)));

  useEffect(() => sheet.current?.focus({ preventScroll: true }), []);

  // What is pointed at on the bench comes into view; the sheet under the pointer never moves of itself.
  useEffect(() => {
    if (hovered === null || isPointerInside.current) return;
    sheet.current
      ?.querySelector(`[data-diagram="${CSS.escape(hovered)}"]`)
      ?.scrollIntoView({ block: 'nearest', inline: 'nearest' });
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
  const onKeyDown = (event: KeyboardEvent): void => {
    if (event.ctrlKey || event.altKey || event.metaKey || !stop) return;
    const handled = (act: () => void): void => {
      event.preventDefault();
      event.stopPropagation();
      act();
    };
    const direction = arrows[event.key];
    const at = entries.indexOf(stop);
    const targets = entries.filter(({ kind }) => kind === 'target');
    if (direction) return handled(() => focusOn(neighbour(stop, targets, direction)));
    if (event.key === 'PageDown') return handled(() => focusOn(entries[at + 1]));
    if (event.key === 'PageUp') return handled(() => focusOn(entries[at - 1]));
    if (event.key === 'Home') return handled(() => focusOn(entries[0]));
    if (event.key === 'End') return handled(() => focusOn(entries.at(-1)));
    if (event.key === 'Enter' || event.key === ' ') return handled(() => pick(stop));
  };
  const { maker, model, supply, cautions } = definition;
  return (
    <section
      aria-label="Wiring diagram"
      className={`grid min-h-0 min-w-0 grid-rows-[auto_1fr] border-l border-bench-line bg-mat-deep text-bench-ink ${
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
      <div className="flex flex-wrap items-center gap-1.5 px-2.5 py-1.5">
        <h2 className="mr-auto text-sm font-semibold">Wiring diagram</h2>
        <span role="group" aria-label="Size of the diagram" className="flex gap-1.5">
          <BenchButton aria-label="Smaller" onClick={() => zoom(0.8)}>
            <Minus aria-hidden size={16} />
          </BenchButton>
          <BenchButton aria-label="Larger" onClick={() => zoom(1.25)}>
            <Plus aria-hidden size={16} />
          </BenchButton>
          <BenchButton aria-label="Show the whole sheet" onClick={() => setChosen('fit')}>
            <Maximize aria-hidden size={16} />
          </BenchButton>
        </span>
        <BenchButton
          className="max-[1099px]:hidden"
          aria-pressed={isWhole}
          onClick={() => {
            setIsWhole(!isWhole);
            setChosen(isWhole ? null : 'fit');
          }}
        >
          Over the mat
        </BenchButton>
        <BenchButton onClick={() => window.print()}>Print</BenchButton>
        <IconX name="Close the diagram" onPress={onClose} />
      </div>
      <div className="grid min-h-0 min-w-0 grid-rows-[auto_1fr_auto]" data-diagram-print>
        <p data-print-only className="hidden">
          {maker} {model}, {supply.volts} V {supply.hertz} Hz: wiring diagram
        </p>
        <div
          ref={sheet}
          tabIndex={-1}
          className="min-h-0 min-w-0 overflow-auto bg-white outline-none"
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
            onKeyDown={onKeyDown}
          />
        </div>
        <p className="px-2.5 py-1 text-xs leading-snug text-bench-ink-2" data-print-small>
          Contacts and leads as they stand on the bench. What the eye cannot see, a blown fuse or an
          open cut-out, is not drawn. <b>{cautions[0]}</b>
        </p>
      </div>
    </section>
  );
};
