import { createCanvas, type Canvas } from '@napi-rs/canvas';

// jsdom has no canvas of its own: every <canvas> gets a real one behind it, so that Konva truly draws
// and what was drawn can be read back pixel by pixel.
const behind = new WeakMap<HTMLCanvasElement, Canvas>();

const canvasBehind = (element: HTMLCanvasElement): Canvas => {
  const known = behind.get(element);
  if (known !== undefined) return known;
  const canvas = createCanvas(element.width || 1, element.height || 1);
  const context = canvas.getContext('2d');
  const drawImage = context.drawImage.bind(context);
  Object.assign(context, {
    drawImage: (image: unknown, ...rest: unknown[]) =>
      Reflect.apply(drawImage, context, [
        image instanceof HTMLCanvasElement ? canvasBehind(image) : image,
        ...rest,
      ]),
  });
  behind.set(element, canvas);
  return canvas;
};

const resizing = (side: 'width' | 'height', usual: number): PropertyDescriptor => ({
  configurable: true,
  get(this: HTMLCanvasElement) {
    return Number(this.getAttribute(side) ?? usual);
  },
  set(this: HTMLCanvasElement, value: number) {
    this.setAttribute(side, String(Math.trunc(value)));
    const canvas = behind.get(this);
    if (canvas !== undefined) canvas[side] = Math.max(1, Math.trunc(value));
  },
});

/** Gives jsdom's canvases real 2D contexts. Call once per test file, before anything draws. */
export const backCanvases = (): void => {
  Object.defineProperty(HTMLCanvasElement.prototype, 'width', resizing('width', 300));
  Object.defineProperty(HTMLCanvasElement.prototype, 'height', resizing('height', 150));
  Object.defineProperty(HTMLCanvasElement.prototype, 'getContext', {
    configurable: true,
    value(this: HTMLCanvasElement, kind: string) {
      return kind === '2d' ? canvasBehind(this).getContext('2d') : null;
    },
  });
};
