/** Names as a deck may have them, one for each name of the circuit. */
export interface DeckNames {
  readonly written: ReadonlyMap<string, string>;
  /** the deck's name; one that must be made up, or does not begin with `prefix`, becomes prefix and number */
  of(name: string, prefix: string): string;
}

/** `fixed` are names written as they are, and by nothing else. */
export function createDeckNames(fixed: readonly string[] = []): DeckNames {
  const written = new Map(fixed.map((name) => [name, name]));
  const taken = new Set([...fixed, 'gnd']);
  let count = 0;
  const madeUp = (prefix: string): string => {
    do count += 1;
    while (taken.has(`${prefix}${count}`));
    return `${prefix}${count}`;
  };
  const of = (name: string, prefix: string): string => {
    const known = written.get(name);
    if (known !== undefined) return known;
    const isLegal = /^[a-z0-9_]+$/.test(name) && name.startsWith(prefix) && !taken.has(name);
    const chosen = isLegal ? name : madeUp(prefix || 'n');
    written.set(name, chosen);
    taken.add(chosen);
    return chosen;
  };
  return { written, of };
}
