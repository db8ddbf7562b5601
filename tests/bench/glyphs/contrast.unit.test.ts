import { describe, expect, it } from 'vitest';
import { insulation, material, palette } from '../../../src/styles/tokens.ts';

/** Relative luminance and contrast ratio of two sRGB colours, as WCAG 2.2 defines them. */
const luminance = (colour: string): number => {
  const [r, g, b] = [1, 3, 5]
    .map((i) => parseInt(colour.slice(i, i + 2), 16) / 255)
    .map((c) => (c <= 0.04045 ? c / 12.92 : ((c + 0.055) / 1.055) ** 2.4));
  return 0.2126 * r! + 0.7152 * g! + 0.0722 * b!;
};
const contrast = (a: string, b: string): number => {
  const [light, dark] = [luminance(a), luminance(b)].sort((x, y) => y - x);
  return (light! + 0.05) / (dark! + 0.05);
};

/** What leads run over: floor, cavity, boards, mat. */
const grounds = {
  floor: material.zinc[1],
  'lit floor': material.zinc[0],
  cavity: material.enamel[1],
  'filter board': material.phenolic[1],
  'control board': material.board[1],
  mat: palette.mat,
};

it('measures contrast as WCAG does: black on white is 21', () => {
  expect(contrast('#000000', '#ffffff')).toBeCloseTo(21, 9);
  // #767676 on white is the well-known lightest grey that passes 4.5.
  expect(contrast('#767676', '#ffffff')).toBeCloseTo(4.54, 2);
});

describe.each(Object.entries(grounds))('on the %s', (_, ground) => {
  it.each(Object.entries(insulation))(
    'a %s lead stands out 3:1 by its body, edge or light',
    (_name, tones) => {
      expect(Math.max(...tones.map((tone) => contrast(tone, ground)))).toBeGreaterThanOrEqual(3);
    },
  );
});

it('lets a terminal stand out in itself: every face 3:1 against its ring', () => {
  for (const face of [material.nylon[0], material.tin[0], material.brass[0], material.varnish[0]])
    expect(contrast(face, palette.ink)).toBeGreaterThanOrEqual(3);
});
