import type { CSSProperties } from 'react';
import { dark } from '../../styles/tokens.ts';

/** The bench keeps its dark mat in both themes: what stands on it takes the dark page's colours. */
export const benchColours = Object.fromEntries(
  Object.entries(dark).map(([name, value]) => [`--color-${name}`, value]),
) as CSSProperties;
