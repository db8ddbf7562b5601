import { useBench } from '../../simulation/bench-context.ts';
import { targetWords } from '../panels/target-words.ts';

/** What is under one tip, in words. */
export const ProbeLine = ({ probe }: { probe: 'red' | 'black' }) => {
  const words = useBench(({ setup, state }) =>
    targetWords(setup.oven.definition, state, state.probes[probe]),
  );
  return (
    <p className="flex min-w-0 items-center gap-1.5 text-xs text-bench-ink">
      <span
        aria-hidden
        className={`size-2.5 shrink-0 rounded-full border border-bench-ink-2 ${probe === 'red' ? 'bg-probe-red' : 'bg-probe-black'}`}
      />
      <span className="sr-only">{probe} probe: </span>
      <span className="truncate" title={words}>
        {words}
      </span>
    </p>
  );
};
