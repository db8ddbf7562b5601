import type { BenchCommand } from '../../shared/bench/catalogue.ts';
import { begin } from '../../shared/bench/begin.ts';
import { actionByEvent } from '../../shared/bench/catalogue.ts';
import type { WireEvent } from '../../shared/bench/event.ts';
import { poweredRun } from '../../shared/bench/powered-run/powered-run.ts';
import { runCommand } from '../../shared/bench/run-command.ts';
import { makeSetup, type SetupInput } from '../../shared/bench/setup.ts';
import type { AppliedFault } from '../../shared/oven/fault.ts';
import { asFitted } from '../../shared/oven/initial-state.ts';

/** The commands behind recorded events, run anew: every event that comes of them, as text to the last bit. */
export function rerun(input: SetupInput, recorded: readonly WireEvent[]): string {
  const setup = makeSetup(input);
  const began = begin(setup);
  let state = began.state;
  const events: WireEvent[] = [began.event];
  for (const { type, data, benchMs } of recorded.slice(1)) {
    const action = actionByEvent.get(type);
    if (!action) continue;
    const asked = Object.keys(action.input.shape).filter((key) => key in data);
    const command = {
      type: action.command,
      data: Object.fromEntries(asked.map((key) => [key, data[key]])),
    } as BenchCommand;
    const ran = runCommand(setup, state, command, benchMs);
    if (!ran.ok) return `${type} at ${benchMs} ms: ${ran.refusal.message}`;
    events.push(...ran.events);
    state = ran.state;
  }
  return JSON.stringify({ events, storage: state.storage });
}

/** What a minute's run makes of each fault alone, as text to the last bit. */
export const runsOf = (input: SetupInput, faults: readonly AppliedFault[]): string[] =>
  faults.map((fault) => {
    const { oven } = makeSetup(input);
    return JSON.stringify(poweredRun(oven, asFitted(input.definition, [fault]), 60));
  });
