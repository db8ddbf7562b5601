import type { Config } from 'tailwindcss';
import { fontFamily, fontSize, palette, tint } from './src/styles/tokens.ts';

const names = Object.keys({ ...palette, ...tint });
// CSS variables, so that the dark theme swaps values and not classes.
const colors = Object.fromEntries(names.map((name) => [name, `var(--color-${name})`]));

export default {
  content: ['./index.html', './src/**/*.{ts,tsx}'],
  theme: {
    colors: { ...colors, white: '#ffffff', transparent: 'transparent', current: 'currentColor' },
    fontSize,
    fontFamily: { mono: [...fontFamily.mono], sans: [...fontFamily.sans] },
  },
} satisfies Config;
