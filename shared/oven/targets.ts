import type { LeadEndRef, OvenDefinition, PartRef, TargetRef, TerminalRef } from './oven.ts';
import type { OvenState } from './oven-state.ts';
import type { TerminalKind } from './part-kind.ts';
import { partKinds } from './parts/catalogue.ts';

export interface Terminal {
  ref: TerminalRef;
  part: PartRef;
  kind: TerminalKind;
}

/** The clips of the bench battery. */
export const batteryTargets = {
  'BAT.pos': 'battery, positive pole',
  'BAT.neg': 'battery, negative pole',
  'BAT.1k': 'battery, positive through 1 kΩ',
} as const;

/** Every terminal of every part, in the order of the definition. */
export function terminalsOf(definition: OvenDefinition): Terminal[] {
  return definition.parts.flatMap((part) =>
    partKinds[part.kind]
      .terminals(part.variant)
      .map((kind) => ({ ref: `${part.ref}.${kind.id}`, part: part.ref, kind })),
  );
}

/** Lead ends that lie loose. */
export function liftedEnds(state: OvenState): LeadEndRef[] {
  return Object.entries(state.leadEnds)
    .filter(([, terminal]) => terminal === null)
    .map(([end]) => end);
}

/** All that a probe can touch now: terminals, lifted lead ends, the clips of the bench battery. */
export function targetsOf(definition: OvenDefinition, state: OvenState): TargetRef[] {
  return [
    ...terminalsOf(definition).map(({ ref }) => ref),
    ...liftedEnds(state),
    ...Object.keys(batteryTargets),
  ];
}

/** A target in words: "C1.2, high-voltage capacitor, diode side"; null when the oven has no such target. */
export function describeTarget(definition: OvenDefinition, target: TargetRef): string | null {
  const battery = Object.entries(batteryTargets).find(([ref]) => ref === target);
  if (battery) return battery[1];
  const end = /^(W[0-9]+)\/([ab])$/.exec(target);
  if (end) {
    const lead = definition.leads.find(({ ref }) => ref === end[1]);
    const home = lead?.ends[end[2] === 'a' ? 0 : 1];
    return lead && home ? `${target}, ${lead.name}, end for ${home}` : null;
  }
  const terminal = terminalsOf(definition).find(({ ref }) => ref === target);
  const part = definition.parts.find(({ ref }) => ref === terminal?.part);
  return terminal && part ? `${target}, ${part.name}, ${terminal.kind.name}` : null;
}
