import { X } from 'lucide-react';
import type { ReactNode } from 'react';
import { useBench, useBenchApi } from '../../simulation/bench-context.ts';
import { nameOfHand } from '../tools/catalogue.ts';
import { takenOff } from '../tools/taken-off.ts';
import type { Hand } from '../tools/tool.ts';
import { useToolDrag } from './use-tool-drag.ts';

interface Props {
  hand: Hand;
  /** short, on the button */ children: ReactNode;
  /** where it sits; null: nowhere */ target?: string | null;
  shortcut?: string;
}

const isSame = (a: Hand, b: Hand): boolean =>
  a.kind === b.kind &&
  (a.kind !== 'probe' || b.kind !== 'probe' || a.probe === b.probe) &&
  (a.kind !== 'battery-clip' || b.kind !== 'battery-clip' || a.clip === b.clip);

/** Takes a tool into the hand or puts it down; says where it sits, and takes it off there. */
export const ToolButton = ({ hand, children, target = null, shortcut }: Props) => {
  const bench = useBenchApi();
  const isInHand = useBench((store) => isSame(store.hand, hand));
  const drag = useToolDrag(hand);
  const name = nameOfHand(hand);
  const toggle = (): void => {
    const { take, putDown } = bench.getState();
    if (isInHand) putDown();
    else take(hand);
  };
  const takeOff = (): void => {
    const { state, run, putDown } = bench.getState();
    if (isInHand) return putDown();
    const command = takenOff(hand, state);
    if (command) run(command);
  };
  return (
    <span className="flex min-w-0 items-stretch">
      <button
        type="button"
        aria-pressed={isInHand}
        aria-label={`${name}${target === null ? '' : `, on ${target}`}`}
        aria-keyshortcuts={shortcut}
        onClick={toggle}
        {...drag}
        className={`flex h-[26px] min-w-0 grow touch-none items-center gap-1 rounded border px-1 text-xs font-semibold ${
          isInHand
            ? 'border-act bg-act text-on-act'
            : 'border-bench-line bg-mat-deep text-bench-ink hover:border-bench-ink-2'
        }`}
      >
        {children}
        <span className="ml-auto truncate font-mono">{target ?? ''}</span>
      </button>
      {target !== null ? (
        <button
          type="button"
          aria-label={`Take ${name} off ${target}`}
          title="Take off"
          onClick={takeOff}
          className="-ml-px flex w-6 shrink-0 items-center justify-center rounded border border-bench-line text-bench-ink hover:border-bench-ink-2"
        >
          <X aria-hidden size={13} />
        </button>
      ) : null}
    </span>
  );
};
