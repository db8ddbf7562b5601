/** What a glyph draws with. Glyphs are plain drawing code, so that they run on any canvas. */
export type Pen = CanvasRenderingContext2D;

/** A gradient's stops: colours evenly spread, or each with its place from 0 to 1. */
export type Stops = readonly string[] | readonly (readonly [number, string])[];

const addStops = (gradient: CanvasGradient, stops: Stops): CanvasGradient => {
  stops.forEach((stop, i) => {
    if (typeof stop === 'string') gradient.addColorStop(i / Math.max(1, stops.length - 1), stop);
    else gradient.addColorStop(stop[0], stop[1]);
  });
  return gradient;
};

/** A gradient along the line from one point to another. */
export const linear = (
  pen: Pen,
  [x0, y0, x1, y1]: readonly [number, number, number, number],
  stops: Stops,
): CanvasGradient => addStops(pen.createLinearGradient(x0, y0, x1, y1), stops);

/** A gradient outwards from a point; the light sits a little up and to the left of it. */
export const radial = (
  pen: Pen,
  [x, y, radius]: readonly [number, number, number],
  stops: Stops,
): CanvasGradient =>
  addStops(
    pen.createRadialGradient(x - radius * 0.3, y - radius * 0.35, radius * 0.05, x, y, radius),
    stops,
  );

/** Draws with its own pen state, so that nothing leaks. */
export const apart = (pen: Pen, draw: () => void): void => {
  pen.save();
  draw();
  pen.restore();
};

/** Draws with a soft shadow falling down and to the right. `height`: how far the thing stands off, units. */
export const raised = (pen: Pen, height: number, colour: string, draw: () => void): void =>
  apart(pen, () => {
    const scale = scaleOf(pen);
    pen.shadowColor = colour;
    // Canvas shadows ignore the transform: their lengths are device px.
    pen.shadowBlur = height * 1.5 * scale;
    pen.shadowOffsetX = height * 0.35 * scale;
    pen.shadowOffsetY = height * 0.8 * scale;
    draw();
  });

/** A hard shadow for what moves: the same outline in shade, below and to the right on the bench. A blur costs too much every frame. */
export const cast = (pen: Pen, height: number, drawShade: () => void): void =>
  apart(pen, () => {
    const { a, b } = pen.getTransform();
    const turn = Math.atan2(b, a);
    const [dx, dy] = [height * 0.4, height];
    pen.translate(
      dx * Math.cos(turn) + dy * Math.sin(turn),
      dy * Math.cos(turn) - dx * Math.sin(turn),
    );
    drawShade();
  });

const scaleOf = (pen: Pen): number => {
  const { a, b } = pen.getTransform();
  return Math.hypot(a, b);
};
