import type { ProbeHold } from '../../../shared/bench/record.ts';
import { useBench } from '../../simulation/bench-context.ts';
import { holdChoices } from './hold-words.ts';

/** How a probe is held: its handle adds nothing, a clip lead 0.2 Ω, fingers on both tips 1 MΩ across them. */
export const HoldChoice = ({ probe }: { probe: 'red' | 'black' }) => {
  const hold = useBench(({ state }) => state.holds[probe]);
  const run = useBench((store) => store.run);
  return (
    <select
      aria-label={`How the ${probe} probe is held`}
      value={hold}
      onChange={({ target }) =>
        run({ type: 'HoldProbe', data: { probe, hold: target.value as ProbeHold } })
      }
      className={`h-[26px] min-w-0 grow rounded border bg-mat-deep text-xs font-semibold text-bench-ink hover:border-bench-ink-2 ${
        hold === 'fingers' ? 'border-caution' : 'border-bench-line'
      }`}
    >
      {holdChoices.map(([value, , words]) => (
        <option key={value} value={value}>
          {words}
        </option>
      ))}
    </select>
  );
};
