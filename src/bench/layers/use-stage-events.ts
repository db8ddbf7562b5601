import type Konva from 'konva/lib/Core.js';
import { useRef, type RefObject } from 'react';
import { toBench, type Camera } from '../camera/camera.ts';
import {
  followPinch,
  noFingers,
  type FingerEvent,
  type PinchMove,
} from '../camera/pinch-gesture.ts';
import type { BenchPoint } from '../geometry/bench-point.ts';

export interface BenchPointerEvent {
  /** `leave`: a mouse left the canvas; `cancel`: undo what the press began (a second finger, a system gesture) */
  kind: 'move' | 'down' | 'up' | 'cancel' | 'leave';
  /** bench units */ at: BenchPoint;
  /** CSS px from the canvas's upper left corner */ screen: BenchPoint;
  pointerType: 'mouse' | 'touch' | 'pen';
  pointerId: number;
  /** 0 main, 1 middle, 2 second; -1 while moving */ button: number;
}

export interface BenchWheelEvent {
  /** CSS px from the canvas's upper left corner */ screen: BenchPoint;
  deltaX: number;
  deltaY: number;
  /** a pinch on a trackpad */ isPinch: boolean;
}

export interface StageEvents {
  onPointer: (event: BenchPointerEvent) => void;
  onWheel: (event: BenchWheelEvent) => void;
  /** two fingers moved, screen px: hand both pairs to `pinchCamera` */ onPinch: (
    move: PinchMove,
  ) => void;
}

type PointerHandler = (event: { evt: PointerEvent }) => void;

export interface StageHandlers {
  onPointerDown: PointerHandler;
  onPointerMove: PointerHandler;
  onPointerUp: PointerHandler;
  onPointerCancel: PointerHandler;
  onPointerLeave: PointerHandler;
  onWheel: (event: { evt: WheelEvent }) => void;
  onContextMenu: (event: { evt: Event }) => void;
}

/** Turns the Stage's raw events into bench points; keeps two fingers apart from a press. */
export const useStageEvents = (
  stage: RefObject<Konva.Stage | null>,
  camera: Camera,
  events: StageEvents,
): StageHandlers => {
  const fingers = useRef(noFingers);
  const screenOf = (event: MouseEvent): BenchPoint => {
    const corner = stage.current?.container().getBoundingClientRect();
    return [event.clientX - (corner?.left ?? 0), event.clientY - (corner?.top ?? 0)];
  };
  const send = (kind: BenchPointerEvent['kind'], event: PointerEvent): void => {
    const screen = screenOf(event);
    events.onPointer({
      kind,
      at: toBench(camera, screen),
      screen,
      pointerType:
        event.pointerType === 'touch' || event.pointerType === 'pen' ? event.pointerType : 'mouse',
      pointerId: event.pointerId,
      button: kind === 'move' ? -1 : event.button,
    });
  };
  const handle =
    (kind: FingerEvent['kind']): PointerHandler =>
    ({ evt }) => {
      if (kind === 'down') stage.current?.content.setPointerCapture(evt.pointerId);
      if (evt.pointerType !== 'touch') return send(kind, evt);
      const step = followPinch(fingers.current, { kind, id: evt.pointerId, at: screenOf(evt) });
      fingers.current = step.fingers;
      if (step.pinch !== null) events.onPinch(step.pinch);
      if (step.press !== null) send(step.press, evt);
    };
  return {
    onPointerDown: handle('down'),
    onPointerMove: handle('move'),
    onPointerUp: handle('up'),
    onPointerCancel: handle('cancel'),
    onPointerLeave: ({ evt }) => send('leave', evt),
    onWheel: ({ evt }) => {
      evt.preventDefault();
      events.onWheel({
        screen: screenOf(evt),
        deltaX: evt.deltaX,
        deltaY: evt.deltaY,
        isPinch: evt.ctrlKey,
      });
    },
    onContextMenu: ({ evt }) => evt.preventDefault(),
  };
};
