import { z } from 'zod';
import { accept, action, refuse } from '../action.ts';
import { targetRefusal } from '../reach.ts';
import { target } from '../record.ts';

const probe = z.enum(['red', 'black']);
const placed = z.strictObject({ probe, target });
const removed = z.strictObject({ probe });

export const placeProbe = action({
  command: 'PlaceProbe',
  event: 'ProbePlaced',
  input: placed,
  data: placed,
  decide: (bench, data) => targetRefusal(bench, data.target) ?? accept(data),
  evolve: (state, data) => ({
    ...state,
    probes: { ...state.probes, [data.probe]: data.target },
    meter: { ...state.meter, lag: null },
  }),
  describe: (data) => `${data.probe} probe on ${data.target}`,
});

export const removeProbe = action({
  command: 'RemoveProbe',
  event: 'ProbeRemoved',
  input: removed,
  data: removed,
  decide: ({ state }, data) =>
    state.probes[data.probe]
      ? accept(data)
      : refuse('probe-in-hand', `The ${data.probe} probe is on nothing.`),
  evolve: (state, data) => ({
    ...state,
    probes: { ...state.probes, [data.probe]: null },
    meter: { ...state.meter, lag: null },
  }),
  describe: (data) => `${data.probe} probe off`,
});
