import { useState } from 'react';
import { describeEvent } from '../../../../shared/bench/describe.ts';
import type { RecordedEvent } from '../../../../shared/bench/event.ts';
import { undonePlaces } from '../../../../shared/bench/undone.ts';
import type { Mark } from '../../../../shared/assessment/debrief.ts';
import { benchClock } from '../../../components/bench-clock.ts';
import { Checkbox } from '../../../components/checkbox.tsx';
import { unseen } from '../unseen.ts';
import { pointsText } from '../points-text.ts';

interface LineProps {
  event: RecordedEvent;
  marks: readonly Mark[];
  isMoment: boolean;
  /** taken back later */ isUndone: boolean;
  goTo: (sequence: number) => void;
}

const Line = ({ event, marks, isMoment, isUndone, goTo }: LineProps) => {
  const note = isUndone ? 'Taken back by a step back.' : unseen(event);
  return (
    <li>
      <button
        type="button"
        aria-current={isMoment ? 'step' : undefined}
        onClick={() => goTo(event.sequence)}
        className="grid min-h-8 w-full grid-cols-[64px_1fr] gap-x-3 rounded px-3 py-1 text-left hover:bg-act-tint aria-[current=step]:bg-act-tint sm:grid-cols-[72px_1fr_auto]"
      >
        <span className="pt-px font-mono text-sm text-ink-2">{benchClock(event.benchMs)}</span>
        <span
          className={`first-letter:uppercase ${event.type === 'HazardHappened' ? 'font-semibold text-danger' : ''}`}
        >
          {describeEvent(event)}
          {note === '' ? null : <span className="block text-sm text-ink-2">{note}</span>}
        </span>
        {marks.length === 0 ? null : (
          <span className="col-start-2 font-mono text-sm font-semibold sm:col-start-3">
            {marks.map(({ points }) => pointsText(points)).join(' ')}
          </span>
        )}
      </button>
    </li>
  );
};

interface Props {
  events: readonly RecordedEvent[];
  marks: readonly Mark[];
  moment: number | null;
  goTo: (sequence: number) => void;
}

/** What happened on the bench, in words, by bench time: first the moments that counted, all on request. */
export const Timeline = ({ events, marks, moment, goTo }: Props) => {
  const [isWhole, setIsWhole] = useState(false);
  const undone = undonePlaces(events);
  const counted = new Set(marks.map(({ sequence }) => sequence));
  const shown = isWhole
    ? events
    : events.filter(({ type, sequence }) => type === 'HazardHappened' || counted.has(sequence));
  return (
    <section aria-labelledby="timeline" className="grid gap-3">
      <div className="flex flex-wrap items-center justify-between gap-x-6 gap-y-2">
        <h2 id="timeline" className="text-xl font-bold">
          Timeline
        </h2>
        <Checkbox
          label={`Show all ${events.length} events, not only those that counted`}
          checked={isWhole}
          onChange={({ target }) => setIsWhole(target.checked)}
        />
      </div>
      {shown.length === 0 ? (
        <p className="text-ink-2">No moment of this attempt earned or cost a mark.</p>
      ) : (
        <ol className="grid max-h-[560px] overflow-y-auto rounded-md border border-line bg-sheet py-2">
          {shown.map((event) => (
            <Line
              key={event.sequence}
              event={event}
              marks={marks.filter(({ sequence }) => sequence === event.sequence)}
              isMoment={moment === event.sequence}
              isUndone={undone.has(event.sequence)}
              goTo={goTo}
            />
          ))}
        </ol>
      )}
    </section>
  );
};
