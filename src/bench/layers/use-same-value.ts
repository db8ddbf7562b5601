import { useState } from 'react';

/** Structural equality of scene values: plain objects, arrays and primitives. */
export const isSame = (a: unknown, b: unknown): boolean => {
  if (Object.is(a, b)) return true;
  if (typeof a !== 'object' || typeof b !== 'object' || a === null || b === null) return false;
  if (Array.isArray(a) !== Array.isArray(b)) return false;
  const keys = Object.keys(a);
  if (keys.length !== Object.keys(b).length) return false;
  return keys.every((key) => isSame(Reflect.get(a, key), Reflect.get(b, key)));
};

/**
 * The earlier value as long as the new one says the same, so that what is drawn from it is not drawn
 * again. A scene is built anew for every move of the hand; most of it has not changed.
 */
export const useSameValue = <T>(value: T): T => {
  const [kept, keep] = useState(value);
  if (isSame(kept, value)) return kept;
  keep(value);
  return value;
};
