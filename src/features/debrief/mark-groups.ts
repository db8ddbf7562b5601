import type { Mark } from '../../../shared/assessment/debrief.ts';

export interface MarkGroup {
  why: string;
  /** of all its marks together */ points: number;
  /** the moments that earned it, in order; none: it was never done */ moments: readonly number[];
}

/** Marks that say the same become one line with several moments, in the order in which they first came. */
export const markGroups = (marks: readonly Mark[]): MarkGroup[] => {
  const whys = [...new Set(marks.map(({ why }) => why))];
  return whys.map((why) => {
    const same = marks.filter((mark) => mark.why === why);
    return {
      why,
      points: same.reduce((sum, { points }) => sum + points, 0),
      moments: same.flatMap(({ sequence }) => (sequence === null ? [] : [sequence])),
    };
  });
};
