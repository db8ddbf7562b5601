import { useMemo } from 'react';
import { useBench } from '../../simulation/bench-context.ts';
import { chipsFor, type Chip } from './chips.ts';
import { useWide } from './use-wide.ts';

const lamps: Record<Chip['tone'], string> = {
  safe: 'bg-safe-lamp',
  caution: 'bg-caution-lamp',
  plain: 'bg-bench-ink-2',
};

/** What the trainee can know of the bench, in one row. */
export const StateChips = () => {
  const definition = useBench(({ setup }) => setup.oven.definition);
  const state = useBench((store) => store.state);
  const events = useBench((store) => store.events);
  const chips = useMemo(() => chipsFor(definition, state, events), [definition, state, events]);
  const isWide = useWide(700);
  return (
    <ul
      aria-label="State of the bench"
      // Below 700 px it scrolls sideways, and the keyboard must be able to.
      tabIndex={isWide ? undefined : 0}
      className="flex gap-2 max-[700px]:gap-1.5 max-[700px]:overflow-x-auto min-[700px]:flex-wrap"
    >
      {chips.map(({ tone, text }) => (
        <li
          key={text}
          className="flex shrink-0 items-center gap-2 rounded-md border border-bench-line bg-mat-deep px-2.5 py-1 font-mono text-xs font-semibold text-bench-ink"
        >
          <span aria-hidden className={`size-2 rounded-full ${lamps[tone]}`} />
          {text}
        </li>
      ))}
    </ul>
  );
};
