import { useEffect, useRef, useState, type KeyboardEvent } from 'react';
import { useBench, useBenchApi } from '../../simulation/bench-context.ts';
import type { BenchPoint } from '../geometry/bench-point.ts';
import { IconX } from '../panels/icon-x.tsx';
import type { MirrorEntry, MirrorGroup } from './mirror-entries.ts';
import { MirrorGroupList } from './mirror-group-list.tsx';
import { neighbour, type Direction } from './neighbour.ts';
import { findTyped, nothingTyped, typeKey } from './type-ahead.ts';

interface Props {
  groups: readonly MirrorGroup[];
  /** shown as a list beside the picture; else it is there for the keyboard and for screen readers only */
  isShown: boolean;
  onHide: () => void;
  /** brings what has the focus into view on the canvas */ onReveal: (at: BenchPoint) => void;
  /** Escape with nothing to put down */ onLeave: () => void;
}

const arrows: Readonly<Record<string, Direction>> = {
  ArrowLeft: 'left',
  ArrowRight: 'right',
  ArrowUp: 'up',
  ArrowDown: 'down',
};

/** The bench as real buttons: one tab stop, arrow keys to the neighbour on the bench, names by typing. */
export const Mirror = ({ groups, isShown, onHide, onReveal, onLeave }: Props) => {
  const bench = useBenchApi();
  const isCoverOn = useBench(({ state }) => state.isCoverOn);
  const [current, setCurrent] = useState<string | null>(null);
  const [typed, setTyped] = useState(nothingTyped);
  const root = useRef<HTMLElement>(null);
  const entries = groups.flatMap((group) => group.entries);
  const stop = entries.find(({ ref }) => ref === current) ?? entries[0];

  useEffect(() => {
    const timer = setTimeout(() => setTyped(nothingTyped), 1500);
    return () => clearTimeout(timer);
  }, [typed]);

  const focusOn = (entry: MirrorEntry | null | undefined): void =>
    root.current
      ?.querySelector<HTMLElement>(`[data-mirror="${CSS.escape(entry?.ref ?? '')}"]`)
      ?.focus({ preventScroll: !isShown });

  const entryOf = (target: EventTarget): MirrorEntry | undefined => {
    const button = target instanceof HTMLElement ? target.closest('[data-mirror]') : null;
    return entries.find(({ ref }) => ref === button?.getAttribute('data-mirror'));
  };
  const activate = (entry: MirrorEntry | undefined): void => {
    const { tap, select } = bench.getState();
    if (entry?.kind === 'target') tap(entry.ref);
    else if (entry) select({ kind: entry.kind, ref: entry.ref });
  };
  const arriveAt = (entry: MirrorEntry | undefined): void => {
    if (!entry) return;
    setCurrent(entry.ref);
    bench.getState().focus(entry.ref);
    onReveal(entry.at);
  };

  const step = (direction: Direction): void => {
    if (!stop) return;
    const by = direction === 'down' ? 1 : direction === 'up' ? -1 : 0;
    if (isShown && by !== 0) return stepInList(by);
    // Parts and leads lie under and between the terminals: they are reached in the list and by name.
    const terminals = entries.filter(({ kind }) => kind === 'target');
    focusOn(neighbour(stop, terminals, direction));
  };
  const stepInList = (by: number): void => {
    if (stop) focusOn(entries[entries.indexOf(stop) + by]);
  };

  const onKeyDown = (event: KeyboardEvent): void => {
    if (event.ctrlKey || event.altKey || event.metaKey) return;
    const direction = arrows[event.key];
    const handled = (): void => {
      event.preventDefault();
      event.stopPropagation();
    };
    if (direction) {
      handled();
      return step(direction);
    }
    if (event.key === 'PageDown' || event.key === 'PageUp') {
      handled();
      return stepInList(event.key === 'PageDown' ? 1 : -1);
    }
    if (event.key === 'Home' || event.key === 'End') {
      handled();
      return focusOn(event.key === 'Home' ? entries[0] : entries.at(-1));
    }
    const { hand, selection, notice } = bench.getState();
    if (event.key === 'Escape' && hand.kind === 'empty' && !selection && !notice) {
      handled();
      return isShown ? onHide() : onLeave();
    }
    const next = typeKey(typed, event.key, event.timeStamp);
    if (!next) return;
    handled();
    setTyped(next);
    focusOn(findTyped(next, entries));
  };

  return (
    <section
      ref={root}
      aria-label="Bench terminals"
      data-shown={isShown}
      className={
        isShown
          ? 'absolute inset-y-0 right-0 z-[4] flex w-[320px] max-w-full flex-col border-l border-bench-line bg-mat-deep text-bench-ink shadow-xl'
          : 'sr-only'
      }
      onKeyDown={onKeyDown}
      onClick={({ target }) => activate(entryOf(target))}
      onFocus={({ target }) => arriveAt(entryOf(target))}
      onBlur={(event) => {
        if (!event.currentTarget.contains(event.relatedTarget)) bench.getState().focus(null);
      }}
    >
      {isShown ? (
        <div className="flex items-center justify-between px-3 pt-2">
          <h2 className="font-semibold">Terminals</h2>
          <IconX name="Close the list" onPress={onHide} />
        </div>
      ) : null}
      {isCoverOn ? (
        <p className="px-3 py-1 text-sm">The cover is on: nothing inside can be reached.</p>
      ) : null}
      <div className={isShown ? 'grid gap-3 overflow-y-auto p-3' : ''}>
        {groups.map((group) => (
          <MirrorGroupList key={group.id} group={group} stop={stop?.ref ?? null} />
        ))}
      </div>
      {typed.typed === '' ? null : (
        <p
          aria-hidden
          className="fixed bottom-4 left-1/2 z-20 -translate-x-1/2 rounded-md bg-caution px-3 py-1 font-mono text-sm font-semibold text-on-caution"
        >
          Go to {typed.typed.replace(/^\//, '') || '…'}
        </p>
      )}
    </section>
  );
};
