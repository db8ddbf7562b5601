import { Maximize, Minus, Plus, Printer } from 'lucide-react';
import { BenchButton } from '../panels/bench-button.tsx';
import { IconX } from '../panels/icon-x.tsx';

interface Props {
  zoom: (by: number) => void;
  onFit: () => void;
  isWhole: boolean;
  onWhole: () => void;
  onClose: () => void;
}

/** Over the sheet: its size, its place, the printer. */
export const DiagramBar = ({ zoom, onFit, isWhole, onWhole, onClose }: Props) => (
  <div className="flex items-center gap-1 px-2.5 py-1.5">
    <h2 className="mr-auto text-sm font-semibold">Wiring diagram</h2>
    <span role="group" aria-label="Size of the diagram" className="flex gap-1">
      <BenchButton aria-label="Smaller" title="Smaller" onClick={() => zoom(0.8)}>
        <Minus aria-hidden size={16} />
      </BenchButton>
      <BenchButton aria-label="Larger" title="Larger" onClick={() => zoom(1.25)}>
        <Plus aria-hidden size={16} />
      </BenchButton>
      <BenchButton aria-label="Show the whole sheet" title="Show the whole sheet" onClick={onFit}>
        <Maximize aria-hidden size={16} />
      </BenchButton>
    </span>
    <BenchButton className="max-[1099px]:hidden" aria-pressed={isWhole} onClick={onWhole}>
      Wide
    </BenchButton>
    <BenchButton aria-label="Print the diagram" onClick={() => window.print()}>
      <Printer aria-hidden size={16} />
      Print
    </BenchButton>
    <IconX name="Close the diagram" onPress={onClose} />
  </div>
);
