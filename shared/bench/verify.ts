import type { BenchState } from './bench-state.ts';
import type { BenchCommand } from './catalogue.ts';
import { actionByEvent, evolverByEvent } from './catalogue.ts';
import type { WireEvent } from './event.ts';
import { evolve } from './fold.ts';
import { runCommand } from './run-command.ts';
import { isSameEvent } from './same-event.ts';
import type { Setup } from './setup.ts';

export type Verified =
  | { ok: true; state: BenchState }
  | {
      ok: false;
      /** which of the events */ index: number;
      reason: 'unknown-type' | 'invalid-data' | 'cannot-have-happened';
      message: string;
      path?: string;
    };

/** Runs the same rules over events that another machine says happened, and takes only what they allow. */
export function verify(setup: Setup, from: BenchState, events: readonly WireEvent[]): Verified {
  let state = from;
  let index = 0;
  while (index < events.length) {
    const step = verifyDecision(setup, state, events, index);
    if (!step.ok) return step;
    state = step.state;
    index += step.count;
  }
  return { ok: true, state };
}

function verifyDecision(
  setup: Setup,
  state: BenchState,
  events: readonly WireEvent[],
  index: number,
): Exclude<Verified, { ok: true }> | { ok: true; state: BenchState; count: number } {
  const event = events[index] as WireEvent;
  const fail = (
    reason: 'unknown-type' | 'invalid-data' | 'cannot-have-happened',
    message: string,
    path?: string,
  ) => ({ ok: false as const, index, reason, message, ...(path ? { path } : {}) });

  if (!evolverByEvent.has(event.type)) {
    return fail('unknown-type', `There is no event type ${event.type}.`);
  }
  const action = actionByEvent.get(event.type);
  if (!action) {
    return fail(
      'cannot-have-happened',
      `${event.type} does not happen without what brings it about.`,
    );
  }
  const data = action.data.safeParse(event.data);
  if (!data.success) {
    const issue = data.error.issues[0];
    return fail(
      'invalid-data',
      issue?.message ?? 'Bad data.',
      ['data', ...(issue?.path ?? [])].join('.'),
    );
  }
  const command = { type: action.command, data: pick(data.data, Object.keys(action.input.shape)) };
  const ran = runCommand(setup, state, command as BenchCommand, event.benchMs);
  if (!ran.ok) return fail('cannot-have-happened', ran.refusal.message);
  const claimed = events.slice(index, index + ran.events.length);
  const odd = ran.events.findIndex((one, i) => !claimed[i] || !isSameEvent(one, claimed[i]));
  if (odd >= 0) {
    const told = claimed[odd];
    return {
      ...fail(
        'cannot-have-happened',
        told
          ? `${told.type} does not agree with what the circuit gives.`
          : `${ran.events[odd]?.type ?? event.type} is missing after ${event.type}.`,
      ),
      index: index + odd,
    };
  }
  // What was judged on the trainee's machine is what is kept.
  const after = claimed.reduce((bench, one) => evolve(setup, bench, one), state);
  return { ok: true, state: after, count: claimed.length };
}

const pick = (data: Record<string, unknown>, keys: readonly string[]) =>
  Object.fromEntries(keys.filter((key) => key in data).map((key) => [key, data[key]]));
