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
  /** borders that must be seen to use a control: 3:1 on sheet and paper */ edge: '#6b7d85',
  /** text on `act`, `caution` and the tag */ 'on-act': '#ffffff',
  'on-caution': '#161200',
  'tag-ink': '#0f1c22',
  'tag-ink-2': '#4d4a2c',
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
  edge: '#7d929b',
  'on-act': '#0b1a26',
  'safe-tint': '#173a2a',
  'danger-tint': '#47191d',
  'caution-tint': '#38310f',
  'act-tint': '#17324a',
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
  /** it has no Greek: the mono gives Ω and µ */ sans: [
    'Atkinson Hyperlegible Next Variable',
    'JetBrains Mono',
    'system-ui',
    'sans-serif',
  ],
} as const;

export const metric = { header: 52, left: 292, right: 312, dock: 196, meter: 470 } as const;

/** Materials of the oven and the bench, light to dark. For drawing only: no state is told by them. */
export const material = {
  zinc: ['#dde3e0', '#bcc6c3', '#95a19e', '#66736f'],
  enamel: ['#dcdfda', '#bfc5bf', '#99a29c', '#727c76'],
  tin: ['#fbfdfc', '#d3dbda', '#98a4a3', '#5c6867'],
  lamination: ['#7d868a', '#596266', '#3d4548', '#23292b'],
  board: ['#4c8f6c', '#35714f', '#27573c', '#183a27'],
  phenolic: ['#c8a162', '#a67e42', '#7c5b2b', '#4f3919'],
  plastic: ['#566165', '#343d41', '#22292c', '#111618'],
  nylon: ['#fffdf6', '#ece8da', '#cbc5b2', '#98917c'],
  ceramic: ['#fffaf0', '#efe6d2', '#cfc3a6', '#958a6c'],
  brass: ['#f8e6b0', '#d6b25e', '#a27e33', '#664c1a'],
  film: ['#f2d46c', '#dbb13a', '#a8801c', '#6d510d'],
  relay: ['#6a93c9', '#3b66a3', '#274a7c', '#162e52'],
  insulator: ['#ef7c6c', '#c83a2c', '#98231a', '#5c110c'],
  ferrite: ['#615d58', '#413e3a', '#2b2926', '#171614'],
  paper: ['#f0e3bf', '#dac693', '#ab935d', '#766238'],
  varnish: ['#b5763a', '#7f4a1f', '#54300f', '#331b07'],
  glass: ['#f3f8f8', '#c9d8da', '#8aa0a4', '#4b5f64'],
  wood: ['#caa77a', '#a98356', '#7d5c37', '#4d371e'],
  disc: ['#7fb1d6', '#4a86b5', '#2f628c', '#1a3d5b'],
  skin: ['#f3d3b8', '#dcae8c', '#b27e5d', '#6f4a34'],
  soot: ['#6a4a2c', '#3e2816', '#1f140b', '#0b0704'],
  glow: ['#fffbe8', '#ffe7a3', '#ffc85a', '#d98a1e'],
  segment: ['#b6ffe4', '#63e6bd', '#1f6f5c', '#123a32'],
} as const;

/** A lead's insulation: its light, body and shade. */
export const insulation = {
  black: ['#7e898d', '#2a3033', '#0d1012'],
  white: ['#ffffff', '#dcded8', '#656a62'],
  blue: ['#a3caf2', '#2c6ba6', '#123453'],
  brown: ['#e0bd9d', '#7a4c2a', '#3b210f'],
  red: ['#ffa59a', '#c0281e', '#66100a'],
  green: ['#93d3a5', '#2f8049', '#0d3319'],
  'green-yellow': ['#ffe35a', '#2f8049', '#0d3319'],
  yellow: ['#fff0a6', '#e0b62a', '#7b5e07'],
  grey: ['#d3dadb', '#8a9598', '#343c42'],
  orange: ['#ffc48c', '#dd7a28', '#5a2605'],
} as const;

/** Light and shade laid over materials: light comes from the upper left. */
export const shade = {
  drop: 'rgba(8, 16, 20, 0.5)',
  soft: 'rgba(8, 16, 20, 0.26)',
  faint: 'rgba(8, 16, 20, 0.12)',
  gleam: 'rgba(255, 255, 255, 0.55)',
  sheen: 'rgba(255, 255, 255, 0.24)',
  haze: 'rgba(255, 255, 255, 0.1)',
  clear: 'rgba(255, 255, 255, 0)',
  oil: 'rgba(74, 48, 10, 0.42)',
  'label-light': 'rgba(226, 232, 229, 0.86)',
  'label-dark': 'rgba(12, 22, 26, 0.72)',
} as const;
