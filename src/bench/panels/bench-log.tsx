import { useEffect, useRef } from 'react';
import { benchClock } from '../../components/bench-clock.ts';
import { useBench } from '../../simulation/bench-context.ts';
import { logLine } from './log-line.ts';
import { PanelSection } from './panel-section.tsx';

/** Older lines are in the replay. */
const shown = 200;

/** What was done, the newest in view. */
export const BenchLog = () => {
  const events = useBench((store) => store.events);
  const meter = useBench(({ setup }) => setup.meter);
  const list = useRef<HTMLOListElement>(null);
  const first = Math.max(0, events.length - shown);

  useEffect(() => {
    const { current } = list;
    if (current) current.scrollTop = current.scrollHeight;
  }, [events]);

  return (
    <PanelSection title="Bench log">
      <ol
        ref={list}
        tabIndex={0}
        aria-label="Bench log"
        className="grid max-h-[232px] content-start gap-1 overflow-y-auto font-mono text-xs"
      >
        {events.slice(first).map((event, i) => (
          <li
            key={first + i}
            className={`grid grid-cols-[44px_1fr] ${event.type === 'HazardHappened' ? 'font-semibold text-danger' : 'text-ink-2'}`}
          >
            <span>{benchClock(event.benchMs)}</span>
            <span>{logLine(meter, event)}</span>
          </li>
        ))}
      </ol>
    </PanelSection>
  );
};
