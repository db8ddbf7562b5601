import type { Attempt, Skill } from '../moments.ts';
import { mark, ofType, result } from '../moments.ts';

/** The cause that was in the oven is the cause on the sheet, and nothing else is. */
export const reason: Skill = {
  name: 'reason',
  judge(attempt) {
    const stated = ofType(attempt, 'CauseStated').at(-1);
    const causes = attempt.end.sheet.causes;
    const marks = attempt.setup.faults.map((fault) => {
      const right = causes.some((one) => one.on === fault.on && one.fault === fault.fault);
      const place = causes.some((one) => one.on === fault.on);
      if (right) return mark(6, `You found ${fault.on}.`, stated);
      return place
        ? mark(3, `${fault.on} is the place, but not what is wrong with it.`, stated)
        : mark(0, `The fault in ${fault.on} is not on your sheet.`, stated);
    });
    const wrong = causes
      .filter((one) => !attempt.setup.faults.some((fault) => fault.on === one.on))
      .map((one) => mark(-3, `${one.on} was not at fault.`, stated));
    const gainable = Math.max(6 * attempt.setup.faults.length, causes.length === 0 ? 6 : 0, 1);
    const sound =
      attempt.setup.faults.length === 0 && causes.length === 0
        ? [mark(6, 'You found nothing wrong, and nothing was.', stated)]
        : [];
    return result('reason', [...marks, ...wrong, ...sound], gainable);
  },
};

export const isCauseFound = (attempt: Attempt): boolean =>
  attempt.setup.faults.length === attempt.end.sheet.causes.length &&
  attempt.setup.faults.every((fault) =>
    attempt.end.sheet.causes.some((one) => one.on === fault.on && one.fault === fault.fault),
  );
