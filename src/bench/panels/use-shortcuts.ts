import type { KeyboardEvent } from 'react';
import { useBenchApi } from '../../simulation/bench-context.ts';
import type { BenchStore } from '../../simulation/bench-store.ts';

export interface Shortcut {
  key: string;
  name: string;
}

/** Single keys, alive only while the focus is on the bench (WCAG 2.1.4). */
export const shortcuts: readonly Shortcut[] = [
  { key: 'R', name: 'Take the red probe' },
  { key: 'B', name: 'Take the black probe' },
  { key: 'C', name: 'Write the reading on the job sheet' },
  { key: 'D', name: 'Take the discharge lead: its clip first, then its tip' },
  { key: 'U', name: 'Step back right after a hazard, in guided practice' },
  { key: 'Esc', name: 'Put down what is in the hand, close what is open' },
  { key: 'Arrows', name: 'Go to the neighbouring terminal' },
  { key: 'Page', name: 'Page down or up: the next or previous terminal, part or lead in the list' },
  { key: 'Enter', name: 'Tap the terminal' },
  { key: '/', name: 'Go to a terminal by name: / C 1 . 2' },
  { key: '?', name: 'Show this list' },
];

const acts: Readonly<Record<string, (store: BenchStore) => void>> = {
  r: ({ take }) => take({ kind: 'probe', probe: 'red' }),
  b: ({ take }) => take({ kind: 'probe', probe: 'black' }),
  c: ({ run }) => run({ type: 'CaptureReading', data: {} }),
  u: ({ run }) => run({ type: 'StepBack', data: {} }),
  d: ({ take, state }) =>
    take(state.discharge.clip === null ? { kind: 'discharge-clip' } : { kind: 'discharge-tip' }),
};

/** Escape closes one thing after the other: the hand first, then what was picked out, then the note. */
function closeOne({ hand, selection, putDown, select, dismiss }: BenchStore): void {
  if (hand.kind !== 'empty') return putDown();
  if (selection) return select(null);
  dismiss();
}

const isTyping = (target: EventTarget): boolean =>
  target instanceof HTMLElement && target.closest('input, textarea, select') !== null;

/** Key handler of the bench's region. `onHelp` shows the list; `cancel` undoes what a pointer has begun. */
export function useShortcuts(onHelp: () => void, onFind: () => void, cancel: () => boolean) {
  const bench = useBenchApi();
  return (event: KeyboardEvent): void => {
    if (event.ctrlKey || event.altKey || event.metaKey || event.repeat) return;
    if (event.key === 'Escape') {
      if (!cancel()) closeOne(bench.getState());
      return;
    }
    if (isTyping(event.target)) return;
    const act = acts[event.key.toLowerCase()];
    if (act) act(bench.getState());
    else if (event.key === '?') onHelp();
    else if (event.key === '/') onFind();
    else return;
    event.preventDefault();
  };
}
