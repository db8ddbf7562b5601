/** `+5`, `−10` with a true minus sign. */
export const pointsText = (points: number): string =>
  points < 0 ? `−${Math.abs(points)}` : `+${points}`;
