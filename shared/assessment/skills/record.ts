import type { Attempt, Skill } from '../moments.ts';
import { mark, ofType, result } from '../moments.ts';

/** Verdicts that agree with the oven, each with a reading behind it, and a report somebody can use. */
export const record: Skill = {
  name: 'record',
  judge(attempt) {
    const { verdicts, report } = attempt.end.sheet;
    const faulty = new Set(attempt.setup.faults.map((fault) => fault.on));
    const marks = Object.entries(verdicts)
      .filter(([, verdict]) => verdict !== 'not tested')
      .flatMap(([part, verdict]) => {
        const moment = ofType(attempt, 'VerdictGiven').findLast(
          (one) => one.event.data['part'] === part,
        );
        const right = (verdict === 'faulty') === faulty.has(part);
        return [
          right
            ? mark(2, `${part} ${verdict}: right.`, moment)
            : mark(0, `${part} is not ${verdict}.`, moment),
          hasEvidence(attempt, part)
            ? mark(1, `A reading stands behind ${part}.`, moment)
            : mark(0, `No reading or look stands behind ${part} ${verdict}.`, moment),
        ];
      });
    const written = ofType(attempt, 'ReportWritten').at(-1);
    const reported =
      report.repair.trim() && report.customer.trim()
        ? mark(2, 'The report says what was done and what the customer is told.', written)
        : mark(
            0,
            'The report is not complete: what was done, and what the customer is told.',
            written,
          );
    return result('record', [...marks, reported], 3 * (marks.length / 2) + 2);
  },
};

function hasEvidence(attempt: Attempt, part: string): boolean {
  const { readings } = attempt.end.sheet;
  const measured = readings.some((one) =>
    [one.red, one.black].some((target) => target.startsWith(`${part}.`)),
  );
  return measured || attempt.end.inspected.includes(part);
}
