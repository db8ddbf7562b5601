import { useEffect, useRef } from 'react';
import { useBench } from '../../simulation/bench-context.ts';
import { BenchButton } from './bench-button.tsx';
import { IconX } from './icon-x.tsx';
import { runWords } from './run-words.ts';

const orders = [
  [10, '10 s'],
  [30, '30 s'],
  [60, '1 min'],
  [120, '2 min'],
] as const;

/** The control panel's keys or its knob, and what the last run looked, sounded and felt like. */
export const RunPanel = ({ onClose }: { onClose: () => void }) => {
  const operate = useBench((store) => store.operate);
  const running = useBench((store) => store.running);
  const last = useBench(({ state }) => state.runs.at(-1));
  const isTimed = useBench(({ setup }) => setup.oven.definition.control === 'mechanical timer');
  const panel = useRef<HTMLElement>(null);
  useEffect(() => panel.current?.focus(), []);
  return (
    <section
      ref={panel}
      tabIndex={-1}
      aria-label="Run the oven"
      className="absolute bottom-2 left-2 z-[5] grid w-[320px] max-w-[calc(100%-16px)] gap-2.5 rounded-lg border border-bench-ink-2 bg-mat-deep p-3 text-bench-ink shadow-xl outline-none"
    >
      <div className="flex items-start justify-between gap-2">
        <p className="text-sm">
          A jug of 1000 g of water stands inside.{' '}
          {isTimed ? 'Turn the timer to a time.' : 'Set a time and press start.'}
        </p>
        <IconX name="Close" onPress={onClose} />
      </div>
      <div className="flex flex-wrap gap-2">
        {orders.map(([seconds, name]) => (
          <BenchButton
            key={seconds}
            aria-disabled={running !== null}
            onClick={() => void operate(seconds)}
          >
            Run {name}
          </BenchButton>
        ))}
      </div>
      {running === null ? null : (
        <label className="grid gap-1 text-sm">
          The oven runs for {running} s
          <progress className="h-2 w-full accent-[var(--color-safe)]" />
        </label>
      )}
      {last && running === null ? (
        <dl aria-label="Last run" className="grid gap-1 border-t border-bench-line pt-2 text-sm">
          {runWords(last).map(({ label, value }) => (
            <div key={label} className="grid grid-cols-[84px_1fr]">
              <dt className="text-bench-ink-2">{label}</dt>
              <dd className="font-semibold">{value}</dd>
            </div>
          ))}
        </dl>
      ) : null}
    </section>
  );
};
