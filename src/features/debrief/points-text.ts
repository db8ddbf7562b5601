/** `+5`, `−10` with a true minus sign, `0`. */
export const pointsText = (points: number): string => {
  if (points === 0) return '0';
  return points < 0 ? `−${Math.abs(points)}` : `+${points}`;
};
