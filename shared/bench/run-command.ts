import type { Refusal } from './action.ts';
import type { BenchState } from './bench-state.ts';
import type { BenchCommand } from './catalogue.ts';
import { actionByCommand, actionByEvent, evolverByEvent } from './catalogue.ts';
import type { WireEvent } from './event.ts';
import type { HazardFound } from './hazards.ts';
import { meterHazards } from './hazards.ts';
import { passTime } from './pass-time.ts';
import type { Setup } from './setup.ts';
import { skippedMs } from './skipped-ms.ts';
import { withWayBack } from './way-back.ts';

export type Ran =
  { ok: true; events: WireEvent[]; state: BenchState } | { ok: false; refusal: Refusal };

const refused = (code: string, message: string): Ran => ({ ok: false, refusal: { code, message } });

/** decide and evolve in one: what a command at `atMs` of bench time makes happen, or why it cannot. */
export function runCommand(
  setup: Setup,
  before: BenchState,
  command: BenchCommand,
  atMs: number,
): Ran {
  const action = actionByCommand.get(command.type);
  if (!action) return refused('no-such-command', `There is no action ${command.type}.`);
  if (before.isHandedIn) return refused('handed-in', 'The job sheet is handed in.');
  if (!(atMs >= before.benchMs)) return refused('time-runs-back', 'Bench time cannot run back.');
  const parsed = action.input.safeParse(command.data);
  if (!parsed.success) return refused('bad-input', parsed.error.issues[0]?.message ?? 'Bad input.');
  const { state, trace } = passTime(setup, before, atMs);
  const decision = action.decide({ setup, state, before, trace }, parsed.data);
  if (!decision.ok) return { ok: false, refusal: decision.refusal };
  const primary = wire(action.event, decision.data, atMs);
  const hurt = decision.hazards.map((hazard) => wire('HazardHappened', hazard, atMs));
  const events = [primary, ...hurt];
  let after = events.reduce((bench, event) => apply(setup, bench, event), state);
  const met = action.isReturning ? [] : landed(setup, state, after);
  for (const hazard of met) {
    const event = wire('HazardHappened', hazard, atMs);
    events.push(event);
    after = apply(setup, after, event);
  }
  return { ok: true, events, state: after };
}

/** One recorded event on a bench whose time has already been brought to it. */
export function apply(setup: Setup, state: BenchState, event: WireEvent): BenchState {
  const evolver = evolverByEvent.get(event.type);
  if (!evolver) throw new Error(`no evolver for ${event.type}`);
  const evolved = evolver.evolve(state, evolver.data.parse(event.data), setup);
  const skipped = skippedMs(event);
  const after = skipped > 0 ? { ...evolved, skippedMs: state.skippedMs + skipped } : evolved;
  const action = actionByEvent.get(event.type);
  return action && !action.isReturning ? withWayBack(setup, state, after, event) : after;
}

/** The tips meet something new: their own hazards come after the action. */
function landed(setup: Setup, before: BenchState, after: BenchState): HazardFound[] {
  const isSame =
    before.probes === after.probes &&
    before.meter.setting === after.meter.setting &&
    before.isCordIn === after.isCordIn &&
    before.oven === after.oven;
  return isSame ? [] : meterHazards(setup, after);
}

const wire = (type: string, data: object, benchMs: number): WireEvent => ({
  type,
  version: 1,
  data: { ...data },
  benchMs,
});
