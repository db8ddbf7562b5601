import { Meter } from '../meter/meter.tsx';
import { ToolCards } from './tool-cards.tsx';

/** Below the mat: the meter, always visible, and the tools. */
export const Dock = () => (
  <div className="flex h-[196px] gap-4 border-t border-bench-line bg-mat-deep p-3.5">
    <Meter />
    <ToolCards />
  </div>
);
