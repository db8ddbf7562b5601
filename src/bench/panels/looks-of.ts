import type { BenchState } from '../../../shared/bench/bench-state.ts';
import type { OvenDefinition, PartKindName } from '../../../shared/oven/oven.ts';

/** How the picture shows what a look from close finds: by kind and fault. Faults that cannot be seen are not here. */
const looks: Readonly<Partial<Record<PartKindName, Readonly<Record<string, string>>>>> = {
  fuse: { 'burnt-clip': 'burnt' },
  'filter-board': {
    'line-choke-open': 'burnt',
    'neutral-choke-open': 'burnt',
    'capacitor-shorted': 'cracked',
    'burnt-track': 'burnt',
  },
  'cut-out': { 'high-resistance': 'burnt' },
  'door-switch': { 'high-resistance': 'burnt', 'lever-bent': 'bent' },
  'board-transformer': { 'shorted-turns': 'burnt' },
  'control-board': { 'bridge-shorted': 'cracked' },
  'mechanical-timer': {
    'main-burnt': 'burnt-2',
    'power-burnt': 'burnt-3',
    'bell-loose': 'bell',
    'leaky-to-chassis': 'greasy',
  },
  resistor: { drifted: 'burnt' },
  'hv-fuse': { bridged: 'bridged', 'burnt-holder': 'burnt' },
  lamp: { open: 'blown', shorted: 'burnt' },
  motor: { 'shorted-turns': 'burnt', greasy: 'greasy' },
  'hv-transformer': { 'hv-shorted-to-core': 'burnt', 'heater-winding-shorted-to-core': 'burnt' },
  'hv-capacitor': { shorted: 'swollen', 'leaky-to-can': 'oil', 'shorted-to-can': 'burnt' },
  'hv-diode': { shorted: 'cracked' },
  magnetron: { 'heater-loose': 'burnt', leaky: 'burnt', 'cracked-magnet': 'cracked' },
};

/** What the picture shows on a part that was looked at from close. */
export function looksOf(definition: OvenDefinition, state: BenchState, ref: string): string[] {
  const kind = definition.parts.find((part) => part.ref === ref)?.kind;
  const table = kind === undefined ? undefined : looks[kind];
  return state.oven.faults
    .filter(({ on }) => on === ref)
    .map(({ fault }) => table?.[fault])
    .filter((look) => look !== undefined);
}
