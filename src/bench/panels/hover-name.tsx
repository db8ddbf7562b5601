import type { RefObject } from 'react';
import { useBench } from '../../simulation/bench-context.ts';
import { hintForHand, nameOfHand } from '../tools/catalogue.ts';
import { hoverWords } from './hover-words.ts';

/** Beside the pointer: what lies under it. Its place is set from outside, move by move. */
export const HoverName = ({
  place,
  isHidden,
}: {
  place: RefObject<HTMLDivElement | null>;
  isHidden: boolean;
}) => {
  const words = useBench(({ setup, state, hovered }) => {
    const found = hovered === null ? null : hoverWords(setup.oven.definition, state, hovered);
    return found && `${found.ref}\n${found.words}`;
  });
  const [ref, name] = words?.split('\n') ?? [];
  return (
    <div
      ref={place}
      aria-hidden
      data-off="true"
      className="pointer-events-none absolute top-0 left-0 z-[2] max-w-[240px] rounded-[7px] bg-mat-deep px-2.5 py-1 shadow-lg data-[off=true]:hidden"
      hidden={words === null || isHidden}
    >
      <p className="font-mono text-xs font-semibold text-caution">{ref}</p>
      <p className="text-sm text-bench-ink">{name}</p>
    </div>
  );
};

/** What is in the hand and what to do next. */
export const HandHint = () => {
  const hand = useBench((store) => store.hand);
  const state = useBench((store) => store.state);
  const putDown = useBench((store) => store.putDown);
  if (hand.kind === 'empty') return null;
  return (
    <div className="pointer-events-auto flex max-w-full items-center gap-3 rounded-md border border-act bg-mat-deep py-1 pr-1 pl-3 text-sm leading-snug text-bench-ink shadow-lg">
      <p>
        <b className="inline-block font-semibold first-letter:uppercase">
          {nameOfHand(hand)} in hand.
        </b>{' '}
        {hintForHand(hand, state)}
      </p>
      <button
        type="button"
        onClick={putDown}
        className="min-h-7 shrink-0 rounded border border-bench-line px-2 font-semibold hover:border-bench-ink-2"
      >
        Put down <kbd className="font-mono text-xs text-bench-ink-2">Esc</kbd>
      </button>
    </div>
  );
};
