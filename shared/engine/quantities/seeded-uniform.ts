/**
 * Seeded numbers, the same on every machine: 32-bit FNV-1a of the key mixed into sfc32
 * (C. Doty-Humphrey's small fast counting generator, PractRand). Integer arithmetic only.
 */

const WARM_UP_STEPS = 12;

function fnv1a(text: string): number {
  let hash = 0x811c9dc5;
  for (let index = 0; index < text.length; index += 1) {
    hash = Math.imul(hash ^ text.charCodeAt(index), 0x01000193);
  }
  return hash >>> 0;
}

/**
 * A number in [0, 1) that depends on the seed and the key alone, not on what was drawn before:
 * adding a part to an oven leaves the values of all others as they were.
 */
export function seededUniform(seed: number, key: string): number {
  let a = fnv1a(key) | 0;
  let b = seed | 0;
  let c = Math.floor(seed / 0x1_0000_0000) | 0;
  let counter = 1;
  let result = 0;
  for (let step = 0; step < WARM_UP_STEPS; step += 1) {
    result = (a + b + counter) | 0;
    counter = (counter + 1) | 0;
    a = b ^ (b >>> 9);
    b = (c + (c << 3)) | 0;
    c = ((c << 21) | (c >>> 11)) + result;
    c |= 0;
  }
  return (result >>> 0) / 0x1_0000_0000;
}
