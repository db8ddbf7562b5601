import { useQueryClient } from '@tanstack/react-query';
import { lazy, Suspense, useEffect, useRef, useState } from 'react';
import { useNavigate } from 'react-router-dom';
import { BenchContext, useBench } from '../../simulation/bench-context.ts';
import type { OpenedBench } from '../../simulation/open-bench.ts';
import { useMeterTick } from '../../simulation/use-meter-tick.ts';
import { Announcer } from '../mirror/announcer.tsx';
import { ActionBar } from './action-bar.tsx';
import { benchColours } from './bench-colours.ts';
import { BenchHeader, type DrawerName } from './bench-header.tsx';
import { CompactDock } from './compact-dock.tsx';
import { Dock } from './dock.tsx';
import { HandIn } from './hand-in.tsx';
import { JobSheet } from './job-sheet.tsx';
import { LeftColumn } from './left-column.tsx';
import { Mat } from './mat.tsx';
import { MatContext, matLink } from './mat-context.ts';
import { RecordBanner } from './record-banner.tsx';
import { ShortcutsList } from './shortcuts-list.tsx';
import { SideColumn } from './side-column.tsx';
import { useAwayPause } from './use-away-pause.ts';
import { useShortcuts } from './use-shortcuts.ts';
import { useWide } from './use-wide.ts';

const DiagramPanel = lazy(async () => {
  const { DiagramPanel: panel } = await import('../diagram/diagram-panel.tsx');
  return { default: panel };
});

interface Props {
  opened: OpenedBench;
  again: (how: { steal: boolean }) => void;
}

/** Below this the dock has no room for meter and tools side by side. */
const dockWidth = 860;

const Workplace = ({ opened }: { opened: OpenedBench }) => {
  // Pulling the cord ends what the panel tells of: it closes.
  const isCordIn = useBench(({ state }) => state.isCordIn);
  const [openedWithCord, setOpenedWithCord] = useState<'in' | 'out' | null>(null);
  const isRunOpen = openedWithCord === (isCordIn ? 'in' : 'out');
  const [isListOpen, setIsListOpen] = useState(false);
  const [isDiagramOpen, setIsDiagramOpen] = useState(false);
  const [isHelpOpen, setIsHelpOpen] = useState(false);
  const place = useRef<HTMLElement>(null);
  const [mat] = useState(matLink);
  const isWide = useWide(dockWidth);
  const focusIn = (query: string): void =>
    place.current?.querySelector<HTMLElement>(query)?.focus({ preventScroll: true });
  const onKeyDown = useShortcuts(
    () => setIsHelpOpen(true),
    () => focusIn('[data-mirror][tabindex="0"]'),
    mat.cancel,
  );
  useMeterTick();
  return (
    <MatContext value={mat}>
      <main
        ref={place}
        aria-label="Bench"
        style={benchColours}
        onKeyDown={onKeyDown}
        className="grid min-h-0 min-w-0 grid-rows-[1fr_auto_auto] bg-mat text-bench-ink"
      >
        <div className="relative flex min-h-0 min-w-0">
          <div className="grid min-h-0 min-w-0 flex-1">
            <Mat
              layout={opened.layout}
              isRunOpen={isRunOpen}
              onRunClose={() => setOpenedWithCord(null)}
              isListOpen={isListOpen}
              onListClose={() => setIsListOpen(false)}
              onLeave={() => focusIn('[role="toolbar"] button')}
            />
          </div>
          {isDiagramOpen ? (
            <Suspense>
              <DiagramPanel
                layout={opened.layout}
                onClose={() => {
                  setIsDiagramOpen(false);
                  focusIn('[role="toolbar"] [data-opens="diagram"]');
                }}
              />
            </Suspense>
          ) : null}
        </div>
        <ActionBar
          isRunOpen={isRunOpen}
          onRun={() => setOpenedWithCord(isRunOpen ? null : isCordIn ? 'in' : 'out')}
          isListOpen={isListOpen}
          onList={() => setIsListOpen(!isListOpen)}
          isDiagramOpen={isDiagramOpen}
          onDiagram={() => setIsDiagramOpen(!isDiagramOpen)}
        />
        {isWide ? <Dock /> : <CompactDock />}
      </main>
      <ShortcutsList isOpen={isHelpOpen} onClose={() => setIsHelpOpen(false)} />
      <Announcer />
    </MatContext>
  );
};

/** One attempt on the bench, with its ticket and its job sheet. */
export const BenchRoom = ({ opened, again }: Props) => {
  const { attempt, bench, outbox } = opened;
  const [drawer, setDrawer] = useState<DrawerName | null>(null);
  const navigate = useNavigate();
  const queries = useQueryClient();
  useAwayPause(opened);

  useEffect(
    () =>
      bench.subscribe((now, before) => {
        const isStored = now.save.kind === 'saved' && before.save.kind !== 'saved';
        if (!now.state.isHandedIn || !isStored) return;
        void queries.invalidateQueries();
        void navigate(`/attempts/${attempt.id}`);
      }),
    [bench, attempt.id, navigate, queries],
  );

  const retry = (): void => void outbox?.flush();
  return (
    <BenchContext value={bench}>
      <title>{`${attempt.title} – Coldbench`}</title>
      <div className="grid h-dvh grid-rows-[52px_auto_minmax(0,1fr)] overflow-hidden bg-paper text-ink">
        <BenchHeader attempt={attempt} open={drawer} onOpen={setDrawer} onRetry={retry}>
          <HandIn onHandedIn={retry} />
        </BenchHeader>
        <div>
          <RecordBanner
            setAside={opened.setAside}
            onContinueHere={() => again({ steal: true })}
            onSetAside={() => void opened.setStepsAside().then(() => again({ steal: false }))}
            onRetry={retry}
          />
        </div>
        <div className="grid min-h-0 grid-rows-[minmax(0,1fr)] min-[1100px]:grid-cols-[292px_minmax(0,1fr)_312px]">
          <SideColumn
            side="left"
            name="Job ticket, log and service data"
            isOpen={drawer === 'left'}
            onClose={() => setDrawer(null)}
          >
            <LeftColumn attempt={attempt} />
          </SideColumn>
          <Workplace opened={opened} />
          <SideColumn
            side="right"
            name="Job sheet"
            isOpen={drawer === 'right'}
            onClose={() => setDrawer(null)}
          >
            <JobSheet />
          </SideColumn>
        </div>
      </div>
    </BenchContext>
  );
};
