const prefixes: readonly (readonly [string, number])[] = [
  ['G', 1e9],
  ['M', 1e6],
  ['k', 1e3],
  ['', 1],
  ['m', 1e-3],
  ['µ', 1e-6],
  ['n', 1e-9],
  ['p', 1e-12],
];

/**
 * Reads "0.1", "200 k", "1,5M" or "8e6" as a number in the base unit; NaN when it is none. `k` and `K`
 * are both kilo; `u` and both Greek forms are micro; `m` and `M` stay apart.
 */
export const parseQuantity = (text: string): number => {
  const match = /^\s*([-+]?[\d.,]+(?:e[-+]?\d+)?)\s*([GMkKmµμunp]?)\s*$/i.exec(text);
  if (!match) return Number.NaN;
  const [, digits = '', letter = ''] = match;
  const known = letter === 'K' ? 'k' : /[uUμ]/.test(letter) ? 'µ' : letter;
  const scale = prefixes.find(([prefix]) => prefix === known)?.[1];
  return scale === undefined ? Number.NaN : Number(digits.replace(',', '.')) * scale;
};

/** "200 k" for 200000, "0.1" stays: what a technician would write before the unit. */
export const quantityText = (value: number): string => {
  if (!Number.isFinite(value)) return '';
  const size = Math.abs(value);
  if (size === 0 || (size >= 0.01 && size < 1000)) return String(Number(value.toPrecision(6)));
  const [prefix, scale] = prefixes.find(([, one]) => size >= one) ?? ['p', 1e-12];
  return `${Number((value / scale).toPrecision(6))} ${prefix}`.trim();
};

/** "200 kΩ", "0.1 Ω", "0.5" */
export const withUnit = (value: number, unit: string): string => {
  const text = quantityText(value);
  return /[a-zA-Zµ]$/.test(text) ? `${text}${unit}` : `${text} ${unit}`.trim();
};
