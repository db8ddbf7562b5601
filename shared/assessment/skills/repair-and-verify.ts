import type { RecordedEvent } from '../../bench/event.ts';
import { asFitted } from '../../oven/initial-state.ts';
import type { Mark } from '../debrief.ts';
import type { Attempt, Skill } from '../moments.ts';
import { mark, ofType, result } from '../moments.ts';

/** What was faulty put right and nothing else replaced; every lead where it was; cover on; run again; door and plug checked. */
export const repairAndVerify: Skill = {
  name: 'repair and verify',
  judge(attempt) {
    const { end, setup } = attempt;
    const faulty = [...new Set(setup.faults.map((fault) => fault.on))];
    const replacements = ofType(attempt, 'PartReplaced');
    const putRight = faulty.map((on) => repairOf(attempt, on));
    const needless = replacements
      .filter(
        ({ event }) => !faulty.includes(String(event.data['part'])) && !isFuse(attempt, event),
      )
      .map((moment) => mark(-1, `${String(moment.event.data['part'])} was good.`, moment));
    const wrong = end.oven.faults
      .filter(({ on, fault }) => !setup.faults.some((one) => one.on === on && one.fault === fault))
      .map(({ on }) =>
        mark(-2, `${on} is not of the size that belongs there.`, replacementOf(attempt, on)),
      );
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
      [...putRight, ...needless, ...wrong, refitted, covered, verified, ...checks(attempt)],
      3 * faulty.length + 8,
    );
  },
};

const replacementOf = (attempt: Attempt, on: string) =>
  ofType(attempt, 'PartReplaced').findLast(({ event }) => event.data['part'] === on);

/** A fuse goes with what blew it. */
const isFuse = ({ setup }: Attempt, event: RecordedEvent): boolean =>
  setup.oven.definition.parts.some(
    ({ ref, kind }) => ref === event.data['part'] && (kind === 'fuse' || kind === 'hv-fuse'),
  );

/** A part is replaced, a lead given new connectors or put where it belongs, the door set. */
function repairOf(attempt: Attempt, on: string): Mark {
  const part = attempt.setup.oven.definition.parts.find(({ ref }) => ref === on);
  const is = (type: string, key: string) =>
    ofType(attempt, type).find(({ event }) => event.data[key] === on);
  if (part?.kind === 'chassis') {
    const moment = ofType(attempt, 'DoorRepaired').at(-1);
    return moment ? mark(3, 'You put the door right.', moment) : mark(0, 'The door is as it was.');
  }
  if (part) {
    const moment = is('PartReplaced', 'part');
    return moment ? mark(3, `You replaced ${on}.`, moment) : mark(0, `${on} is still in the oven.`);
  }
  const moment =
    is('LeadRepaired', 'lead') ??
    ofType(attempt, 'LeadRefitted').find(({ event }) =>
      String(event.data['end']).startsWith(`${on}/`),
    );
  return moment ? mark(3, `You put ${on} right.`, moment) : mark(0, `${on} is as it was.`);
}

/** What belongs to every repair before the oven goes back (PRODUCT section 1, step 7; limits: FACTS 2). */
function checks(attempt: Attempt): Mark[] {
  const after = lastRepair(attempt);
  const check = (type: string, done: string, open: string): Mark => {
    const moment = ofType(attempt, type).findLast(({ event }) => event.sequence > after);
    return moment ? mark(1, done, moment) : mark(0, open);
  };
  return [
    check('LeakageSurveyed', 'You surveyed the door.', 'The door was not surveyed for leakage.'),
    check(
      'InterlocksChecked',
      'You opened the door slowly and listened.',
      'The door chain was not checked.',
    ),
    check(
      'PlugTested',
      'You tested earth and insulation.',
      'Earth and insulation were not tested.',
    ),
  ];
}

const repairs = ['PartReplaced', 'LeadRepaired', 'DoorRepaired', 'LeadRefitted'];

const lastRepair = (attempt: Attempt): number =>
  Math.max(
    -1,
    ...repairs.flatMap((type) => ofType(attempt, type)).map(({ event }) => event.sequence),
  );

export function strayLeads({ setup, end }: Attempt): string[] {
  const fitted = asFitted(setup.oven.definition, []).leadEnds;
  return Object.entries(fitted)
    .filter(([lead, terminal]) => end.oven.leadEnds[lead] !== terminal)
    .map(([lead]) => lead);
}
