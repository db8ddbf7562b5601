import { useBench } from '../../simulation/bench-context.ts';
import { heldFirst, holdWords } from '../panels/hold-words.ts';
import { targetWords } from '../panels/target-words.ts';

/** What is under one tip, in words. */
export const ProbeLine = ({ probe }: { probe: 'red' | 'black' }) => {
  const definition = useBench(({ setup }) => setup.oven.definition);
  const state = useBench((store) => store.state);
  const target = state.probes[probe];
  const words = targetWords(definition, state, target);
  const held = holdWords[state.holds[probe]];
  return (
    <p
      title={target === null ? undefined : `${target}, ${words.full}${held}`}
      className="flex min-w-0 items-center gap-1.5 text-xs text-bench-ink"
    >
      <span
        aria-hidden
        className={`size-2.5 shrink-0 rounded-full border border-bench-ink-2 ${probe === 'red' ? 'bg-probe-red' : 'bg-probe-black'}`}
      />
      <span className="sr-only">{probe} probe on </span>
      {target === null ? null : <b className="font-mono font-semibold">{target}</b>}
      <span aria-hidden className="truncate">
        {heldFirst[state.holds[probe]]}
        {words.short}
      </span>
      <span className="sr-only">
        {words.full}
        {held}
      </span>
    </p>
  );
};
