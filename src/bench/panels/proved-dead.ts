import type { WireEvent } from '../../../shared/bench/event.ts';
import { shownReading } from '../../../shared/bench/record.ts';
import { withoutUndone } from '../../../shared/bench/undone.ts';
import { terminalsOf } from '../../../shared/oven/targets.ts';
import type { OvenDefinition } from '../../../shared/oven/oven.ts';

/** V; a meter on DC volts that shows less than this across the capacitor has proved it dead. */
const deadBelow = 1;

/**
 * When the trainee last proved each high-voltage capacitor dead with the meter on DC volts across its
 * own two terminals; a run of the oven afterwards makes it void. Only what was read counts, never what
 * the circuit knows.
 */
export function provedDead(
  definition: OvenDefinition,
  record: readonly WireEvent[],
): { part: string; name: string; atMs: number }[] {
  const events = withoutUndone(record);
  return definition.parts
    .filter(({ kind }) => kind === 'hv-capacitor')
    .flatMap(({ ref, name }) => {
      const terminals = terminalsOf(definition)
        .filter((one) => one.part === ref && !one.kind.isBody)
        .map((one) => one.ref);
      const proof = events.findLast((event) => isProof(event, terminals));
      const charged = events.findLast(({ type }) => type === 'OvenRun' || type === 'CordPlugged');
      const isVoid =
        charged !== undefined &&
        proof !== undefined &&
        events.indexOf(charged) > events.indexOf(proof);
      return proof && !isVoid ? [{ part: ref, name, atMs: proof.benchMs }] : [];
    });
}

function isProof(event: WireEvent, terminals: readonly string[]): boolean {
  if (event.type !== 'ReadingTaken' && event.type !== 'ReadingCaptured') return false;
  const parsed = shownReading.safeParse(event.data);
  if (!parsed.success) return false;
  const { red, black, setting, value, isRelative } = parsed.data;
  return (
    setting.startsWith('dc-') &&
    !isRelative &&
    red !== black &&
    terminals.includes(red) &&
    terminals.includes(black) &&
    value !== null &&
    Math.abs(value) < deadBelow
  );
}
