import { Pause, Play, SkipBack, SkipForward } from 'lucide-react';
import type { ReactNode } from 'react';
import type { RecordedEvent } from '../../../shared/bench/event.ts';
import type { MeterDefinition } from '../../../shared/instruments/meter.ts';
import { benchClock } from '../../components/bench-clock.ts';
import { logLine } from '../panels/log-line.ts';

export const speeds = [1, 4, 16] as const;

interface Props {
  events: readonly RecordedEvent[];
  meter: MeterDefinition;
  at: number;
  onSeek: (at: number) => void;
  isPlaying: boolean;
  onPlay: () => void;
  speed: number;
  onSpeed: (speed: number) => void;
}

const Round = (props: {
  name: string;
  isDisabled?: boolean;
  onPress: () => void;
  children: ReactNode;
}) => (
  <button
    type="button"
    aria-label={props.name}
    title={props.name}
    disabled={props.isDisabled}
    onClick={props.onPress}
    className="flex size-9 shrink-0 items-center justify-center rounded-md border border-edge bg-sheet text-act hover:bg-act-tint disabled:opacity-50"
  >
    {props.children}
  </button>
);

/** Play, step and seek; the scrubber stops at events only, because only there something happened. */
export const PlayerBar = (props: Props) => {
  const { events, meter, at, onSeek, isPlaying, onPlay, speed, onSpeed } = props;
  const last = events.length - 1;
  const event = events[at];
  const moment = event ? `${benchClock(event.benchMs)}, ${logLine(meter, event)}` : '';
  return (
    <div role="group" aria-label="Replay" className="flex flex-wrap items-center gap-2">
      <Round name="One event back" isDisabled={at <= 0} onPress={() => onSeek(at - 1)}>
        <SkipBack aria-hidden size={16} />
      </Round>
      <Round name={isPlaying ? 'Pause' : 'Play'} onPress={onPlay}>
        {isPlaying ? <Pause aria-hidden size={16} /> : <Play aria-hidden size={16} />}
      </Round>
      <Round name="One event on" isDisabled={at >= last} onPress={() => onSeek(at + 1)}>
        <SkipForward aria-hidden size={16} />
      </Round>
      <input
        type="range"
        aria-label="Moment of the attempt"
        aria-valuetext={moment}
        min={0}
        max={Math.max(0, last)}
        step={1}
        value={at}
        onChange={({ target }) => onSeek(Number(target.value))}
        className="h-9 min-w-[160px] flex-1 accent-act"
      />
      <span className="font-mono text-sm font-semibold tabular-nums">
        {benchClock(event?.benchMs ?? 0)}
        <span className="font-normal text-ink-2"> / {benchClock(events[last]?.benchMs ?? 0)}</span>
      </span>
      <div role="group" aria-label="Speed" className="flex">
        {speeds.map((one) => (
          <button
            key={one}
            type="button"
            aria-pressed={one === speed}
            onClick={() => onSpeed(one)}
            className="-ml-px min-h-9 border border-edge bg-sheet px-2.5 font-mono text-sm font-semibold text-act first:rounded-l-md last:rounded-r-md hover:bg-act-tint aria-pressed:bg-act aria-pressed:text-on-act"
          >
            {one}x
          </button>
        ))}
      </div>
    </div>
  );
};
