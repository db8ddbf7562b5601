import { useMemo, useRef } from 'react';
import type { BenchState } from '../../../shared/bench/bench-state.ts';
import type { ShownReading } from '../../../shared/bench/record.ts';
import type { Setup } from '../../../shared/bench/setup.ts';
import { settingOf } from '../../../shared/instruments/meters.ts';
import type { OvenLayout } from '../../../shared/oven/layout.ts';
import { buildScene } from '../geometry/build-scene.ts';
import { drawBench } from '../geometry/draw-bench.ts';
import { BenchCanvas } from '../layers/bench-canvas.tsx';
import { Lcd } from '../meter/lcd.tsx';
import { benchColours } from '../panels/bench-colours.ts';
import { sceneHand } from '../panels/scene-hand.ts';
import { targetWords } from '../panels/target-words.ts';
import { useBenchCamera } from '../panels/use-bench-camera.ts';
import { useBoxSize } from '../panels/use-box-size.ts';

interface Props {
  setup: Setup;
  layout: OvenLayout;
  state: BenchState;
  reading: ShownReading | null;
  /** target of the hazard of this moment */ flash: string | null;
}

/** The bench of one moment, to be looked at: it can be zoomed and moved, and nothing can be done on it. */
export const ReplayView = ({ setup, layout, state, reading, flash }: Props) => {
  const { definition } = setup.oven;
  const box = useRef<HTMLDivElement>(null);
  const from = useRef<readonly [number, number] | null>(null);
  const view = useBoxSize(box);
  const camera = useBenchCamera(view, false);
  const drawing = useMemo(() => drawBench(definition, layout), [definition, layout]);
  const scene = useMemo(
    () =>
      buildScene(
        drawing,
        state.oven,
        sceneHand(definition, state, {
          hand: { kind: 'empty' },
          handAt: null,
          hovered: null,
          focused: null,
          hazardFlash: flash,
          run: null,
        }),
      ),
    [drawing, definition, state, flash],
  );
  const setting = settingOf(setup.meter, state.meter.setting);
  const under = (probe: 'red' | 'black'): string => {
    const target = state.probes[probe];
    return target === null
      ? 'nothing'
      : `${target} ${targetWords(definition, state, target).short}`;
  };
  return (
    <div style={benchColours} className="overflow-hidden rounded-md bg-mat text-bench-ink">
      <div ref={box} className="relative aspect-[1000/760] max-h-[70dvh] w-full">
        {view.width > 0 ? (
          <BenchCanvas
            scene={scene}
            camera={camera.camera}
            width={view.width}
            height={view.height}
            onPointer={(event) => {
              if (event.kind === 'down') from.current = event.screen;
              if (event.kind === 'move' && from.current) {
                camera.pan([event.screen[0] - from.current[0], event.screen[1] - from.current[1]]);
                from.current = event.screen;
              }
              if (event.kind === 'up' || event.kind === 'cancel') from.current = null;
            }}
            onWheel={(event) => {
              if (event.isPinch) camera.wheel(event);
              else window.scrollBy({ top: event.deltaY });
            }}
            onPinch={camera.pinch}
          />
        ) : null}
      </div>
      <div className="grid grid-cols-[minmax(150px,220px)_1fr] items-center gap-3 border-t border-bench-line bg-mat-deep p-3">
        <Lcd
          isSmall
          display={reading?.display ?? ''}
          unit={reading?.unit ?? ''}
          marks={{
            mode: state.meter.isDestroyed ? 'destroyed' : '',
            relative: state.meter.relative === null ? '' : 'REL',
            range: setting?.name ?? '',
            status:
              reading === null
                ? ''
                : reading.isBeeping
                  ? 'beeps'
                  : reading.isSettled
                    ? 'settled'
                    : 'settling',
          }}
        />
        <div className="grid gap-0.5 text-sm">
          <p>Red on {under('red')}</p>
          <p>Black on {under('black')}</p>
        </div>
      </div>
    </div>
  );
};
