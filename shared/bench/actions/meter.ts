import { z } from 'zod';
import { settingOf } from '../../instruments/meters.ts';
import { accept, action, refuse } from '../action.ts';
import { readMeter, shown } from '../reading.ts';
import { shownReading, type ShownReading } from '../record.ts';
import { heldWords } from '../test-leads.ts';

const nothing = z.strictObject({});
const chosen = z.strictObject({ setting: z.string().max(24) });
const zeroed = z.strictObject({
  /** SI */ relative: z.number(),
  display: z.string().max(12),
  unit: z.string().max(4),
});
const nothingShown = refuse('nothing-shown', 'The display shows nothing to take.');

export const setMeter = action({
  command: 'SetMeter',
  event: 'MeterSet',
  input: chosen,
  data: chosen,
  decide: ({ setup, state }, data) => {
    if (!settingOf(setup.meter, data.setting)) {
      return refuse('no-such-setting', `This meter has no setting ${data.setting}.`);
    }
    return state.meter.setting === data.setting
      ? refuse('set-already', 'The meter is on that setting already.')
      : accept(data);
  },
  evolve: (state, { setting }) => ({
    ...state,
    meter: { ...state.meter, setting, relative: null, lag: null },
  }),
  describe: ({ setting }) => `meter to ${setting}`,
});

/** REL: from now on the display subtracts what it shows now, right or wrong. */
export const setRelative = action({
  command: 'SetRelative',
  event: 'RelativeSet',
  input: nothing,
  data: zeroed,
  decide: ({ setup, state, before, trace }) => {
    const view = readMeter(setup, before, { state, trace });
    if (!view || view.reading.value === null) {
      return refuse('nothing-to-zero', 'REL needs a reading on the display.');
    }
    const { value, display, unit } = view.reading;
    return accept({ relative: value + (state.meter.relative ?? 0), display, unit });
  },
  evolve: (state, { relative }) => ({ ...state, meter: { ...state.meter, relative } }),
  describe: ({ display, unit }) => `REL set on ${display} ${unit}`,
});

export const clearRelative = action({
  command: 'ClearRelative',
  event: 'RelativeCleared',
  input: nothing,
  data: nothing,
  decide: ({ state }) =>
    state.meter.relative === null ? refuse('rel-is-off', 'REL is off already.') : accept({}),
  evolve: (state) => ({ ...state, meter: { ...state.meter, relative: null } }),
  describe: () => 'REL off',
});

/** The display stood still long enough to be read: kept, so that the record knows what the trainee saw. */
export const takeReading = action({
  command: 'TakeReading',
  event: 'ReadingTaken',
  input: nothing,
  data: shownReading,
  decide: ({ setup, state, before, trace }) => {
    const view = readMeter(setup, before, { state, trace });
    const reading = view && shown(state, view);
    return reading ? accept(reading) : nothingShown;
  },
  evolve: (state) => state,
  describe: (data) => `${data.red}–${data.black} ${inWords(data)}`,
});

/** The same, written on the job sheet. */
export const captureReading = action({
  command: 'CaptureReading',
  event: 'ReadingCaptured',
  input: nothing,
  data: shownReading,
  decide: ({ setup, state, before, trace }) => {
    const view = readMeter(setup, before, { state, trace });
    const reading = view && shown(state, view);
    return reading ? accept(reading) : nothingShown;
  },
  evolve: (state, data) => ({
    ...state,
    sheet: {
      ...state.sheet,
      readings: [
        ...state.sheet.readings,
        {
          ...data,
          benchMs: state.benchMs,
          lifted: Object.entries(state.oven.leadEnds)
            .filter(([, seat]) => seat === null)
            .map(([end]) => end),
        },
      ],
    },
  }),
  describe: (data) => `on the sheet: ${data.red}–${data.black} ${inWords(data)}`,
});

const inWords = ({ display, unit, isBeeping, held }: ShownReading): string =>
  [`${display} ${unit}`, isBeeping ? 'beeps' : '', heldWords(held)].filter(Boolean).join(', ');
