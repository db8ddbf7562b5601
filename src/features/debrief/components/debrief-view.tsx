import { useQuery } from '@tanstack/react-query';
import { lazy, Suspense, useCallback, useRef } from 'react';
import type { Attempt } from '../../../../shared/contracts/attempts.ts';
import type { ServiceMeasurement } from '../../../../shared/oven/oven.ts';
import { Failed } from '../../../components/failed.tsx';
import { Loading } from '../../../components/loading.tsx';
import { WhenNear } from '../../../components/when-near.tsx';
import { useOven } from '../../ovens/api/use-oven.ts';
import { debriefQuery } from '../api/debrief-query.ts';
import { useEvents } from '../api/use-events.ts';
import { useMoment } from '../hooks/use-moment.ts';
import { Narrowing } from './narrowing.tsx';
import { Outcome } from './outcome.tsx';
import { Skills } from './skills.tsx';

// Describing events and faults takes the whole bench with it: the outcome and the skills stand before.
const BenchRecord = lazy(async () => {
  const { BenchRecord: loaded } = await import('./bench-record.tsx');
  return { default: loaded };
});
const ReadingsTable = lazy(async () => {
  const { ReadingsTable: loaded } = await import('./readings-table.tsx');
  return { default: loaded };
});
const TrueFaults = lazy(async () => {
  const { TrueFaults: loaded } = await import('./true-faults.tsx');
  return { default: loaded };
});

const noServiceData: readonly ServiceMeasurement[] = [];

/** The debrief of an attempt that was handed in. */
export const DebriefView = ({ attempt }: { attempt: Attempt }) => {
  const debrief = useQuery(debriefQuery(attempt.id));
  const events = useEvents(attempt.id);
  const oven = useOven(attempt.content.oven);
  const [moment, seek] = useMoment();
  const replay = useRef<HTMLDivElement>(null);
  const jump = useCallback(
    (sequence: number): void => {
      seek(sequence);
      replay.current?.focus();
    },
    [seek],
  );
  const timeOf = (sequence: number): number | undefined =>
    events.data?.find((event) => event.sequence === sequence)?.benchMs;
  if (debrief.isPending) return <Loading what="the debrief" />;
  if (debrief.isError)
    return (
      <Failed what="The debrief" problem={debrief.error} retry={() => void debrief.refetch()} />
    );
  const { skills, faults } = debrief.data;
  return (
    <>
      <Outcome debrief={debrief.data} />
      <Skills skills={skills} moment={moment} timeOf={timeOf} goTo={jump} />
      <WhenNear what="the replay, the timeline and the readings" isWanted={moment !== null}>
        <Suspense fallback={<Loading what="the timeline" rows={8} />}>
          {events.isPending ? (
            <Loading what="the timeline" />
          ) : events.isError ? (
            <Failed
              what="The timeline"
              problem={events.error}
              retry={() => void events.refetch()}
            />
          ) : (
            <BenchRecord
              attempt={attempt}
              events={events.data}
              marks={skills.flatMap((skill) => skill.marks)}
              moment={moment}
              seek={seek}
              jump={jump}
              replay={replay}
            />
          )}
          {events.isSuccess ? (
            <Narrowing
              attempt={attempt}
              definition={oven.data?.definition}
              events={events.data}
              goTo={jump}
            />
          ) : null}
          <TrueFaults faults={faults} definition={oven.data?.definition} />
          {events.isSuccess ? (
            <ReadingsTable
              events={events.data}
              serviceData={oven.data?.definition.serviceData ?? noServiceData}
              goTo={jump}
            />
          ) : null}
        </Suspense>
      </WhenNear>
    </>
  );
};
