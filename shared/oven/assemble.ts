/**
 * The oven and what the bench has connected to it, as one circuit.
 *   terminal C1.1 is node `C1.1`; a lifted lead end is node `W12/a`; a seated one is its terminal.
 *   lead: R = R(wire) + contacts; body to chassis 5 mOhm; varnish 1e12 Ohm, a cleaned spot 1 mOhm.
 * Node 0 is the chassis star point. Source: ENGINE sections 2 and 3, common practice.
 */
import type { Circuit, Element, NodeName } from '../engine/circuit/circuit.ts';
import type { OvenLead, OvenPart, TargetRef } from './oven.ts';
import type { BenchBranch, DrawnOven, OvenState } from './oven-state.ts';
import { CONNECTOR_CONTACT, leadFaults } from './lead-faults.ts';
import type { TerminalKind } from './part-kind.ts';
import { partKinds } from './parts/catalogue.ts';
import { readFaults } from './pieces/read-faults.ts';
import { BROKEN, resistance } from './pieces/resistance.ts';

/** Ohm: bolts of a body to the chassis. */
const BOLTS = 5e-3;
/** Ohm: a probe on varnish, and on bare metal. */
const VARNISH = 1e12;
const BARE_METAL = 1e-3;
/** Ohm: least that a bench tool puts in series, so that no tool makes a loop without resistance. */
const LEAST_BRANCH = 1e-4;
const BATTERY = { volts: 12.6, inside: 0.05, series: 1000 };

/** The node a probe on this target touches. */
export function nodeOf(state: OvenState, target: TargetRef): NodeName {
  return state.leadEnds[target] ?? target;
}

function metalNode(part: OvenPart, terminal: TerminalKind): NodeName {
  const ref = `${part.ref}.${terminal.id}`;
  return terminal.isVarnished ? `${ref}:metal` : ref;
}

/** A part by itself, in this state: its elements without varnish and bolts. */
export function partElements(part: OvenPart, oven: DrawnOven, state: OvenState): Element[] {
  const kind = partKinds[part.kind];
  const terminals = kind.terminals(part.variant);
  const values = oven.values[part.ref] ?? {};
  return kind.circuit({
    ref: part.ref,
    variant: part.variant,
    values,
    value: (name) => {
      const value = values[name];
      if (value === undefined) throw new Error(`${part.ref} has no value ${name}`);
      return value;
    },
    faults: state.faults.filter(({ on }) => on === part.ref),
    node: (id) => {
      const terminal = terminals.find((candidate) => candidate.id === id);
      if (!terminal) throw new Error(`${part.ref} has no terminal ${id}`);
      return metalNode(part, terminal);
    },
    inner: (name) => `${part.ref}:${name}`,
    isActuated: state.isDoorClosed || state.pressed.includes(part.ref),
    isPressed: state.pressed.includes(part.ref),
    isOpened: state.opened.includes(part.ref),
    isEnergised: state.energised.includes(part.ref),
    isHot: state.hot?.includes(part.ref) ?? false,
  });
}

/** Varnish between a spot and its metal, and the bolts of a body. */
export function mounting(part: OvenPart, state: OvenState): Element[] {
  return partKinds[part.kind].terminals(part.variant).flatMap((terminal) => {
    const ref = `${part.ref}.${terminal.id}`;
    const metal = metalNode(part, terminal);
    const spot = state.cleaned.includes(ref) ? BARE_METAL : VARNISH;
    return [
      ...(terminal.isBody ? [resistance(`${ref}:bolts`, metal, '0', BOLTS)] : []),
      ...(terminal.isVarnished ? [resistance(`${ref}:spot`, ref, metal, spot)] : []),
    ];
  });
}

/** A lead by itself, in this state. */
export function leadElements(lead: OvenLead, state: OvenState): Element[] {
  const fault = readFaults(
    leadFaults,
    state.faults.filter(({ on }) => on === lead.ref),
  );
  const ends = (['a', 'b'] as const).map((side) => {
    const target = `${lead.ref}/${side}`;
    const burnt = `burnt-connector-${side}`;
    const isSeated = (state.leadEnds[target] ?? null) !== null;
    const joint = fault.has(burnt) ? fault.value(burnt, 'ohms') : 0;
    return { node: nodeOf(state, target), contact: isSeated ? CONNECTOR_CONTACT + joint : 0 };
  });
  const [first, second] = ends;
  // Both ends on one terminal: a loop of wire that carries nothing.
  if (!first || !second || first.node === second.node) return [];
  const wire = fault.has('open-inside') ? BROKEN : lead.resistance;
  const ohms = wire + first.contact + second.contact;
  return [resistance(lead.ref, first.node, second.node, ohms)];
}

/** The battery stands on the bench, connected to nothing until a clip or a probe touches it. */
function battery(): Element[] {
  const emf = 'BAT:emf';
  return [
    {
      kind: 'voltage-source',
      name: emf,
      nodes: [emf, 'BAT.neg'],
      wave: { shape: 'dc', value: BATTERY.volts },
    },
    resistance('BAT:inside', emf, 'BAT.pos', BATTERY.inside),
    resistance('BAT:series', 'BAT.pos', 'BAT.1k', BATTERY.series),
  ];
}

function branchElements(branch: BenchBranch, state: OvenState): Element[] {
  const name = `bench:${branch.name}`;
  const from = nodeOf(state, branch.from);
  const to = nodeOf(state, branch.to);
  const ohms = Math.max(branch.resistance, LEAST_BRANCH);
  if (branch.volts === 0) return from === to ? [] : [resistance(name, from, to, ohms)];
  return [
    resistance(name, from, name, ohms),
    {
      kind: 'voltage-source',
      name: `${name}:source`,
      nodes: [name, to],
      wave: { shape: 'dc', value: branch.volts },
    },
  ];
}

/**
 * The circuit of the oven in this state with these bench branches. SI units. Every state that names
 * terminals, parts and faults of the oven gives a circuit the engine accepts; a lifted node is legal.
 */
export function assemble(
  oven: DrawnOven,
  state: OvenState,
  branches: readonly BenchBranch[],
): Circuit {
  const { parts, leads } = oven.definition;
  return {
    elements: [
      ...parts.flatMap((part) => [...partElements(part, oven, state), ...mounting(part, state)]),
      ...leads.flatMap((lead) => leadElements(lead, state)),
      ...battery(),
      ...branches.flatMap((branch) => branchElements(branch, state)),
    ],
  };
}
