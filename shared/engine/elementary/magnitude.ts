/** |re + j im|, without overflow on the way. Square roots are exact to the last bit by ECMAScript and IEEE 754; Math.hypot is left to each engine. */
export function magnitude(re: number, im: number): number {
  const large = Math.max(Math.abs(re), Math.abs(im));
  if (large === 0 || large === Infinity) return large;
  const a = re / large;
  const b = im / large;
  return large * Math.sqrt(a * a + b * b);
}
