/** Letters typed in quick succession go to what is called so; the bench's own shortcuts come first unless typing has begun. */
export interface TypeAhead {
  typed: string;
  /** ms */ at: number;
}

export const nothingTyped: TypeAhead = { typed: '', at: -Infinity };

/** ms after which typing begins anew */
const pause = 1200;
const shortcuts = /^[rbcdu?]$/i;

/** One key further; null: the key is no part of a name. `/` begins a name that starts like a shortcut. */
export function typeKey(before: TypeAhead, key: string, atMs: number): TypeAhead | null {
  const typed = atMs - before.at > pause ? '' : before.typed;
  if (key === '/' && typed === '') return { typed: '/', at: atMs };
  if (key === 'Backspace' && typed !== '') return { typed: typed.slice(0, -1), at: atMs };
  if (key.length !== 1 || !/[\w./]/.test(key)) return null;
  if (typed === '' && (shortcuts.test(key) || !/[a-z]/i.test(key))) return null;
  return { typed: typed + key, at: atMs };
}

/** The first thing whose reference, or else whose name, begins so. */
export function findTyped<T extends { ref: string; name: string }>(
  { typed }: TypeAhead,
  things: readonly T[],
): T | null {
  const wanted = typed.replace(/^\//, '').toLowerCase();
  if (wanted === '') return null;
  const begins = (text: string): boolean => text.toLowerCase().startsWith(wanted);
  return (
    things.find(({ ref }) => begins(ref)) ??
    things.find(({ name }) => name.split(', ').some(begins)) ??
    null
  );
}
