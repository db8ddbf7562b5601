import type { Mark } from '../../../../shared/assessment/debrief.ts';
import type { ServiceMeasurement } from '../../../../shared/oven/oven.ts';
import { Failed } from '../../../components/failed.tsx';
import { Loading } from '../../../components/loading.tsx';
import type { useEvents } from '../api/use-events.ts';
import { ReadingsTable } from './readings-table.tsx';
import { Timeline } from './timeline.tsx';

interface Props {
  events: ReturnType<typeof useEvents>;
  marks: readonly Mark[];
  serviceData: readonly ServiceMeasurement[];
  moment: number | null;
  goTo: (sequence: number) => void;
}

/** What happened on the bench, and what was measured. */
export const BenchRecord = ({ events, marks, serviceData, moment, goTo }: Props) => {
  if (events.isPending) return <Loading what="the timeline" />;
  if (events.isError)
    return (
      <Failed what="The timeline" problem={events.error} retry={() => void events.refetch()} />
    );
  return (
    <>
      <Timeline events={events.data} marks={marks} moment={moment} goTo={goTo} />
      <ReadingsTable events={events.data} serviceData={serviceData} goTo={goTo} />
    </>
  );
};
