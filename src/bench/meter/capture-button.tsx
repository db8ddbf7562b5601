import { PencilLine } from 'lucide-react';
import { useBench } from '../../simulation/bench-context.ts';

/** Puts what the display shows on the job sheet. */
export const CaptureButton = () => {
  const run = useBench((store) => store.run);
  return (
    <button
      type="button"
      aria-keyshortcuts="c"
      onClick={() => run({ type: 'CaptureReading', data: {} })}
      className="flex h-7 items-center justify-center gap-1.5 rounded-[5px] bg-bench-ink px-2 text-sm font-semibold whitespace-nowrap text-mat-deep hover:bg-white focus-visible:outline-white"
    >
      <PencilLine aria-hidden size={14} />
      Write on job sheet
      <kbd className="hidden rounded border border-bench-line px-1 font-mono text-xs min-[860px]:inline">
        C
      </kbd>
    </button>
  );
};
