import { createCanvas } from '@napi-rs/canvas';
import { describe, expect, it } from 'vitest';
import type { PartKindName } from '../../../shared/oven/oven.ts';
import type { ScenePart } from '../../../src/bench/geometry/bench-scene.ts';
import { glyphs } from '../../../src/bench/glyphs/catalogue.ts';
import type { Pen } from '../../../src/bench/glyphs/paint/pen.ts';
import { sceneOf } from '../../support/larkfield.ts';
import { ovenDrawing } from '../../support/oven-drawing.ts';

const margin = 60;

const pixelsOf = (part: ScenePart): Uint8ClampedArray => {
  const [width, height] = part.size;
  const canvas = createCanvas(width + 2 * margin, height + 2 * margin);
  const pen = canvas.getContext('2d');
  pen.translate(margin, margin);
  // @napi-rs/canvas draws as a browser does; its type lacks what only a page has.
  glyphs[part.kind](pen as unknown as Pen, part);
  return pen.getImageData(0, 0, canvas.width, canvas.height).data;
};

const opaque = (data: Uint8ClampedArray): number => {
  let count = 0;
  for (let i = 3; i < data.length; i += 4) if (data[i]! > 200) count++;
  return count;
};

/** Pixels that differ visibly. */
const changed = (a: Uint8ClampedArray, b: Uint8ClampedArray): number => {
  let count = 0;
  for (let i = 0; i < a.length; i += 4)
    if ([0, 1, 2, 3].some((k) => Math.abs(a[i + k]! - b[i + k]!) > 24)) count++;
  return count;
};

const parts = [...sceneOf().parts, ...ovenDrawing('tarnwick-tk-23').sceneOf().parts];
const partOf = (kind: PartKindName, variant?: string): ScenePart =>
  parts.find((part) => part.kind === kind && (variant === undefined || part.variant === variant))!;

const looks: readonly [PartKindName, string][] = [
  ['fuse', 'burnt'],
  ['filter-board', 'burnt'],
  ['filter-board', 'cracked'],
  ['cut-out', 'burnt'],
  ['door-switch', 'burnt'],
  ['relay', 'burnt'],
  ['board-transformer', 'burnt'],
  ['control-board', 'cracked'],
  ['mechanical-timer', 'burnt-2'],
  ['mechanical-timer', 'burnt-3'],
  ['mechanical-timer', 'bell'],
  ['mechanical-timer', 'greasy'],
  ['resistor', 'burnt'],
  ['hv-fuse', 'bridged'],
  ['hv-fuse', 'burnt'],
  ['lamp', 'blown'],
  ['lamp', 'burnt'],
  ['motor', 'burnt'],
  ['hv-transformer', 'burnt'],
  ['hv-capacitor', 'swollen'],
  ['hv-capacitor', 'oil'],
  ['hv-capacitor', 'burnt'],
  ['hv-diode', 'cracked'],
  ['hv-diode', 'reversed'],
  ['magnetron', 'burnt'],
  ['magnetron', 'cracked'],
];

describe('every part', () => {
  it.each(parts.map((part) => [part.ref, part] as const))('%s is drawn', (_, part) => {
    expect(opaque(pixelsOf(part))).toBeGreaterThan(500);
  });

  it.each(looks)('a %s that is %s looks it', (kind, look) => {
    const part = partOf(kind);
    expect(changed(pixelsOf(part), pixelsOf({ ...part, looks: [look] }))).toBeGreaterThan(20);
  });
});

describe('what parts show', () => {
  it.each([
    ['lamp', 'isLit', undefined],
    ['control-board', 'isLit', undefined],
    ['motor', 'isTurning', 'fan'],
    ['motor', 'isTurning', 'turntable'],
    ['mechanical-timer', 'isTurning', undefined],
    ['mechanical-timer', 'isPressed', undefined],
    ['door-switch', 'isActuated', 'primary'],
    ['door-switch', 'isActuated', 'monitor'],
    ['door-switch', 'isPressed', 'primary'],
    ['plug', 'isActuated', undefined],
  ] as const)('a %s shows %s', (kind, flag, variant) => {
    const part = partOf(kind, variant);
    const off = pixelsOf({ ...part, [flag]: false });
    expect(changed(off, pixelsOf({ ...part, [flag]: true }))).toBeGreaterThan(20);
  });

  it('prints what is stamped on them', () => {
    const part = partOf('hv-capacitor');
    const printed = pixelsOf({ ...part, stamp: ['0.95 µF 2100 V~'] });
    expect(changed(pixelsOf(part), printed)).toBeGreaterThan(50);
  });

  it('gives a plug for 250 V round pins', () => {
    const part = partOf('plug');
    const round = pixelsOf({ ...part, stamp: ['16 A 250 V~'] });
    expect(changed(pixelsOf({ ...part, stamp: ['15 A 125 V~'] }), round)).toBeGreaterThan(200);
  });

  it('hides a burnt-out wire in ceramic: nothing but a violent end shows on a fuse', () => {
    const part = partOf('fuse');
    expect(changed(pixelsOf(part), pixelsOf({ ...part, looks: ['open'] }))).toBe(0);
  });
});
