import { z } from 'zod';
import { accept, action, refuse } from '../action.ts';
import { chargeAtUnplugging } from '../charge-at-unplugging.ts';
import { standsBy } from '../powered-run/powered-run.ts';

const nothing = z.strictObject({});
const seen = z.strictObject({ isDisplayLit: z.boolean() });

export const pullCord = action({
  command: 'PullCord',
  event: 'CordPulled',
  input: nothing,
  data: nothing,
  decide: ({ state }) =>
    state.isCordIn ? accept({}) : refuse('cord-is-out', 'The cord is out already.'),
  evolve: (state, _data, setup) => ({
    ...state,
    isCordIn: false,
    isDisplayLit: false,
    storage: chargeAtUnplugging(setup, state),
  }),
  describe: () => 'cord out',
});

export const plugCord = action({
  command: 'PlugCord',
  event: 'CordPlugged',
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
    return accept({ isDisplayLit: standsBy(setup.oven, state.oven) }, hazards);
  },
  evolve: (state, { isDisplayLit }) => ({ ...state, isCordIn: true, isDisplayLit }),
  describe: ({ isDisplayLit }) => `cord in, display ${isDisplayLit ? 'lit' : 'dark'}`,
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

const setDoor = (isDoorClosed: boolean) =>
  ({
    input: nothing,
    data: nothing,
    decide: ({ state }: { state: { oven: { isDoorClosed: boolean } } }) =>
      state.oven.isDoorClosed === isDoorClosed
        ? refuse('door-is-so', `The door is ${isDoorClosed ? 'closed' : 'open'} already.`)
        : accept({}),
  }) as const;

export const openDoor = action({
  command: 'OpenDoor',
  event: 'DoorOpened',
  ...setDoor(false),
  evolve: (state) => ({ ...state, oven: { ...state.oven, isDoorClosed: false } }),
  describe: () => 'door open',
});

export const closeDoor = action({
  command: 'CloseDoor',
  event: 'DoorClosed',
  ...setDoor(true),
  evolve: (state) => ({ ...state, oven: { ...state.oven, isDoorClosed: true } }),
  describe: () => 'door closed',
});
