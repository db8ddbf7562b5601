const names: Readonly<Record<number, string>> = {
  1: 'first steps',
  2: 'basic',
  3: 'usual work',
  4: 'hard',
  5: 'experienced',
};

/** "3, usual work": the level as people read it. */
export const levelName = (level: number): string => {
  const name = names[level];
  return name ? `${level}, ${name}` : String(level);
};
