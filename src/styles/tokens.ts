/** Colours, type sizes and metrics. Read by Tailwind and by the canvas; the only place where a colour is written. */
export const palette = {
  ink: '#0f1c22',
  'ink-2': '#4a5b63',
  paper: '#eef2f3',
  sheet: '#ffffff',
  line: '#d3dce0',
  mat: '#22353d',
  'mat-2': '#2a4049',
  'mat-deep': '#142229',
  act: '#0b5aa6',
  safe: '#1c7548',
  caution: '#f2c200',
  danger: '#b3121d',
  lcd: '#c9d4c2',
  'lcd-ink': '#131d18',
  tag: '#ffe08a',
  eyelet: '#c79a1e',
  'probe-red': '#d23f31',
  'probe-black': '#20282a',
} as const;

/** Tints of the safety colours for fills behind text of the same colour, and the bench's own light text. */
export const tint = {
  'safe-tint': '#d9eee2',
  'danger-tint': '#fbdcdc',
  'caution-tint': '#fff3c4',
  'act-tint': '#dbeaf8',
  'bench-ink': '#e3ebee',
  'bench-ink-2': '#9db3bc',
  'bench-line': '#39525c',
  'safe-lamp': '#5cc08f',
  'caution-lamp': '#f2c200',
  'danger-lamp': '#ff7a66',
} as const;

/** Page colours that the dark theme swaps; the bench does not change. */
export const dark = {
  ink: '#e8eef0',
  'ink-2': '#a9bac1',
  paper: '#10191d',
  sheet: '#182329',
  line: '#31424a',
  act: '#7db8f2',
  safe: '#74d3a2',
  danger: '#ff8f86',
} as const;

export const copper = ['#e79a63', '#b3592a', '#7e3a17'] as const;

export const fontSize = {
  xs: '12px',
  sm: '13.5px',
  base: '15px',
  lg: '17px',
  xl: '21px',
  '2xl': '28px',
} as const;

export const fontFamily = {
  mono: ['JetBrains Mono', 'monospace'],
  sans: ['Atkinson Hyperlegible Next Variable', 'system-ui', 'sans-serif'],
} as const;

export const metric = { header: 52, left: 292, right: 312, dock: 196, meter: 470 } as const;
