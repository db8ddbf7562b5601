import { useEffect, useMemo, useState } from 'react';
import type { RecordedEvent } from '../../../shared/bench/event.ts';
import { hazard } from '../../../shared/bench/record.ts';
import { makeSetup } from '../../../shared/bench/setup.ts';
import type { Attempt } from '../../../shared/contracts/attempts.ts';
import type { OvenLayout } from '../../../shared/oven/layout.ts';
import type { OvenDefinition } from '../../../shared/oven/oven.ts';
import { Failed } from '../../components/failed.tsx';
import { Loading } from '../../components/loading.tsx';
import { useOven } from '../../features/ovens/api/use-oven.ts';
import { EventList } from './event-list.tsx';
import { PlayerBar } from './player-bar.tsx';
import { pauseBefore } from './playing.ts';
import { replay } from './replay.ts';
import { ReplayView } from './replay-view.tsx';
import { shownThen } from './shown-then.ts';

export interface ReplayPanelProps {
  attempt: Attempt;
  /** the whole record, sequence 0 first */ events: readonly RecordedEvent[];
  /** sequence of the moment shown */ at: number;
  onSeek: (at: number) => void;
}

/** An attempt watched again: bench, meter and events at one moment, played or stepped. */
export const ReplayPanel = (props: ReplayPanelProps) => {
  const { oven: id } = props.attempt.content;
  const oven = useOven(id);
  if (oven.isPending) return <Loading what="the oven" rows={2} />;
  if (oven.isError)
    return <Failed what="The oven" problem={oven.error} retry={() => void oven.refetch()} />;
  return <Player {...props} definition={oven.data.definition} layout={oven.data.layout} />;
};

interface PlayerProps extends ReplayPanelProps {
  definition: OvenDefinition;
  layout: OvenLayout;
}

const Player = ({ attempt, events, at: asked, onSeek, definition, layout }: PlayerProps) => {
  const setup = useMemo(
    () => makeSetup({ ...attempt.content, definition, seed: attempt.seed }),
    [attempt, definition],
  );
  const recorded = useMemo(() => replay(setup, events), [setup, events]);
  const [isPlaying, setIsPlaying] = useState(false);
  const [speed, setSpeed] = useState(1);
  const at = Math.max(0, Math.min(asked, recorded.last));
  const state = useMemo(() => recorded.stateAt(at), [recorded, at]);
  const isAtEnd = at >= recorded.last;

  useEffect(() => {
    if (!isPlaying || isAtEnd) return undefined;
    const timer = setTimeout(() => onSeek(at + 1), pauseBefore(events[at], events[at + 1], speed));
    return () => clearTimeout(timer);
  }, [isPlaying, isAtEnd, at, events, speed, onSeek]);

  const seek = (to: number): void => {
    setIsPlaying(false);
    onSeek(to);
  };
  const event = events[at];
  const hazardNow = event?.type === 'HazardHappened' ? hazard.safeParse(event.data) : null;
  return (
    <section aria-label="Replay" className="grid gap-3">
      <PlayerBar
        events={events}
        meter={setup.meter}
        at={at}
        onSeek={seek}
        isPlaying={isPlaying && !isAtEnd}
        onPlay={() => {
          if (isAtEnd) onSeek(0);
          setIsPlaying(isAtEnd || !isPlaying);
        }}
        speed={speed}
        onSpeed={setSpeed}
      />
      <div className="grid gap-3 min-[900px]:grid-cols-[minmax(0,1fr)_300px]">
        <ReplayView
          setup={setup}
          layout={layout}
          state={state}
          reading={shownThen(events, at, state)}
          flash={hazardNow?.success ? hazardNow.data.at : null}
        />
        <EventList events={events} meter={setup.meter} at={at} onSeek={seek} />
      </div>
    </section>
  );
};
