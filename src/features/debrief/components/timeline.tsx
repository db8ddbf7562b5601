import { useEffect, useRef } from 'react';
import { describeEvent } from '../../../../shared/bench/describe.ts';
import type { RecordedEvent } from '../../../../shared/bench/event.ts';
import type { Mark } from '../../../../shared/assessment/debrief.ts';
import { benchClock } from '../../../components/bench-clock.ts';
import { pointsText } from '../points-text.ts';

interface Props {
  events: readonly RecordedEvent[];
  marks: readonly Mark[];
  moment: number | null;
  goTo: (sequence: number) => void;
}

interface LineProps {
  event: RecordedEvent;
  marks: readonly Mark[];
  isMoment: boolean;
  goTo: (sequence: number) => void;
}

const Line = ({ event, marks, isMoment, goTo }: LineProps) => {
  const line = useRef<HTMLButtonElement>(null);
  // A mark was pressed, or the address named this moment: the focus brings it into view.
  useEffect(() => {
    if (isMoment) line.current?.focus();
  }, [isMoment]);
  return (
    <li>
      <button
        ref={line}
        type="button"
        aria-current={isMoment || undefined}
        onClick={() => goTo(event.sequence)}
        className="grid min-h-8 w-full grid-cols-[64px_1fr] gap-x-3 rounded px-3 py-1 text-left hover:bg-act-tint aria-[current=true]:bg-act-tint sm:grid-cols-[72px_1fr_auto]"
      >
        <span className="font-mono text-sm text-ink-2">{benchClock(event.benchMs)}</span>
        <span className="first-letter:uppercase">{describeEvent(event)}</span>
        {marks.length === 0 ? null : (
          <span className="col-start-2 font-mono text-sm font-semibold sm:col-start-3">
            {marks.map(({ points }) => pointsText(points)).join(' ')}
          </span>
        )}
      </button>
    </li>
  );
};

/** All that happened on the bench, in words, by bench time. */
export const Timeline = ({ events, marks, moment, goTo }: Props) => (
  <section aria-labelledby="timeline" className="grid gap-3">
    <h2 id="timeline" className="text-xl font-bold">
      What you did
    </h2>
    <ol className="grid max-h-[560px] overflow-y-auto rounded-md border border-line bg-sheet py-2">
      {events.map((event) => (
        <Line
          key={event.sequence}
          event={event}
          marks={marks.filter(({ sequence }) => sequence === event.sequence)}
          isMoment={moment === event.sequence}
          goTo={goTo}
        />
      ))}
    </ol>
  </section>
);
