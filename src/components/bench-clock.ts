const two = (n: number): string => String(n).padStart(2, '0');

/** Bench time in ms as the bench shows it: `02:11`, from an hour on `1:02:11`. */
export const benchClock = (ms: number): string => {
  const seconds = Math.floor(ms / 1000);
  const hours = Math.floor(seconds / 3600);
  const minutes = Math.floor(seconds / 60) % 60;
  const rest = `${two(minutes)}:${two(seconds % 60)}`;
  return hours > 0 ? `${hours}:${rest}` : rest;
};
