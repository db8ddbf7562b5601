import { z } from 'zod';
import { partRef } from '../../oven/oven.ts';
import { accept, action, refuse } from '../action.ts';
import { cause, verdict } from '../record.ts';

const given = z.strictObject({ part: partRef, verdict });
const stated = z.strictObject({ causes: z.array(cause).max(4) });
const written = z.strictObject({
  repair: z.string().max(2000),
  customer: z.string().max(2000),
});

export const giveVerdict = action({
  command: 'GiveVerdict',
  event: 'VerdictGiven',
  input: given,
  data: given,
  decide: ({ setup }, data) =>
    setup.oven.definition.parts.some((part) => part.ref === data.part)
      ? accept(data)
      : refuse('no-such-part', `There is no part ${data.part}.`),
  evolve: (state, data) => ({
    ...state,
    sheet: {
      ...state.sheet,
      verdicts: { ...state.sheet.verdicts, [data.part]: data.verdict },
    },
  }),
  describe: (data) => `${data.part}: ${data.verdict}`,
});

export const stateCause = action({
  command: 'StateCause',
  event: 'CauseStated',
  input: stated,
  data: stated,
  decide: ({ setup }, data) => {
    const { parts, leads } = setup.oven.definition;
    const known = new Set([...parts.map((part) => part.ref), ...leads.map((lead) => lead.ref)]);
    const stranger = data.causes.find((one) => !known.has(one.on));
    return stranger
      ? refuse('no-such-part', `There is no part or lead ${stranger.on}.`)
      : accept(data);
  },
  evolve: (state, { causes }) => ({ ...state, sheet: { ...state.sheet, causes } }),
  describe: ({ causes }) =>
    causes.length === 0
      ? 'cause taken back'
      : `cause: ${causes.map((one) => `${one.on} ${one.fault}`).join(', ')}`,
});

export const writeReport = action({
  command: 'WriteReport',
  event: 'ReportWritten',
  input: written,
  data: written,
  decide: (_bench, data) => accept(data),
  evolve: (state, report) => ({ ...state, sheet: { ...state.sheet, report } }),
  describe: () => 'report written',
});

const nothing = z.strictObject({});

export const handIn = action({
  command: 'HandIn',
  event: 'HandedIn',
  input: nothing,
  data: nothing,
  decide: ({ state }) =>
    state.sheet.causes.length === 0 && Object.keys(state.sheet.verdicts).length === 0
      ? refuse('empty-sheet', 'The job sheet is empty. Give a verdict or state the cause first.')
      : accept({}),
  evolve: (state) => ({ ...state, isHandedIn: true }),
  describe: () => 'job sheet handed in',
});
