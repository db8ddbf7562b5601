import type { Attempt, Moment, Skill } from '../moments.ts';
import { mark, ofType, result } from '../moments.ts';

/** A lead of the part under test is off before its ohms are believed, and every lifted lead carries a label. */
export const isolate: Skill = {
  name: 'isolate',
  judge(attempt) {
    const ohms = ofType(attempt, 'ReadingCaptured').filter((moment) =>
      needsIsolation(attempt, moment),
    );
    const measured = ohms.map((moment) =>
      isIsolated(moment)
        ? mark(2, `${pairOf(moment)} stood alone when you measured it.`, moment)
        : mark(
            0,
            `${pairOf(moment)} was measured with both ends still wired: its neighbours answer with it.`,
            moment,
          ),
    );
    const lifts = ofType(attempt, 'LeadLifted');
    const labelled = lifts.map((moment) => {
      const end = String(moment.event.data['end']);
      return end in attempt.end.labels
        ? mark(1, `${end} was labelled.`, moment)
        : mark(0, `${end} was lifted without a label.`, moment);
    });
    return result('isolate', [...measured, ...labelled], 2 * ohms.length + lifts.length);
  },
};

const pairOf = (moment: Moment): string =>
  `${String(moment.event.data['red'])}–${String(moment.event.data['black'])}`;

/** Ohms across one part that has leads on it: to the chassis counts, bench tools and the plug's cord do not. */
function needsIsolation(attempt: Attempt, moment: Moment): boolean {
  const setting = String(moment.event.data['setting']);
  if (!/^(ohms|beep|diode)/.test(setting)) return false;
  const parts = partsOf(moment).filter((part) => part !== 'CH' && part !== 'BAT');
  if (parts.length === 0) return false;
  const kinds = attempt.setup.oven.definition.parts;
  return parts.every((ref) =>
    kinds.some(({ ref: own, kind }) => own === ref && kind !== 'fuse' && kind !== 'plug'),
  );
}

function isIsolated(moment: Moment): boolean {
  const seats = Object.values(moment.before.oven.leadEnds);
  return partsOf(moment)
    .filter((part) => part !== 'CH')
    .every((part) => {
      const mine = targetsOf(moment).filter((target) => target.startsWith(`${part}.`));
      return mine.some((target) => !seats.includes(target));
    });
}

const targetsOf = (moment: Moment): string[] =>
  [moment.event.data['red'], moment.event.data['black']].map(String);

const partsOf = (moment: Moment): string[] => [
  ...new Set(
    targetsOf(moment)
      .filter((target) => target.includes('.'))
      .map((target) => target.split('.')[0] ?? ''),
  ),
];
