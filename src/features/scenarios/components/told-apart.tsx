import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { useFormContext, useWatch } from 'react-hook-form';
import type { AppliedFault } from '../../../../shared/oven/fault.ts';
import type { OvenDefinition } from '../../../../shared/oven/oven.ts';
import type { ToldApart as Found } from '../../../../shared/reasoning/told-apart.ts';
import type { ScenarioContent } from '../../../../shared/scenario/scenario.ts';
import { Button } from '../../../components/button.tsx';
import { Failed } from '../../../components/failed.tsx';
import { Loading } from '../../../components/loading.tsx';
import { askReasoning, canReason } from '../../../simulation/ask-reasoning.ts';
import { faultName, partName } from '../../debrief/part-name.ts';
import { useOven } from '../../ovens/api/use-oven.ts';

const minutes = (seconds: number): string => {
  const whole = Math.round(seconds);
  return whole < 60 ? `${whole} s` : `${Math.floor(whole / 60)} min ${whole % 60} s`;
};

/** What service data can tell of the faults chosen, and the shortest safe way to them. */
export const ToldApart = () => {
  const { getValues } = useFormContext<ScenarioContent>();
  const oven = useOven(useWatch<ScenarioContent, 'oven'>({ name: 'oven' }));
  const chosen = useWatch<ScenarioContent, 'faults'>({ name: 'faults' });
  const meter = useWatch<ScenarioContent, 'meter'>({ name: 'meter' });
  const [asked, setAsked] = useState<string | null>(null);
  const faults = chosen.filter(({ on, fault }) => on !== '' && fault !== '');
  const question = JSON.stringify({ oven: oven.data?.definition.id, meter, faults });
  const definition = oven.data?.definition;
  const answer = useQuery({
    queryKey: ['told apart', question],
    enabled: asked === question && definition !== undefined,
    queryFn: ({ signal }) =>
      askReasoning<'told apart'>(
        {
          kind: 'told apart',
          definition: definition as OvenDefinition,
          meter: getValues('meter'),
          faults,
        },
        signal,
      ),
    staleTime: Infinity,
    retry: false,
  });
  if (!canReason() || !definition) return null;
  return (
    <section aria-labelledby="told-apart" className="grid min-w-0 grid-cols-1 gap-4">
      <h2 id="told-apart" className="text-xl font-bold">
        What can be found out
      </h2>
      <p className="text-ink-2">
        Which other faults no cold measurement of the service data tells from these, and the
        shortest safe route to them. Computed from 25 drawn ovens; it takes some seconds.
      </p>
      {answer.data ? (
        <Answer found={answer.data} definition={definition} faults={faults} />
      ) : answer.isError ? (
        <Failed
          what="What can be found out"
          problem={answer.error}
          retry={() => void answer.refetch()}
        />
      ) : answer.isFetching ? (
        <Loading what="what can be found out" rows={3} />
      ) : (
        <div>
          <Button onClick={() => setAsked(question)}>Work it out</Button>
        </div>
      )}
    </section>
  );
};

interface AnswerProps {
  found: Found;
  definition: OvenDefinition;
  faults: readonly AppliedFault[];
}

/** As many as can be read; the rest is a number. */
const LISTED = 8;

const Answer = ({ found, definition, faults }: AnswerProps) => {
  const named = (set: readonly AppliedFault[]): string =>
    set.length === 0
      ? 'no fault at all'
      : set
          .map(
            ({ on, fault }) => `${partName(definition, on)}: ${faultName(definition, on, fault)}`,
          )
          .join(', with ');
  return (
    <div className="grid gap-4">
      <div className="grid gap-2">
        <h3 className="font-bold">Cannot be told apart cold</h3>
        {found.alike.length === 0 ? (
          <p>Nothing: the service data tells {named(faults)} from every other fault.</p>
        ) : (
          <>
            <p>
              {found.alike.length} {found.alike.length === 1 ? 'other reads' : 'others read'} the
              same. A look at the part or a run has to decide.
            </p>
            <ul className="grid list-disc gap-1 pl-5">
              {found.alike.slice(0, LISTED).map((set, at) => (
                <li key={at}>{named(set)}</li>
              ))}
              {found.alike.length > LISTED ? <li>and {found.alike.length - LISTED} more</li> : null}
            </ul>
          </>
        )}
      </div>
      <div className="grid gap-2">
        <h3 className="font-bold">
          Shortest safe route, <span className="font-mono">{minutes(found.seconds)}</span>
        </h3>
        <ol className="grid gap-px overflow-hidden rounded-md border border-line bg-line">
          <Step
            label="Cord out, cover off, discharge, prove dead"
            seconds={found.makeSafeSeconds}
            left={found.candidates}
          />
          {found.route.map((step, at) => (
            <Step key={at} {...step} />
          ))}
        </ol>
        {found.isFound ? null : (
          <p>Measuring alone does not settle it: at the end something else is still likelier.</p>
        )}
      </div>
    </div>
  );
};

const Step = ({ label, seconds, left }: Found['route'][number]) => (
  <li className="grid grid-cols-[1fr_auto_auto] items-baseline gap-x-4 bg-sheet px-3 py-2">
    <span>{label}</span>
    <span className="text-right font-mono text-sm text-ink-2">{Math.round(seconds)} s</span>
    <span className="w-[74px] text-right font-mono text-sm">{left} left</span>
  </li>
);
