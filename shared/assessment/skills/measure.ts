import type { Moment, Skill } from '../moments.ts';
import { mark, ofType, result } from '../moments.ts';

/** Ohm; below this the test leads' own 0.16 Ohm is a large part of the reading */
const zeroBelow = 3;

/** The range that shows most, zeroed below a few ohms, read when it has settled. */
export const measure: Skill = {
  name: 'measure',
  judge(attempt) {
    const captured = ofType(attempt, 'ReadingCaptured');
    const settled = captured.map((moment) =>
      moment.event.data['isSettled']
        ? mark(1, 'You waited until the reading stood.', moment)
        : mark(0, 'The reading was still moving when you wrote it down.', moment),
    );
    const ranged = captured
      .filter(isOhms)
      .map((moment) =>
        isCoarse(moment)
          ? mark(0, `${text(moment)} was read on a range far too high for it.`, moment)
          : mark(1, `${text(moment)} was read on a fitting range.`, moment),
      );
    const small = captured.filter((moment) => isOhms(moment) && isSmall(moment));
    const zeroed = small.map((moment) =>
      moment.event.data['isRelative']
        ? mark(1, `The test leads were zeroed for ${text(moment)}.`, moment)
        : mark(0, `Zero the test leads before you believe ${text(moment)}.`, moment),
    );
    const marks = [...settled, ...ranged, ...zeroed];
    return result('measure', marks, marks.length);
  },
};

const isOhms = (moment: Moment): boolean => String(moment.event.data['setting']).startsWith('ohms');
const valueOf = (moment: Moment): number | null => moment.event.data['value'] as number | null;
const text = (moment: Moment): string =>
  `${String(moment.event.data['display'])} ${String(moment.event.data['unit'])}`;

const isSmall = (moment: Moment): boolean => {
  const value = valueOf(moment);
  return value !== null && Math.abs(value) < zeroBelow;
};

/** Ten counts or fewer of two thousand, with a lower range at hand. */
const isCoarse = (moment: Moment): boolean => {
  const digits = String(moment.event.data['display']).replace(/[^0-9]/g, '');
  return (
    moment.event.data['setting'] !== 'ohms-200' && valueOf(moment) !== null && Number(digits) <= 10
  );
};
