import type { ServiceMeasurement } from '../../../../shared/oven/oven.ts';
import type { RecordedEvent } from '../../../../shared/bench/event.ts';
import { benchClock } from '../../../components/bench-clock.ts';
import { Badge } from '../../../components/badge.tsx';
import { capturedReadings, type Captured } from '../captured-readings.ts';
import { isWithin, limitsText, placeOnBar, serviceLineOf } from '../service-line.ts';
import { RangeBar } from './range-bar.tsx';

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

interface Props {
  events: readonly RecordedEvent[];
  serviceData: readonly ServiceMeasurement[];
  goTo: (sequence: number) => void;
}

const head = 'px-3 py-2 text-left text-sm font-semibold whitespace-nowrap';
const cell = 'px-3 py-2 align-top';

/** What was written on the job sheet, beside what the service data gives for a good part. */
export const ReadingsTable = ({ events, serviceData, goTo }: Props) => {
  const captured = capturedReadings(events);
  return (
    <section aria-labelledby="readings" className="grid gap-3">
      <h2 id="readings" className="text-xl font-bold">
        Readings on the job sheet
      </h2>
      {captured.length === 0 ? (
        <p className="text-ink-2">No reading was written on the job sheet.</p>
      ) : (
        <div
          tabIndex={0}
          role="region"
          aria-labelledby="readings"
          className="overflow-x-auto rounded-md border border-line bg-sheet"
        >
          <table className="w-full border-collapse">
            <thead className="border-b border-edge">
              <tr>
                {['Time', 'Between', 'Reading', 'Service data', 'Against it'].map((name) => (
                  <th key={name} scope="col" className={head}>
                    {name}
                  </th>
                ))}
              </tr>
            </thead>
            <tbody>
              {captured.map(({ sequence, benchMs, reading }) => {
                const line = serviceLineOf(reading, serviceData);
                return (
                  <tr key={sequence} className="border-b border-line last:border-b-0">
                    <td className={cell}>
                      <button
                        type="button"
                        onClick={() => goTo(sequence)}
                        className="min-h-6 rounded font-mono text-sm text-act underline underline-offset-2"
                      >
                        {benchClock(benchMs)}
                      </button>
                    </td>
                    <td className={`${cell} font-mono text-sm whitespace-nowrap`}>
                      {reading.red} – {reading.black}
                    </td>
                    <td className={`${cell} font-mono text-sm font-semibold whitespace-nowrap`}>
                      {reading.display} {reading.unit}
                    </td>
                    <td className={`${cell} whitespace-nowrap`}>
                      {line ? (
                        <>
                          {line.label} <span className="font-mono text-sm">{limitsText(line)}</span>
                        </>
                      ) : (
                        <span className="text-ink-2">none for this pair</span>
                      )}
                    </td>
                    <td className={cell}>
                      {line ? <Against reading={reading} line={line} /> : '–'}
                    </td>
                  </tr>
                );
              })}
            </tbody>
          </table>
        </div>
      )}
    </section>
  );
};
