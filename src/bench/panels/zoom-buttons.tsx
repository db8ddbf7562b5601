import { Maximize, Minus, Plus } from 'lucide-react';
import type { ReactNode } from 'react';
import type { BenchCamera } from './use-bench-camera.ts';

const ZoomButton = (props: { name: string; onPress: () => void; children: ReactNode }) => (
  <button
    type="button"
    aria-label={props.name}
    title={props.name}
    onClick={props.onPress}
    className="flex size-7 items-center justify-center rounded border border-bench-line bg-mat-deep text-bench-ink hover:border-bench-ink-2"
  >
    {props.children}
  </button>
);

export const ZoomButtons = ({ camera }: { camera: BenchCamera }) => (
  <div role="group" aria-label="View" className="flex shrink-0 gap-1">
    <ZoomButton name="Smaller" onPress={() => camera.zoom(0.8)}>
      <Minus aria-hidden size={16} />
    </ZoomButton>
    <ZoomButton name="Larger" onPress={() => camera.zoom(1.25)}>
      <Plus aria-hidden size={16} />
    </ZoomButton>
    <ZoomButton name="Fit the bench" onPress={camera.fit}>
      <Maximize aria-hidden size={16} />
    </ZoomButton>
  </div>
);
