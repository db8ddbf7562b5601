import { palette } from '../../styles/tokens.ts';

/** The sheet is paper in both themes, on the mat and from the printer. */
export const ink = {
  paper: palette.sheet,
  line: palette.ink,
  faint: palette['ink-2'],
  mark: palette.act,
  red: palette['probe-red'],
  black: palette['probe-black'],
} as const;
