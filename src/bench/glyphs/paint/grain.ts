/** A number from 0 to 1 that looks random and is always the same for the same index: brushed metal must not shimmer. */
export const grain = (index: number): number => {
  const x = Math.sin(index * 127.1 + 311.7) * 43758.5453;
  return x - Math.floor(x);
};
