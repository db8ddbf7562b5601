import type { BenchState } from '../../../shared/bench/bench-state.ts';
import type { OvenDefinition } from '../../../shared/oven/oven.ts';
import { batteryTargets, terminalsOf } from '../../../shared/oven/targets.ts';

export interface TargetWords {
  /** beside its reference: "diode side" */ short: string;
  /** on its own: "high-voltage capacitor, diode side" */ full: string;
}

const same = (words: string): TargetWords => ({ short: words, full: words });

/** What a tip is on, in words, and whether varnish keeps it from the metal. */
export function targetWords(
  definition: OvenDefinition,
  { oven }: BenchState,
  target: string | null,
): TargetWords {
  if (target === null) return same('nothing');
  const lead = definition.leads.find(({ ref }) => ref === target.split('/')[0]);
  if (lead) return same(`lifted, ${lead.name}`);
  const terminal = terminalsOf(definition).find(({ ref }) => ref === target);
  const part = definition.parts.find(({ ref }) => ref === terminal?.part);
  if (!terminal || !part) {
    return same(Object.entries(batteryTargets).find(([ref]) => ref === target)?.[1] ?? target);
  }
  const { name, isVarnished } = terminal.kind;
  const metal = oven.cleaned.includes(target) ? 'cleaned spot' : 'on the varnish';
  const short = isVarnished ? `${name}, ${metal}` : name;
  return { short, full: `${part.name}, ${short}` };
}
