import { asFitted } from '../../oven/initial-state.ts';
import type { Attempt, Skill } from '../moments.ts';
import { mark, ofType, result } from '../moments.ts';

/** The faulty part replaced and no other; every lead where it was; cover on; run again. */
export const repairAndVerify: Skill = {
  name: 'repair and verify',
  judge(attempt) {
    const { end, setup } = attempt;
    const parts = [...new Set(setup.faults.map((fault) => fault.on))].filter(
      (on) => !on.startsWith('W'),
    );
    const replacements = ofType(attempt, 'PartReplaced');
    const replaced = parts.map((part) => {
      const moment = replacements.find((one) => one.event.data['part'] === part);
      return moment
        ? mark(3, `You replaced ${part}.`, moment)
        : mark(0, `${part} is still in the oven.`);
    });
    const needless = replacements
      .filter(
        ({ event }) => !parts.includes(String(event.data['part'])) && event.data['part'] !== 'F1',
      )
      .map((moment) => mark(-1, `${String(moment.event.data['part'])} was good.`, moment));
    const last = ofType(attempt, 'LeadRefitted').at(-1);
    const astray = strayLeads(attempt);
    const refitted =
      astray.length === 0
        ? mark(2, 'Every lead is where it was.', last)
        : mark(0, `Not where they were: ${astray.join(', ')}.`, last);
    const covered = end.isCoverOn
      ? mark(1, 'The cover is on.', ofType(attempt, 'CoverFitted').at(-1))
      : mark(0, 'The cover is still off.');
    const run = ofType(attempt, 'OvenRun').at(-1);
    const verified =
      run && end.isCoverOn && replacements.every((one) => one.event.sequence < run.event.sequence)
        ? mark(2, 'You ran it again after the repair.', run)
        : mark(0, 'The repair was not run again with the cover on.');
    return result(
      'repair and verify',
      [...replaced, ...needless, refitted, covered, verified],
      3 * parts.length + 5,
    );
  },
};

export function strayLeads({ setup, end }: Attempt): string[] {
  const fitted = asFitted(setup.oven.definition, []).leadEnds;
  return Object.entries(fitted)
    .filter(([lead, terminal]) => end.oven.leadEnds[lead] !== terminal)
    .map(([lead]) => lead);
}
