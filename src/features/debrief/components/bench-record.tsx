import { lazy, Suspense, useEffect, useState, type RefObject } from 'react';
import type { Mark } from '../../../../shared/assessment/debrief.ts';
import type { Attempt } from '../../../../shared/contracts/attempts.ts';
import type { RecordedEvent } from '../../../../shared/bench/event.ts';
import { Loading } from '../../../components/loading.tsx';
import { Timeline } from './timeline.tsx';

// The canvas is most of the code of this page: the words need not wait for it.
const ReplayPanel = lazy(async () => {
  const { ReplayPanel: loaded } = await import('../../../bench/replay/replay-panel.tsx');
  return { default: loaded };
});

const meanwhile = (
  <div className="min-h-[480px]">
    <Loading what="the replay" rows={2} />
  </div>
);

interface Props {
  attempt: Attempt;
  events: readonly RecordedEvent[];
  marks: readonly Mark[];
  moment: number | null;
  /** shows a moment where the person looks already */ seek: (sequence: number) => void;
  /** shows a moment and brings the replay into view */ jump: (sequence: number) => void;
  replay: RefObject<HTMLDivElement | null>;
}

/** What happened on the bench, watched again and in words. */
export const BenchRecord = (props: Props) => {
  const { attempt, events, marks, moment, seek, jump, replay } = props;
  // The address that opened this page named a moment: begin there.
  const [opensAtMoment] = useState(moment !== null);
  useEffect(() => {
    if (opensAtMoment) replay.current?.focus();
  }, [opensAtMoment, replay]);
  return (
    <>
      <div
        ref={replay}
        tabIndex={-1}
        role="group"
        aria-labelledby="replay"
        className="grid scroll-mt-4 gap-3 outline-none"
      >
        <h2 id="replay" className="text-xl font-bold">
          Replay
        </h2>
        <Suspense fallback={meanwhile}>
          <ReplayPanel attempt={attempt} events={events} at={moment ?? 0} onSeek={seek} />
        </Suspense>
      </div>
      <Timeline events={events} marks={marks} moment={moment} goTo={jump} />
    </>
  );
};
