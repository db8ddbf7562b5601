import type Konva from 'konva/lib/Core.js';
import { useEffect, type RefObject } from 'react';
import { fontFaces } from '../glyphs/paint/lettering.ts';

/** Letters of every subset that the bench writes: a font comes subset by subset. */
const sample = 'C1 \u03a9';

/** Asks for the bench's fonts and draws again when they are there: a canvas does not wait for a font by itself. */
export const useCanvasFonts = (stage: RefObject<Konva.Stage | null>): void => {
  useEffect(() => {
    let isGone = false;
    const redraw = (): void => {
      if (!isGone) stage.current?.batchDraw();
    };
    // A font that cannot be had leaves the system's: names stay readable, so it is no fault to report.
    void Promise.allSettled(fontFaces.map((face) => document.fonts.load(face, sample))).then(
      redraw,
    );
    return () => {
      isGone = true;
    };
  }, [stage]);
};
