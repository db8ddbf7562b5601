import { useContext, useEffect, useMemo, useRef, useState } from 'react';
import type { OvenLayout } from '../../../shared/oven/layout.ts';
import { useBench, useBenchApi } from '../../simulation/bench-context.ts';
import { toBench, toScreen } from '../camera/camera.ts';
import type { BenchPoint } from '../geometry/bench-point.ts';
import { buildScene } from '../geometry/build-scene.ts';
import { BenchCanvas } from '../layers/bench-canvas.tsx';
import type { BenchPointerEvent } from '../layers/use-stage-events.ts';
import { mirrorGroups } from '../mirror/mirror-entries.ts';
import { Mirror } from '../mirror/mirror.tsx';
import { HandHint, HoverName } from './hover-name.tsx';
import { MatContext } from './mat-context.ts';
import { HazardNotice, RefusalNotice } from './notice-panel.tsx';
import { placeBeside } from './place-beside.ts';
import { placeHover } from './place-hover.ts';
import { placeOf } from './place-of.ts';
import { RunPanel } from './run-panel.tsx';
import { sceneHand } from './scene-hand.ts';
import { SelectionPanel } from './selection-panel.tsx';
import { StateChips } from './state-chips.tsx';
import { useBenchCamera } from './use-bench-camera.ts';
import { useBenchPointer } from './use-bench-pointer.ts';
import { useBoxSize } from './use-box-size.ts';
import { useDrawing, useScene } from './use-scene.ts';
import { ZoomButtons } from './zoom-buttons.tsx';

interface Props {
  layout: OvenLayout;
  isRunOpen: boolean;
  onRunClose: () => void;
  isListOpen: boolean;
  onListClose: () => void;
  /** Escape out of the terminals */ onLeave: () => void;
}

/** px, and the view below which it takes the whole width */
const panelWidth = 300;
const narrow = 560;

/** The mat: the picture of the bench, what is said about it, and its parallel buttons. */
export const Mat = ({ layout, isRunOpen, onRunClose, isListOpen, onListClose, onLeave }: Props) => {
  const bench = useBenchApi();
  const link = useContext(MatContext);
  const definition = useBench(({ setup }) => setup.oven.definition);
  const state = useBench((store) => store.state);
  const selection = useBench((store) => store.selection);
  const isHolding = useBench((store) => store.hand.kind !== 'empty');
  const box = useRef<HTMLDivElement>(null);
  const name = useRef<HTMLDivElement>(null);
  const view = useBoxSize(box);
  const [handAt, setHandAt] = useState<BenchPoint | null>(null);
  const drawing = useDrawing(layout);
  const scene = useScene(drawing, isHolding ? handAt : null, isRunOpen);
  const camera = useBenchCamera(view, !state.isCoverOn);
  // Without what is hovered or carried: a moving pointer leaves the buttons alone.
  const groups = useMemo(
    () =>
      mirrorGroups(
        definition,
        state,
        buildScene(drawing, state.oven, sceneHand(definition, state)),
      ),
    [definition, state, drawing],
  );

  const onMoved = (event: BenchPointerEvent): void => {
    const isGone =
      event.kind === 'leave' ||
      event.kind === 'cancel' ||
      (event.kind === 'up' && event.pointerType === 'touch');
    if (isHolding || handAt !== null) setHandAt(isGone ? null : event.at);
    if (name.current)
      placeHover(name.current, isGone || event.pointerType !== 'mouse' ? null : event.screen, view);
  };
  const pointer = useBenchPointer(scene, camera, onMoved);

  useEffect(() => {
    const benchPoint = (x: number, y: number): BenchPoint | null => {
      const corner = box.current?.getBoundingClientRect();
      if (!corner) return null;
      const [dx, dy] = [x - corner.left, y - corner.top];
      const isOver = dx >= 0 && dy >= 0 && dx <= corner.width && dy <= corner.height;
      return isOver ? toBench(camera.camera, [dx, dy]) : null;
    };
    return link.offer({
      hover: (x, y) => {
        const at = benchPoint(x, y);
        setHandAt(at);
        pointer.apply([{ kind: 'hover', met: at && pointer.world.meet(at) }]);
      },
      drop: (x, y) => {
        const at = benchPoint(x, y);
        setHandAt(null);
        pointer.apply([{ kind: 'drop', met: at && pointer.world.meet(at) }]);
      },
      cancel: pointer.cancel,
    });
  });

  const closeSelection = (): void => {
    const ref = bench.getState().selection?.ref;
    bench.getState().select(null);
    // Whoever works by keyboard goes on from the terminal; for a pointer the bench keeps the focus.
    const button = box.current?.querySelector<HTMLElement>(
      `[data-mirror="${CSS.escape(ref ?? '')}"]`,
    );
    (button?.tabIndex === 0 ? button : box.current)?.focus({ preventScroll: true });
  };
  const place = selection && placeOf(scene, selection.ref);
  const panelStyle =
    view.width < narrow
      ? { left: 8, right: 8, bottom: 8, maxHeight: Math.max(160, view.height * 0.62) }
      : place && placeBeside(toScreen(camera.camera, place), view, panelWidth);

  return (
    <div
      ref={box}
      tabIndex={-1}
      aria-label="Bench"
      role="group"
      className={`relative min-h-0 min-w-0 overflow-hidden bg-mat outline-none ${isHolding ? 'cursor-crosshair' : ''}`}
      onPointerDown={(event) => {
        // The canvas takes no focus of its own, and the bench's keys need it here.
        if (event.target instanceof HTMLCanvasElement) box.current?.focus({ preventScroll: true });
      }}
    >
      {view.width > 0 ? (
        <BenchCanvas
          scene={scene}
          camera={camera.camera}
          width={view.width}
          height={view.height}
          onPointer={pointer.onPointer}
          onWheel={camera.wheel}
          onPinch={camera.pinch}
        />
      ) : null}
      <div className="pointer-events-none absolute inset-x-3 top-2.5 z-[2] flex items-start justify-between gap-2">
        <div className="pointer-events-auto min-w-0">
          <StateChips />
        </div>
        <div className="pointer-events-auto">
          <ZoomButtons camera={camera} />
        </div>
      </div>
      <div className="pointer-events-none absolute inset-x-2 top-12 z-[6] grid max-h-[calc(100%-56px)] justify-items-center">
        <HazardNotice />
      </div>
      <div
        className={`pointer-events-none absolute bottom-2 left-2 flex max-h-[calc(100%-60px)] max-w-[min(440px,calc(100%-16px))] flex-col items-start gap-1.5 ${isRunOpen ? 'z-[5]' : 'z-[2]'}`}
      >
        <RefusalNotice />
        {isRunOpen ? <RunPanel onClose={onRunClose} /> : <HandHint />}
      </div>
      <HoverName place={name} isHidden={selection !== null} />
      {panelStyle ? <SelectionPanel style={panelStyle} onClose={closeSelection} /> : null}
      <Mirror
        groups={groups}
        isShown={isListOpen}
        onHide={onListClose}
        onReveal={camera.reveal}
        onLeave={onLeave}
      />
    </div>
  );
};
