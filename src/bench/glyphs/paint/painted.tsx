import { memo } from 'react';
import { Shape } from 'react-konva/lib/ReactKonvaCore.js';
import type { Pen } from './pen.ts';

export interface PaintedProps {
  /** Draws in the coordinates of the node's parent. A new function draws anew, the same one does not. */
  paint: (pen: Pen) => void;
}

/** A Konva shape drawn by plain drawing code. A glyph that fails is reported and left out; the bench stays. */
export const Painted = memo(function Painted({ paint }: PaintedProps) {
  return (
    <Shape
      listening={false}
      perfectDrawEnabled={false}
      sceneFunc={({ _context: pen }) => {
        try {
          paint(pen);
        } catch (fault) {
          reportError(fault);
        }
      }}
    />
  );
});
