import type { BenchState } from '../../../shared/bench/bench-state.ts';
import type { OvenDefinition } from '../../../shared/oven/oven.ts';
import { describeTarget, terminalsOf } from '../../../shared/oven/targets.ts';

/** What a tip is on: the target in words, and whether varnish keeps it from the metal. */
export function targetWords(
  definition: OvenDefinition,
  { oven }: BenchState,
  target: string | null,
): string {
  if (target === null) return 'on nothing';
  const words = describeTarget(definition, target) ?? target;
  const terminal = terminalsOf(definition).find(({ ref }) => ref === target);
  if (!terminal?.kind.isVarnished) return words;
  return `${words}, ${oven.cleaned.includes(target) ? 'cleaned spot' : 'on the varnish'}`;
}
