import type { RecordedEvent } from '../../../../shared/bench/event.ts';
import type { Attempt } from '../../../../shared/contracts/attempts.ts';
import type { OvenDefinition } from '../../../../shared/oven/oven.ts';
import type { CurveStep, StepCurve } from '../../../../shared/reasoning/step-curve.ts';
import { benchClock } from '../../../components/bench-clock.ts';
import { Failed } from '../../../components/failed.tsx';
import { Loading } from '../../../components/loading.tsx';
import { canReason } from '../../../simulation/ask-reasoning.ts';
import { useStepCurve } from '../api/use-step-curve.ts';
import { StepCurveChart } from './step-curve-chart.tsx';

interface Props {
  attempt: Attempt;
  definition: OvenDefinition | undefined;
  events: readonly RecordedEvent[];
  goTo: (sequence: number) => void;
}

/** The faults left after each reading, beside the best measurement there was at that moment. */
export const Narrowing = ({ attempt, definition, events, goTo }: Props) => {
  const curve = useStepCurve(attempt, definition, events);
  if (!canReason()) return null;
  return (
    <section aria-labelledby="narrowing" className="grid min-w-0 grid-cols-1 gap-3">
      <h2 id="narrowing" className="text-xl font-bold">
        What your readings left
      </h2>
      {curve.isPending ? (
        <Loading what="what each reading says, from 25 drawn ovens" />
      ) : curve.isError ? (
        <Failed
          what="What your readings left"
          problem={curve.error}
          retry={() => void curve.refetch()}
        />
      ) : curve.data.steps.length === 0 ? (
        <p className="text-ink-2">
          No settled resistance reading between two terminals was written on the job sheet, so
          nothing was ruled out by measuring.
        </p>
      ) : (
        <Curve curve={curve.data} goTo={goTo} />
      )}
    </section>
  );
};

const Curve = ({ curve, goTo }: { curve: StepCurve; goTo: (sequence: number) => void }) => (
  <>
    <p className="max-w-[72ch]">
      How many faults, alone or in a likely pair, still explained every reading. The hollow mark is
      where the measurement that tells most per second of work would have come to on average.
    </p>
    <div className="overflow-x-auto rounded-md border border-line bg-sheet p-3">
      <StepCurveChart curve={curve} />
    </div>
    <details className="rounded-md border border-line bg-sheet">
      <summary className="min-h-9 cursor-pointer px-3 py-2 font-semibold">
        The same as a table
      </summary>
      <div className="overflow-x-auto">
        <table className="w-full min-w-[620px] border-collapse text-left">
          <caption className="sr-only">Faults left after each reading</caption>
          <thead className="border-y border-edge text-sm">
            <tr>
              {[
                'Time',
                'Reading',
                'Faults left',
                'Best measurement then',
                'It would have left',
              ].map((head) => (
                <th key={head} scope="col" className="px-3 py-2">
                  {head}
                </th>
              ))}
            </tr>
          </thead>
          <tbody>
            {curve.steps.map((step) => (
              <Step key={step.sequence} step={step} goTo={goTo} />
            ))}
          </tbody>
        </table>
      </div>
    </details>
  </>
);

const Step = ({ step, goTo }: { step: CurveStep; goTo: (sequence: number) => void }) => {
  const { reading, best, benchMs, sequence, left } = step;
  return (
    <tr className="border-b border-line last:border-b-0">
      <td className="px-3 py-2">
        <button
          type="button"
          className="font-mono text-act underline underline-offset-2"
          onClick={() => goTo(sequence)}
        >
          {benchClock(benchMs)}
        </button>
      </td>
      <th scope="row" className="px-3 py-2 font-mono text-sm font-normal">
        {reading.red}–{reading.black} {reading.display}{' '}
        {reading.display === 'OL' ? '' : reading.unit}
      </th>
      <td className="px-3 py-2 font-mono text-sm">{left}</td>
      <td className="px-3 py-2">{best?.label ?? 'none worth the work'}</td>
      <td className="px-3 py-2 font-mono text-sm">{best ? Math.round(best.left) : '–'}</td>
    </tr>
  );
};
