import type { AppliedFault } from './fault.ts';
import type { LeadEndRef, OvenDefinition, TerminalRef } from './oven.ts';
import { partKinds } from './parts/catalogue.ts';

const sides = ['a', 'b'] as const;

const partOf = (terminal: TerminalRef): string => terminal.split('.')[0] ?? terminal;

/** Where each lead end belongs. */
export function homes(definition: OvenDefinition): Map<LeadEndRef, TerminalRef> {
  return new Map(
    definition.leads.flatMap((lead) =>
      sides.map((side, index): [LeadEndRef, TerminalRef] => [
        `${lead.ref}/${side}`,
        lead.ends[index] as TerminalRef,
      ]),
    ),
  );
}

/** The tabs of a part that a connector can slip onto by mistake; a moulded plug and the chassis have none. */
function tabsOf(definition: OvenDefinition, ref: string): TerminalRef[] {
  const part = definition.parts.find((one) => one.ref === ref);
  if (!part || part.kind === 'plug' || part.kind === 'chassis') return [];
  return partKinds[part.kind]
    .terminals(part.variant)
    .filter(({ isBody, isVarnished }) => !isBody && !isVarnished)
    .map(({ id }) => `${ref}.${id}`);
}

/** The tab beside this one on the same part: where a hand in a hurry puts a connector; null: there is none. */
export function neighbourTab(
  definition: OvenDefinition,
  terminal: TerminalRef,
): TerminalRef | null {
  const tabs = tabsOf(definition, partOf(terminal));
  const at = tabs.indexOf(terminal);
  return at < 0 || tabs.length < 2 ? null : (tabs[(at + 1) % tabs.length] ?? null);
}

/**
 * The lead end on another tab of the same part with which this one is easily exchanged; null: there
 * is none. A part of two tabs does not mind.
 */
export function neighbourEnd(definition: OvenDefinition, end: LeadEndRef): LeadEndRef | null {
  const all = homes(definition);
  const home = all.get(end);
  if (home === undefined) return null;
  const tabs = tabsOf(definition, partOf(home));
  if (tabs.length < 3) return null;
  const at = tabs.indexOf(home);
  const others = [...tabs.slice(at + 1), ...tabs.slice(0, at)];
  for (const tab of others)
    for (const [other, seat] of all) if (seat === tab && !sameLead(other, end)) return other;
  return null;
}

const sameLead = (a: LeadEndRef, b: LeadEndRef): boolean => a.split('/')[0] === b.split('/')[0];

const sideOf = (fault: string): 'a' | 'b' => (fault.endsWith('-b') ? 'b' : 'a');

/** Whether a lead of this oven can have been misplaced in this way: it needs a neighbour to go to. */
export function isPossible(definition: OvenDefinition, lead: string, fault: string): boolean {
  const end = `${lead}/${sideOf(fault)}`;
  if (fault.startsWith('swapped-')) return neighbourEnd(definition, end) !== null;
  if (!fault.startsWith('wrong-terminal-')) return true;
  const home = homes(definition).get(end);
  return home !== undefined && neighbourTab(definition, home) !== null;
}

/** Where every lead end sits after the repairs that these faults stand for; null: left off. */
export function seatsAfter(
  definition: OvenDefinition,
  faults: readonly AppliedFault[],
): Record<LeadEndRef, TerminalRef | null> {
  const all = homes(definition);
  const seats = new Map<LeadEndRef, TerminalRef | null>(all);
  for (const { on, fault, other } of faults) {
    const end = `${on}/${sideOf(fault)}`;
    const home = all.get(end);
    if (home === undefined) continue;
    if (fault.startsWith('off-')) seats.set(end, null);
    if (fault.startsWith('wrong-terminal-'))
      seats.set(end, other ?? neighbourTab(definition, home) ?? home);
    if (fault.startsWith('swapped-')) {
      const partner = other ?? neighbourEnd(definition, end) ?? end;
      seats.set(end, all.get(partner) ?? home);
      if (partner !== end) seats.set(partner, home);
    }
  }
  return Object.fromEntries(seats);
}
