import '@testing-library/jest-dom/vitest';
import '../../src/app/configure-zod.ts';
import { cleanup } from '@testing-library/react';
import { afterEach } from 'vitest';
import { backCanvases } from './canvas-in-jsdom.ts';

backCanvases();

// What browsers have and jsdom lacks; each does nothing until a test replaces it.
const matchMedia = (query: string): MediaQueryList =>
  Object.assign(new EventTarget(), {
    matches: false,
    media: query,
    onchange: null,
    addListener: () => undefined,
    removeListener: () => undefined,
  });

class StillResizeObserver implements ResizeObserver {
  observe(): void {}
  unobserve(): void {}
  disconnect(): void {}
}

const fonts = Object.assign(new EventTarget(), { load: () => Promise.resolve([]) });

window.matchMedia ??= matchMedia;
window.ResizeObserver ??= StillResizeObserver;
if (!('fonts' in document)) Object.defineProperty(document, 'fonts', { value: fonts });
HTMLDialogElement.prototype.showModal ??= function show(this: HTMLDialogElement) {
  this.open = true;
};
HTMLDialogElement.prototype.close ??= function close(this: HTMLDialogElement) {
  this.open = false;
};
Element.prototype.scrollIntoView ??= () => undefined;
Element.prototype.setPointerCapture ??= () => undefined;
Element.prototype.releasePointerCapture ??= () => undefined;

afterEach(cleanup);
