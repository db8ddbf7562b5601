import { CaptureButton } from '../meter/capture-button.tsx';
import { Keys } from '../meter/keys.tsx';
import { LiveLcd } from '../meter/meter.tsx';
import { ProbeLine } from '../meter/probe-line.tsx';
import { ToolRow } from './tool-cards.tsx';

/** Pinned at the bottom of a small screen: display, keys in a row that scrolls, tools in another. */
export const CompactDock = () => (
  <div className="grid gap-1.5 border-t border-bench-line bg-mat-deep px-2 pt-2 pb-2.5">
    <div className="grid grid-cols-[minmax(0,1fr)_174px] gap-2">
      <LiveLcd isSmall />
      <div className="grid min-w-0 content-between gap-1">
        <ProbeLine probe="red" />
        <ProbeLine probe="black" />
        <CaptureButton />
      </div>
    </div>
    <Keys className="flex gap-1 overflow-x-auto pb-0.5 [&_button]:shrink-0 [&_button]:px-2 [&_button]:h-8 [&_span]:shrink-0 [&_span]:h-8 [&_span]:pl-1" />
    <ToolRow />
  </div>
);
