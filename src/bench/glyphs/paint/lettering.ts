import { fontFamily } from '../../../styles/tokens.ts';
import type { Pen } from './pen.ts';

export interface Lettering {
  size: number;
  ink: string;
  weight?: 400 | 600 | 800;
  family?: keyof typeof fontFamily;
  align?: 'left' | 'center' | 'right';
  /** a band around the letters, so that they can be read on anything */ halo?: string;
}

const quoted = (name: string): string => (name.includes(' ') ? `"${name}"` : name);
const stacks = {
  mono: fontFamily.mono.map(quoted).join(', '),
  sans: fontFamily.sans.map(quoted).join(', '),
} as const;

/** Every face the bench writes with, as CSS fonts: to be loaded before it is drawn. */
export const fontFaces: readonly string[] = [
  `600 12px ${stacks.mono}`,
  `800 12px ${stacks.mono}`,
  `600 12px ${stacks.sans}`,
];

/** Writes one line of text, its middle on y. */
export const write = (pen: Pen, text: string, x: number, y: number, how: Lettering): void => {
  pen.font = `${how.weight ?? 600} ${how.size}px ${stacks[how.family ?? 'mono']}`;
  pen.textAlign = how.align ?? 'center';
  pen.textBaseline = 'middle';
  if (how.halo !== undefined) {
    pen.lineJoin = 'round';
    pen.lineWidth = how.size * 0.24;
    pen.strokeStyle = how.halo;
    pen.strokeText(text, x, y + how.size * 0.05);
  }
  pen.fillStyle = how.ink;
  pen.fillText(text, x, y + how.size * 0.05);
};
