import { useMemo } from 'react';
import type { RecordedEvent } from '../../../../shared/bench/event.ts';
import type { ServiceMeasurement } from '../../../../shared/oven/oven.ts';
import { DataTable } from '../../../components/table/data-table.tsx';
import { useSortInUrl } from '../../../components/table/use-sort-in-url.ts';
import { capturedReadings } from '../captured-readings.ts';
import { readingColumns } from '../reading-columns.tsx';
import { serviceLineOf } from '../service-line.ts';

interface Props {
  events: readonly RecordedEvent[];
  serviceData: readonly ServiceMeasurement[];
  goTo: (sequence: number) => void;
}

/** What was written on the job sheet, beside what the service data gives for a good part. */
export const ReadingsTable = ({ events, serviceData, goTo }: Props) => {
  const [sort, setSort] = useSortInUrl('time');
  const columns = useMemo(() => readingColumns(goTo), [goTo]);
  const rows = useMemo(
    () =>
      capturedReadings(events).map((captured) => ({
        ...captured,
        line: serviceLineOf(captured.reading, serviceData),
      })),
    [events, serviceData],
  );
  return (
    <section aria-labelledby="readings" className="grid gap-3">
      <h2 id="readings" className="text-xl font-bold">
        Readings on the job sheet
      </h2>
      {rows.length === 0 ? (
        <p className="text-ink-2">No reading was written on the job sheet.</p>
      ) : (
        <DataTable
          caption="Readings on the job sheet"
          columns={columns}
          rows={rows}
          rowId={({ sequence }) => String(sequence)}
          sort={sort}
          onSort={setSort}
        />
      )}
    </section>
  );
};
