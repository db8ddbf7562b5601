import { useEffect, useState } from 'react';
import { benchClock } from '../../components/bench-clock.ts';
import { useBench } from '../../simulation/bench-context.ts';

/** Bench time, running. */
export const BenchTime = () => {
  const clock = useBench((store) => store.clock);
  const [ms, setMs] = useState(() => clock.now());
  useEffect(() => {
    const timer = setInterval(() => setMs(clock.now()), 250);
    return () => clearInterval(timer);
  }, [clock]);
  return (
    <span role="timer" aria-label="Bench time" className="font-mono text-base font-semibold">
      {benchClock(ms)}
    </span>
  );
};
