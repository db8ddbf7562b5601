import { z } from 'zod';
import { accept, action, refuse } from '../action.ts';
import { touch } from '../hazards.ts';
import { targetRefusal } from '../reach.ts';
import { target } from '../record.ts';

const clip = z.enum(['neg', 'oneK']);
const placed = z.strictObject({ clip, target });
const removed = z.strictObject({ clip });
const words = { neg: 'battery negative', oneK: 'battery positive through 1 kΩ' } as const;

export const clipBattery = action({
  command: 'ClipBattery',
  event: 'BatteryClipped',
  input: placed,
  data: placed,
  decide: (bench, data) =>
    targetRefusal(bench, data.target) ??
    (data.target.startsWith('BAT.')
      ? refuse('own-pole', 'Clip the battery to the part under test, not to itself.')
      : accept(data, touch(bench.setup, bench.state, [data.target]))),
  evolve: (state, data) => ({ ...state, battery: { ...state.battery, [data.clip]: data.target } }),
  describe: (data) => `${words[data.clip]} on ${data.target}`,
});

export const unclipBattery = action({
  command: 'UnclipBattery',
  event: 'BatteryUnclipped',
  input: removed,
  data: removed,
  decide: ({ state }, data) =>
    state.battery[data.clip]
      ? accept(data)
      : refuse('clip-is-off', `The ${words[data.clip]} clip is on nothing.`),
  evolve: (state, data) => ({ ...state, battery: { ...state.battery, [data.clip]: null } }),
  describe: (data) => `${words[data.clip]} off`,
});
