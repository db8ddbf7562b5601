import type { KeyboardEvent } from 'react';
import { neighbour, type Direction } from '../mirror/neighbour.ts';
import type { DiagramEntry } from './diagram-entries.ts';

const arrows: Readonly<Record<string, Direction>> = {
  ArrowLeft: 'left',
  ArrowRight: 'right',
  ArrowUp: 'up',
  ArrowDown: 'down',
};

interface Keyboard {
  entries: readonly DiagramEntry[];
  stop: DiagramEntry | undefined;
  focusOn: (entry: DiagramEntry | null | undefined) => void;
  pick: (entry: DiagramEntry) => void;
}

/** Keys as on the bench: arrows to the neighbouring terminal, page keys through everything, Enter to pick. */
export function pressDiagramKey(event: KeyboardEvent, keyboard: Keyboard): void {
  const { entries, stop, focusOn, pick } = keyboard;
  if (event.ctrlKey || event.altKey || event.metaKey || !stop) return;
  const direction = arrows[event.key];
  const at = entries.indexOf(stop);
  const targets = entries.filter(({ kind }) => kind === 'target');
  const acts: Readonly<Record<string, () => void>> = {
    PageDown: () => focusOn(entries[at + 1]),
    PageUp: () => focusOn(entries[at - 1]),
    Home: () => focusOn(entries[0]),
    End: () => focusOn(entries.at(-1)),
    Enter: () => pick(stop),
    ' ': () => pick(stop),
  };
  const act = direction ? () => focusOn(neighbour(stop, targets, direction)) : acts[event.key];
  if (!act) return;
  event.preventDefault();
  event.stopPropagation();
  act();
}
