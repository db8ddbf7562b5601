import { z } from 'zod';
import type { Bench } from '../action.ts';
import { accept, action, refuse } from '../action.ts';
import type { BenchState } from '../bench-state.ts';
import { partRef } from '../../oven/oven.ts';
import { chargeAtUnplugging } from '../charge-at-unplugging.ts';
import { standing } from '../powered-run/powered-run.ts';

const nothing = z.strictObject({});
const opened = z.array(partRef).min(1).optional();
const seen = z.strictObject({
  /** absent: the oven has no display */ isDisplayLit: z.boolean().optional(),
  /** it runs although nobody has started it */ runsByItself: z.literal(true).optional(),
  /** fuses that melted at once */ opened,
});
const swung = z.strictObject({
  /** fuses that melted at once; absent: none, or the cord is out */ opened,
  /** it runs although nobody has started it */ runsByItself: z.literal(true).optional(),
});

export const pullCord = action({
  command: 'PullCord',
  event: 'CordPulled',
  runsMains: true,
  input: nothing,
  data: nothing,
  decide: ({ state }) =>
    state.isCordIn ? accept({}) : refuse('cord-is-out', 'The cord is out already.'),
  evolve: (state, _data, setup) => ({
    ...state,
    isCordIn: false,
    isDisplayLit: state.isDisplayLit === null ? null : false,
    runsByItself: false,
    storage: chargeAtUnplugging(setup, state),
  }),
  describe: () => 'cord out',
});

export const plugCord = action({
  command: 'PlugCord',
  event: 'CordPlugged',
  runsMains: true,
  input: nothing,
  data: seen,
  decide: ({ setup, state }) => {
    if (state.isCordIn) return refuse('cord-is-in', 'The cord is in already.');
    const onPlug = [
      state.probes.red,
      state.probes.black,
      state.discharge.clip,
      state.discharge.tip,
      state.battery.neg,
      state.battery.oneK,
    ].some((target) => target?.startsWith('P1.'));
    if (onPlug)
      return refuse('plug-in-use', 'Something is still on the plug pins. Take it off first.');
    const hazards = state.isCoverOn
      ? []
      : [
          {
            kind: 'mains-exposed' as const,
            at: null,
            to: null,
            volts: 0,
            charge: 0,
            energy: 0,
          },
        ];
    return accept(standing(setup.oven, state.oven), hazards);
  },
  evolve: (state, data) => ({
    ...afterMelting(state, data.opened),
    isCordIn: true,
    isDisplayLit: data.isDisplayLit ?? null,
    runsByItself: data.runsByItself ?? false,
  }),
  describe: ({ isDisplayLit, runsByItself, opened }) =>
    [
      'cord in',
      ...(isDisplayLit === undefined ? [] : [`display ${isDisplayLit ? 'lit' : 'dark'}`]),
      ...(runsByItself ? ['runs by itself'] : []),
      ...(opened ? ['a bang inside'] : []),
    ].join(', '),
});

export const removeCover = action({
  command: 'RemoveCover',
  event: 'CoverRemoved',
  input: nothing,
  data: nothing,
  decide: ({ state }) => {
    if (!state.isCoverOn) return refuse('cover-is-off', 'The cover is off already.');
    if (state.isCordIn) {
      return refuse('cord-is-in', 'The cord is in. Pull it before you take the cover off.');
    }
    return accept({});
  },
  evolve: (state) => ({ ...state, isCoverOn: false }),
  describe: () => 'cover off',
});

export const fitCover = action({
  command: 'FitCover',
  event: 'CoverFitted',
  input: nothing,
  data: nothing,
  decide: ({ state }) => {
    if (state.isCoverOn) return refuse('cover-is-on', 'The cover is on already.');
    const used = [
      state.probes.red,
      state.probes.black,
      state.discharge.clip,
      state.discharge.tip,
      state.battery.neg,
      state.battery.oneK,
    ].some((target) => target && !target.startsWith('BAT.') && !target.startsWith('P1.'));
    return used
      ? refuse('tools-inside', 'Tools are still connected inside. Take them off first.')
      : accept({});
  },
  evolve: (state) => ({ ...state, isCoverOn: true, oven: { ...state.oven, pressed: [] } }),
  describe: () => 'cover on',
});

const afterMelting = (state: BenchState, melted: readonly string[] = []): BenchState => ({
  ...state,
  oven: { ...state.oven, opened: [...new Set([...state.oven.opened, ...melted])] },
});

/** The door's hooks work the switches; with the cord in, the circuit says at once what that does. */
const setDoor = (isDoorClosed: boolean) =>
  ({
    input: nothing,
    data: swung,
    runsMains: true,
    decide: ({ setup, state }: Bench) => {
      if (state.oven.isDoorClosed === isDoorClosed)
        return refuse('door-is-so', `The door is ${isDoorClosed ? 'closed' : 'open'} already.`);
      if (!state.isCordIn) return accept({});
      const now = standing(setup.oven, { ...state.oven, isDoorClosed });
      return accept({
        ...(now.opened ? { opened: now.opened } : {}),
        ...(now.runsByItself ? { runsByItself: now.runsByItself } : {}),
      });
    },
    evolve: (state: BenchState, data: z.infer<typeof swung>): BenchState => {
      const after = afterMelting(state, data.opened);
      return {
        ...after,
        isDisplayLit: data.opened && state.isDisplayLit ? false : state.isDisplayLit,
        runsByItself: data.runsByItself ?? false,
        oven: { ...after.oven, isDoorClosed },
      };
    },
    describe: ({ opened, runsByItself }: z.infer<typeof swung>) =>
      [
        `door ${isDoorClosed ? 'closed' : 'open'}`,
        ...(runsByItself ? ['runs by itself'] : []),
        ...(opened ? ['a bang inside'] : []),
      ].join(', '),
  }) as const;

export const openDoor = action({
  command: 'OpenDoor',
  event: 'DoorOpened',
  ...setDoor(false),
});

export const closeDoor = action({
  command: 'CloseDoor',
  event: 'DoorClosed',
  ...setDoor(true),
});
