import type { BenchState } from './bench-state.ts';
import { begin } from './begin.ts';
import type { BenchCommand } from './catalogue.ts';
import type { WireEvent } from './event.ts';
import { runCommand } from './run-command.ts';
import type { Setup } from './setup.ts';

/** One step of a written-down attempt: how long the hand takes, then what it does. */
export type Step = readonly [seconds: number, command: BenchCommand];

export type Performed =
  | { ok: true; events: WireEvent[]; state: BenchState }
  | { ok: false; step: number; message: string };

/** Does a written-down attempt on the real bench: the readings are what the circuit gives. */
export function perform(setup: Setup, steps: readonly Step[]): Performed {
  const started = begin(setup);
  const events = [started.event];
  let { state } = started;
  for (const [step, [seconds, command]] of steps.entries()) {
    const ran = runCommand(setup, state, command, state.benchMs + Math.round(seconds * 1000));
    if (!ran.ok) return { ok: false, step, message: `${command.type}: ${ran.refusal.message}` };
    events.push(...ran.events);
    state = ran.state;
  }
  return { ok: true, events, state };
}
