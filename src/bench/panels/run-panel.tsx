import { useEffect, useRef } from 'react';
import type { LastingCommand } from '../../../shared/bench/lasting.ts';
import { runWords } from '../../../shared/bench/run-words.ts';
import { useBench } from '../../simulation/bench-context.ts';
import { BenchButton } from './bench-button.tsx';
import { checkWords } from './check-words.ts';
import { IconX } from './icon-x.tsx';
import { WordList } from './word-list.tsx';

const orders = [
  [10, '10 s'],
  [30, '30 s'],
  [60, '1 min'],
  [120, '2 min'],
  [300, '5 min'],
] as const;

const checks: readonly { name: string; command: LastingCommand }[] = [
  { name: 'Survey the door', command: { type: 'SurveyLeakage', data: {} } },
  { name: 'Open it slowly', command: { type: 'CheckInterlocks', data: {} } },
];

/** The control panel's keys or its knob, the checks of a finished repair, and what came of them last. */
export const RunPanel = ({ onClose }: { onClose: () => void }) => {
  const operate = useBench((store) => store.operate);
  const run = useBench((store) => store.run);
  const running = useBench((store) => store.running);
  const last = useBench(({ state }) => state.runs.at(-1));
  const events = useBench((store) => store.events);
  const isTimed = useBench(({ setup }) => setup.oven.definition.control === 'mechanical timer');
  const select = useBench((store) => store.select);
  const door = useBench(
    ({ setup }) => setup.oven.definition.parts.find(({ kind }) => kind === 'chassis')?.ref ?? 'CH',
  );
  const panel = useRef<HTMLElement>(null);
  useEffect(() => panel.current?.focus(), []);
  const lasting = ({ name, command }: (typeof checks)[number]) => (
    <BenchButton key={name} aria-disabled={running !== null} onClick={() => void operate(command)}>
      {name}
    </BenchButton>
  );
  return (
    <section
      ref={panel}
      tabIndex={-1}
      aria-label="Run the oven"
      className="pointer-events-auto grid min-h-0 w-[340px] max-w-full gap-2.5 overflow-y-auto rounded-lg border border-bench-ink-2 bg-mat-deep p-3 text-bench-ink shadow-xl outline-none"
    >
      <div className="flex items-start justify-between gap-2">
        <p className="text-sm">
          A jug of 1000 g of water stands inside.{' '}
          {isTimed ? 'Turn the timer to a time.' : 'Set a time and press start.'}
        </p>
        <IconX name="Close" onPress={onClose} />
      </div>
      <div className="flex flex-wrap gap-2">
        {orders.map(([seconds, name]) =>
          lasting({
            name: `Run ${name}`,
            command: { type: 'RunOven', data: { ordered: seconds } },
          }),
        )}
      </div>
      <div role="group" aria-label="Checks after a repair" className="grid gap-1.5">
        <p className="text-sm text-bench-ink-2">
          Checks after a repair: leakage at 5 cm with 275 ml inside, the door chain, earth and
          insulation.
        </p>
        <div className="flex flex-wrap gap-2">
          {checks.map(lasting)}
          <BenchButton onClick={() => run({ type: 'TestFromPlug', data: {} })}>
            Test from the plug
          </BenchButton>
          <BenchButton onClick={() => select({ kind: 'part', ref: door })}>The door</BenchButton>
        </div>
      </div>
      {running === null ? (
        <>
          <WordList name="Last run" lines={last ? runWords(last) : []} />
          <WordList name="Checks so far" lines={checkWords(events)} />
        </>
      ) : (
        <label className="grid gap-1 text-sm">
          The oven runs for {running} s
          <progress className="h-2 w-full accent-[var(--color-safe)]" />
        </label>
      )}
    </section>
  );
};
