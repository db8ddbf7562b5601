/** NUL cannot be stored in a PostgreSQL text, and a lone surrogate not in jsonb. */
const isStorable = (text: string): boolean =>
  !text.includes('\u0000') && !/\p{Surrogate}/u.test(text);

interface Place {
  value: unknown;
  key: PropertyKey;
  within: Place | null;
}

function pathTo(place: Place): PropertyKey[] {
  const keys: PropertyKey[] = [];
  for (let at: Place = place; at.within; at = at.within) keys.unshift(at.key);
  return keys;
}

/**
 * The path to the first text or key that the database cannot hold; null when there is none. Goes
 * without recursion and without copying paths, so that a body nested half a million deep costs
 * neither the stack nor the memory.
 */
export function unstorableText(value: unknown): PropertyKey[] | null {
  const open: Place[] = [{ value, key: '', within: null }];
  for (let place = open.pop(); place; place = open.pop()) {
    const one = place.value;
    if (typeof one === 'string' && !isStorable(one)) return pathTo(place);
    if (typeof one !== 'object' || one === null) continue;
    for (const [key, inner] of Object.entries(one)) {
      if (!isStorable(key)) return pathTo(place);
      open.push({ value: inner, key: Array.isArray(one) ? Number(key) : key, within: place });
    }
  }
  return null;
}
