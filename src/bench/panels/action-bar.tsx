import { useBench } from '../../simulation/bench-context.ts';
import { BenchButton } from './bench-button.tsx';

const waits = [
  [10_000, '10 s'],
  [60_000, '1 min'],
  [300_000, '5 min'],
] as const;

interface Props {
  isRunOpen: boolean;
  onRun: () => void;
  isListOpen: boolean;
  onList: () => void;
  isDiagramOpen: boolean;
  onDiagram: () => void;
}

/** What can be done with the oven as a whole, and with time. */
export const ActionBar = (props: Props) => {
  const { isRunOpen, onRun, isListOpen, onList, isDiagramOpen, onDiagram } = props;
  const isCordIn = useBench(({ state }) => state.isCordIn);
  const isCoverOn = useBench(({ state }) => state.isCoverOn);
  const isDoorClosed = useBench(({ state }) => state.oven.isDoorClosed);
  const run = useBench((store) => store.run);
  const wait = useBench((store) => store.wait);
  return (
    <div
      role="toolbar"
      aria-label="Oven and time"
      className="flex items-center gap-1 overflow-x-auto border-t border-bench-line bg-mat-deep px-2 py-1.5"
    >
      <BenchButton onClick={() => run({ type: isCordIn ? 'PullCord' : 'PlugCord', data: {} })}>
        {isCordIn ? 'Pull the cord' : 'Put the cord in'}
      </BenchButton>
      <BenchButton onClick={() => run({ type: isCoverOn ? 'RemoveCover' : 'FitCover', data: {} })}>
        {isCoverOn ? 'Take the cover off' : 'Put the cover on'}
      </BenchButton>
      <BenchButton onClick={() => run({ type: isDoorClosed ? 'OpenDoor' : 'CloseDoor', data: {} })}>
        {isDoorClosed ? 'Open the door' : 'Close the door'}
      </BenchButton>
      <BenchButton aria-expanded={isRunOpen} onClick={onRun}>
        Run the oven
      </BenchButton>
      <span className="ml-auto flex items-center gap-1" role="group" aria-label="Wait">
        <span aria-hidden className="pl-1 text-sm text-bench-ink-2">
          Wait
        </span>
        {waits.map(([ms, name]) => (
          <BenchButton key={ms} aria-label={`Wait ${name}`} onClick={() => wait(ms)}>
            {name}
          </BenchButton>
        ))}
      </span>
      <BenchButton data-opens="diagram" aria-expanded={isDiagramOpen} onClick={onDiagram}>
        Diagram
      </BenchButton>
      <BenchButton aria-expanded={isListOpen} onClick={onList}>
        Terminals
      </BenchButton>
    </div>
  );
};
