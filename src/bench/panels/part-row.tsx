import type { CapturedReading, Verdict } from '../../../shared/bench/record.ts';
import type { OvenPart } from '../../../shared/oven/oven.ts';
import { settingOf } from '../../../shared/instruments/meters.ts';
import { benchClock } from '../../components/bench-clock.ts';
import { useBench } from '../../simulation/bench-context.ts';
import { readingText } from './readings-by-part.ts';

const looks: Record<Verdict, string> = {
  good: 'bg-safe-tint text-safe border-safe',
  faulty: 'bg-danger-tint text-danger border-danger',
  'not tested': 'bg-paper text-ink-2 border-edge',
};

const ReadingLine = ({ reading }: { reading: CapturedReading }) => {
  const meter = useBench(({ setup }) => setup.meter);
  const setting = settingOf(meter, reading.setting)?.name ?? reading.setting;
  return (
    <li className="font-mono text-xs text-ink-2">
      <span className="text-ink">
        {reading.red} – {reading.black}
      </span>{' '}
      {readingText(reading, setting)}
      <span className="sr-only">, at {benchClock(reading.benchMs)}</span>
    </li>
  );
};

interface Props {
  part: OvenPart;
  readings: readonly CapturedReading[];
}

/** One part on the job sheet: what was read, and the verdict. */
export const PartRow = ({ part, readings }: Props) => {
  const verdict = useBench(({ state }) => state.sheet.verdicts[part.ref] ?? 'not tested');
  const isReplaced = useBench(({ state }) => state.replaced.includes(part.ref));
  const run = useBench((store) => store.run);
  return (
    <li className="grid grid-cols-[1fr_auto] items-center gap-x-2 border-b border-line py-1.5">
      <div className="min-w-0">
        <p className="text-sm font-semibold">
          {part.name} <span className="font-mono text-xs">{part.ref}</span>
          {isReplaced ? <span className="text-xs font-normal text-ink-2">, replaced</span> : null}
        </p>
        {readings.length > 0 ? (
          <ul>
            {readings.map((reading) => (
              <ReadingLine
                key={`${reading.benchMs} ${reading.red} ${reading.black}`}
                reading={reading}
              />
            ))}
          </ul>
        ) : null}
      </div>
      <select
        aria-label={`Verdict on ${part.name} ${part.ref}`}
        value={verdict}
        onChange={(event) =>
          run({
            type: 'GiveVerdict',
            data: { part: part.ref, verdict: event.target.value as Verdict },
          })
        }
        className={`min-h-7 rounded border px-1 font-mono text-xs font-semibold ${looks[verdict]}`}
      >
        <option>not tested</option>
        <option>good</option>
        <option>faulty</option>
      </select>
    </li>
  );
};
