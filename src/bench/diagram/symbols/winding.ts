/** A winding of half circles from (x, y) downwards, one every 10 units. `bulge` is the side the half circles stand out to. */
export const windingDown = (x: number, y: number, turns: number, bulge: 'left' | 'right'): string =>
  `M${x} ${y}${`a5 5 0 0 ${bulge === 'right' ? 1 : 0} 0 10`.repeat(turns)}`;

/** The same, lying, its half circles standing up. */
export const windingAcross = (x: number, y: number, turns: number): string =>
  `M${x} ${y}${'a5 5 0 0 1 10 0'.repeat(turns)}`;
