import plugin from 'tailwindcss/plugin';
import { dark, palette, tint } from './tokens.ts';

const variables = (colours: Readonly<Record<string, string>>): Record<string, string> =>
  Object.fromEntries(Object.entries(colours).map(([name, value]) => [`--color-${name}`, value]));

/** Writes the tokens as CSS variables, so that the dark theme swaps values and not classes. */
export default plugin(({ addBase }) => {
  addBase({
    ':root': variables({ ...palette, ...tint }),
    '@media (prefers-color-scheme: dark)': { ':root': variables(dark) },
  });
});
