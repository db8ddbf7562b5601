import { memo, useCallback } from 'react';
import type { Camera } from '../camera/camera.ts';
import type { BenchScene } from '../geometry/bench-scene.ts';
import { labelDetail } from '../geometry/label-detail.ts';
import { paintLabel, paintReference } from '../glyphs/label/paint-label.ts';
import { Painted } from '../glyphs/paint/painted.tsx';
import type { Pen } from '../glyphs/paint/pen.ts';
import { paintTerminal } from '../glyphs/terminal/paint-terminal.ts';
import { BenchLayer } from './bench-layer.tsx';
import { useSameValue } from './use-same-value.ts';

/** Every target that can be reached, over the leads, with its name; and the names of the parts. */
export const TerminalsLayer = memo(function TerminalsLayer({
  scene,
  camera,
}: {
  scene: BenchScene;
  camera: Camera;
}) {
  const terminals = useSameValue(
    scene.terminals
      .filter(({ isReachable }) => isReachable)
      .map(({ at, state, probes, label }) => ({ at, state, probes, label })),
  );
  const names = useSameValue(
    scene.parts
      .filter(({ kind }) => !scene.isCoverOn || kind === 'plug')
      .flatMap(({ ref, label }) => (label === null ? [] : [{ ref, label }])),
  );
  const { isTerminalNamed, referenceSize } = labelDetail(camera.zoom);
  const paint = useCallback(
    (pen: Pen) => {
      if (isTerminalNamed)
        for (const { label } of terminals) if (label) paintLabel(pen, label, 'terminal');
      for (const { ref, label } of names)
        if (referenceSize === null) paintLabel(pen, label, 'part');
        else paintReference(pen, ref, label, referenceSize);
      for (const terminal of terminals) paintTerminal(pen, terminal);
    },
    [terminals, names, isTerminalNamed, referenceSize],
  );
  return (
    <BenchLayer camera={camera}>
      <Painted paint={paint} />
    </BenchLayer>
  );
});
