import { useEffect, useRef, useState } from 'react';
import type { RecordedEvent } from '../../../shared/bench/event.ts';
import type { MeterDefinition } from '../../../shared/instruments/meter.ts';
import { benchClock } from '../../components/bench-clock.ts';
import { logLine } from '../panels/log-line.ts';

/** px */
const row = 30;
const beyond = 8;

interface Props {
  events: readonly RecordedEvent[];
  meter: MeterDefinition;
  /** sequence */ at: number;
  onSeek: (at: number) => void;
}

/** Every event in one line; only those in view are in the page, for an attempt may have thousands. */
export const EventList = ({ events, meter, at, onSeek }: Props) => {
  const box = useRef<HTMLDivElement>(null);
  const [top, setTop] = useState(0);
  const [height, setHeight] = useState(300);
  const first = Math.max(0, Math.floor(top / row) - beyond);
  const shown = events.slice(first, first + Math.ceil(height / row) + 2 * beyond);

  useEffect(() => {
    const { current } = box;
    if (!current) return;
    const y = at * row;
    const isSeen = y >= current.scrollTop && y + row <= current.scrollTop + current.clientHeight;
    if (!isSeen) current.scrollTop = y - current.clientHeight / 2;
  }, [at]);

  return (
    // Out of the flow: the list is as high as what stands beside it, not as its thousands of lines.
    <div className="relative min-h-[220px]">
      <div
        ref={box}
        className="absolute inset-0 overflow-y-auto rounded-md border border-line bg-sheet"
        onScroll={({ currentTarget }) => {
          setTop(currentTarget.scrollTop);
          setHeight(currentTarget.clientHeight);
        }}
      >
        <ol
          aria-label="Events"
          className="relative"
          style={{ height: events.length * row, paddingTop: first * row }}
        >
          {shown.map((event) => (
            <li
              key={event.sequence}
              aria-setsize={events.length}
              aria-posinset={event.sequence + 1}
              style={{ height: row }}
            >
              <button
                type="button"
                aria-current={event.sequence === at ? 'step' : undefined}
                onClick={() => onSeek(event.sequence)}
                className={`grid h-full w-full grid-cols-[52px_1fr] items-center gap-2 px-2 text-left font-mono text-xs hover:bg-act-tint aria-[current=step]:bg-act-tint aria-[current=step]:font-semibold ${
                  event.type === 'HazardHappened' ? 'text-danger' : ''
                }`}
              >
                <span className="text-ink-2">{benchClock(event.benchMs)}</span>
                <span className="truncate">{logLine(meter, event)}</span>
              </button>
            </li>
          ))}
        </ol>
      </div>
    </div>
  );
};
