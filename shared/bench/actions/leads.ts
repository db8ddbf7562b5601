import { z } from 'zod';
import { leadEndRef, terminalRef } from '../../oven/oven.ts';
import { terminalsOf } from '../../oven/targets.ts';
import { accept, action, refuse } from '../action.ts';
import type { BenchState } from '../bench-state.ts';
import { touch } from '../hazards.ts';
import { insideRefusal } from '../reach.ts';

const onEnd = z.strictObject({ end: leadEndRef });
const lifted = z.strictObject({ end: leadEndRef, from: terminalRef });
const labelled = z.strictObject({ end: leadEndRef, text: z.string().trim().min(1).max(16) });
const fitted = z.strictObject({ end: leadEndRef, terminal: terminalRef });

export const liftLead = action({
  command: 'LiftLead',
  event: 'LeadLifted',
  input: onEnd,
  data: lifted,
  decide: (bench, { end }) => {
    const from = bench.state.oven.leadEnds[end];
    if (from === undefined) return refuse('no-such-lead', `There is no lead end ${end}.`);
    if (from === null) return refuse('lifted-already', `${end} is lifted already.`);
    return insideRefusal(bench) ?? accept({ end, from }, touch(bench.setup, bench.state, [from]));
  },
  evolve: (state, { end }) => seat(state, end, null),
  describe: ({ end, from }) => `${end} lifted off ${from}`,
});

export const labelLead = action({
  command: 'LabelLead',
  event: 'LeadLabelled',
  input: labelled,
  data: labelled,
  decide: (bench, data) =>
    data.end in bench.state.oven.leadEnds
      ? (insideRefusal(bench) ?? accept(data))
      : refuse('no-such-lead', `There is no lead end ${data.end}.`),
  evolve: (state, { end, text }) => ({ ...state, labels: { ...state.labels, [end]: text } }),
  describe: ({ end, text }) => `${end} labelled "${text}"`,
});

export const refitLead = action({
  command: 'RefitLead',
  event: 'LeadRefitted',
  input: fitted,
  data: fitted,
  decide: (bench, data) => {
    const { setup, state } = bench;
    const seated = state.oven.leadEnds[data.end];
    if (seated === undefined) return refuse('no-such-lead', `There is no lead end ${data.end}.`);
    if (seated !== null)
      return refuse('seated-already', `${data.end} sits on ${seated}. Lift it first.`);
    const terminal = terminalsOf(setup.oven.definition).find((one) => one.ref === data.terminal);
    if (!terminal) return refuse('no-such-terminal', `There is no terminal ${data.terminal}.`);
    if (terminal.kind.isVarnished || terminal.kind.isBody) {
      return refuse('no-tab', `${data.terminal} has no tab for a connector.`);
    }
    return insideRefusal(bench) ?? accept(data, touch(setup, state, [data.terminal, data.end]));
  },
  evolve: (state, { end, terminal }) => offLooseEnd(seat(state, end, terminal), end),
  describe: ({ end, terminal }) => `${end} fitted on ${terminal}`,
});

const seat = (state: BenchState, end: string, terminal: string | null): BenchState => ({
  ...state,
  oven: { ...state.oven, leadEnds: { ...state.oven.leadEnds, [end]: terminal } },
});

/** A seated connector hides its metal: whatever touched the loose end falls off. */
function offLooseEnd(state: BenchState, end: string): BenchState {
  const off = <T extends Record<string, string | null>>(hand: T): T =>
    Object.fromEntries(
      Object.entries(hand).map(([key, target]) => [key, target === end ? null : target]),
    ) as T;
  return {
    ...state,
    probes: off(state.probes),
    discharge: off(state.discharge),
    battery: off(state.battery),
  };
}
