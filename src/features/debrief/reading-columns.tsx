import type { ServiceMeasurement } from '../../../shared/oven/oven.ts';
import { heldWords } from '../../../shared/bench/test-leads.ts';
import { Badge } from '../../components/badge.tsx';
import { benchClock } from '../../components/bench-clock.ts';
import type { Column } from '../../components/table/column.ts';
import type { Captured } from './captured-readings.ts';
import { RangeBar } from './components/range-bar.tsx';
import { isWithin, limitsText, placeOnBar } from './service-line.ts';

export interface ReadingRow extends Captured {
  /** what the service data asks here; undefined: nothing */ line: ServiceMeasurement | undefined;
}

const Against = ({ reading, line }: { reading: Captured['reading']; line: ServiceMeasurement }) => {
  const within = isWithin(reading, line);
  const place = placeOnBar(reading, line);
  return (
    <span className="flex flex-wrap items-center gap-x-3 gap-y-1">
      <Badge kind={within ? 'safe' : 'danger'}>{within ? 'within' : 'outside'}</Badge>
      {place === null ? null : <RangeBar place={place} isWithin={within} />}
    </span>
  );
};

export const readingColumns = (goTo: (sequence: number) => void): readonly Column<ReadingRow>[] => [
  {
    id: 'time',
    header: 'Time',
    value: ({ benchMs }) => benchMs,
    cell: ({ sequence, benchMs }) => (
      <button
        type="button"
        onClick={() => goTo(sequence)}
        className="min-h-6 rounded font-mono text-sm text-act underline underline-offset-2"
      >
        {benchClock(benchMs)}
      </button>
    ),
  },
  {
    id: 'between',
    header: 'Between',
    value: ({ reading }) => `${reading.red} – ${reading.black}`,
    cell: ({ reading }) => (
      <span className="font-mono text-sm">
        {reading.red} – {reading.black}
        {reading.held ? (
          <span className="block font-sans text-ink-2">{heldWords(reading.held)}</span>
        ) : null}
      </span>
    ),
  },
  {
    id: 'reading',
    header: 'Reading',
    value: ({ reading }) => reading.value,
    cell: ({ reading }) => (
      <span className="font-mono text-sm font-semibold whitespace-nowrap">
        {reading.display} {reading.unit}
      </span>
    ),
  },
  {
    id: 'service-data',
    header: 'Service data',
    value: ({ line }) => line?.label ?? null,
    cell: ({ line }) =>
      line ? (
        <>
          {line.label}{' '}
          <span className="font-mono text-sm whitespace-nowrap">{limitsText(line)}</span>
        </>
      ) : (
        <span className="text-ink-2">none for this reading</span>
      ),
  },
  {
    id: 'against',
    header: 'Against it',
    value: ({ reading, line }) => (line ? Number(isWithin(reading, line)) : null),
    cell: ({ reading, line }) => (line ? <Against reading={reading} line={line} /> : '–'),
  },
];
