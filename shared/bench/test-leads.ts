/**
 * How the tips of the two test leads are held, and what that puts into the circuit.
 *   handle: held by the insulated body; nothing is added
 *   clip: a clip lead between probe and terminal, 0.2 Ohm in series (ENGINE section 2)
 *   fingers: the metal of the tip pinched against the terminal; with both tips so, the body lies
 *     across them: about 1 MOhm (common practice, no source)
 */
import type { MeterDefinition } from '../instruments/meter.ts';
import type { BenchBranch } from '../oven/oven-state.ts';
import type { BenchState } from './bench-state.ts';
import type { ProbeColour, ProbeHold } from './record.ts';
import type { Setup } from './setup.ts';

/** Ohm, each */
const clipLeadOhms = 0.2;
/** Ohm, dry fingers of one hand to those of the other */
const fingersOhms = 1e6;

type Holds = Readonly<Record<ProbeColour, ProbeHold>>;

export const byHandle: Holds = { red: 'handle', black: 'handle' };

const count = (holds: Holds, hold: ProbeHold): number =>
  Number(holds.red === hold) + Number(holds.black === hold);

/** The meter with all that lies between its jacks and the terminals: its test leads, and clip leads on them. */
export function meterOnLeads({ meter }: Setup, { holds }: BenchState): MeterDefinition {
  const clips = count(holds, 'clip');
  return clips === 0 ? meter : { ...meter, leadOhms: meter.leadOhms + clips * clipLeadOhms };
}

/** The body across the tips; null: not with both hands on metal. */
export function fingersBranch({ holds, probes: { red, black } }: BenchState): BenchBranch | null {
  if (count(holds, 'fingers') < 2 || !red || !black || red === black) return null;
  return { name: 'fingers', from: red, to: black, resistance: fingersOhms, volts: 0 };
}

/** Kept with a reading only where it is not the usual. */
export const heldOtherwise = (holds: Holds): { held?: Holds } =>
  count(holds, 'handle') === 2 ? {} : { held: holds };

/** On the job sheet and in the log: `through a clip lead`, `tips in the fingers`; empty: by the handles. */
export function heldWords(held: Holds | undefined): string {
  if (!held) return '';
  const words = (hold: ProbeHold, one: string, both: string): string[] => {
    const on = (['red', 'black'] as const).filter((probe) => held[probe] === hold);
    return on.length === 2 ? [both] : on.map((probe) => `${probe} ${one}`);
  };
  return [
    ...words('clip', 'through a clip lead', 'through clip leads'),
    ...words('fingers', 'tip in the fingers', 'tips in the fingers'),
  ].join(', ');
}
