import { z } from 'zod';
import { accept, action, refuse } from '../action.ts';
import type { Bench } from '../action.ts';
import type { BenchState } from '../bench-state.ts';
import { targetRefusal } from '../reach.ts';
import type { HazardFound } from '../hazards.ts';
import { pinch, touch } from '../hazards.ts';
import { probeColour, probeHold, target, type ProbeColour, type ProbeHold } from '../record.ts';

const probe = probeColour;
const placed = z.strictObject({ probe, target });
const removed = z.strictObject({ probe });
const held = z.strictObject({ probe, hold: probeHold });

export const placeProbe = action({
  command: 'PlaceProbe',
  event: 'ProbePlaced',
  input: placed,
  data: placed,
  decide: (bench, data) =>
    targetRefusal(bench, data.target) ??
    accept(
      data,
      handMeets(bench, { ...bench.state, probes: placedAt(bench.state, data) }, data.probe),
    ),
  evolve: (state, data) => ({
    ...state,
    probes: placedAt(state, data),
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

/** By the handle, with a clip lead put on it, or with the fingers on its metal: a choice for good or ill. */
export const holdProbe = action({
  command: 'HoldProbe',
  event: 'ProbeHeld',
  input: held,
  data: held,
  decide: (bench, data) =>
    bench.state.holds[data.probe] === data.hold
      ? refuse('held-so', `The ${data.probe} probe is held like that already.`)
      : accept(data, handMeets(bench, heldAs(bench.state, data), data.probe)),
  evolve: heldAs,
  describe: (data) => `${data.probe} probe ${holdWords[data.hold]}`,
});

const holdWords: Record<ProbeHold, string> = {
  handle: 'held by its handle',
  clip: 'on a clip lead',
  fingers: 'tip held in the fingers',
};

function heldAs(state: BenchState, { probe: which, hold }: z.infer<typeof held>): BenchState {
  return { ...state, holds: { ...state.holds, [which]: hold } };
}

const placedAt = (state: BenchState, data: z.infer<typeof placed>): BenchState['probes'] => ({
  ...state.probes,
  [data.probe]: data.target,
});

/** A clip is put on, and a tip pinched, by a hand that meets the metal; `after`: the bench then, nothing having flowed yet. */
function handMeets({ setup, state }: Bench, after: BenchState, which: ProbeColour): HazardFound[] {
  const at = after.probes[which];
  if (!at || after.holds[which] === 'handle') return [];
  const alone = touch(setup, state, [at]);
  return alone.length > 0 ? alone : pinch(setup, state, after);
}
