import { z } from 'zod';
import { accept, action, refuse } from '../action.ts';
import { short, touch } from '../hazards.ts';
import { targetRefusal } from '../reach.ts';
import { target } from '../record.ts';

const onTarget = z.strictObject({ target });
const nothing = z.strictObject({});
const pair = z.strictObject({ from: target, to: target });

/** A crocodile clip is put on by hand: the hand meets the metal. The tip is insulated. */
export const fitDischargeClip = action({
  command: 'FitDischargeClip',
  event: 'DischargeClipFitted',
  input: onTarget,
  data: onTarget,
  decide: (bench, data) =>
    targetRefusal(bench, data.target) ??
    accept(data, touch(bench.setup, bench.state, [data.target])),
  evolve: (state, data) => ({ ...state, discharge: { ...state.discharge, clip: data.target } }),
  describe: (data) => `discharge lead clipped to ${data.target}`,
});

export const removeDischargeClip = action({
  command: 'RemoveDischargeClip',
  event: 'DischargeClipRemoved',
  input: nothing,
  data: nothing,
  decide: ({ state }) =>
    state.discharge.clip
      ? accept({})
      : refuse('clip-is-off', 'The clip of the discharge lead is on nothing.'),
  evolve: (state) => ({ ...state, discharge: { ...state.discharge, clip: null } }),
  describe: () => 'discharge lead unclipped',
});

export const touchDischargeTip = action({
  command: 'TouchDischargeTip',
  event: 'DischargeTipTouched',
  input: onTarget,
  data: onTarget,
  decide: (bench, data) => targetRefusal(bench, data.target) ?? accept(data),
  evolve: (state, data) => ({ ...state, discharge: { ...state.discharge, tip: data.target } }),
  describe: (data) => `discharge tip on ${data.target}`,
});

export const liftDischargeTip = action({
  command: 'LiftDischargeTip',
  event: 'DischargeTipLifted',
  input: nothing,
  data: nothing,
  decide: ({ state }) =>
    state.discharge.tip
      ? accept({})
      : refuse('tip-is-off', 'The tip of the discharge lead is on nothing.'),
  evolve: (state) => ({ ...state, discharge: { ...state.discharge, tip: null } }),
  describe: () => 'discharge tip off',
});

export const shortWithScrewdriver = action({
  command: 'ShortWithScrewdriver',
  event: 'ScrewdriverShorted',
  input: pair,
  data: pair,
  decide: (bench, data) =>
    targetRefusal(bench, data.from) ??
    targetRefusal(bench, data.to) ??
    (data.from === data.to
      ? refuse('same-target', 'The blade needs two places to bridge.')
      : accept(data, short(bench.setup, bench.state, [data.from, data.to]))),
  evolve: (state) => state,
  describe: (data) => `screwdriver across ${data.from} and ${data.to}`,
});
