import type { BenchState } from '../../../shared/bench/bench-state.ts';
import type { OvenDefinition } from '../../../shared/oven/oven.ts';
import { describeTarget } from '../../../shared/oven/targets.ts';
import { seatedEnds } from './seated-ends.ts';

/** What lies under the pointer: its reference, and what it is in words. */
export function hoverWords(
  definition: OvenDefinition,
  state: BenchState,
  ref: string,
): { ref: string; words: string } | null {
  const thing = [...definition.parts, ...definition.leads].find((one) => one.ref === ref);
  if (thing) return { ref, words: thing.name };
  const words = describeTarget(definition, ref)?.replace(`${ref}, `, '');
  if (words === undefined) return null;
  const ends = seatedEnds(state.oven, ref);
  const isTerminal = !(ref in state.oven.leadEnds) && !ref.startsWith('BAT.');
  const leads = ends.length > 0 ? `${ends.join(', ')} on it` : isTerminal ? 'no lead on it' : '';
  return { ref, words: [words, leads].filter(Boolean).join(', ') };
}
