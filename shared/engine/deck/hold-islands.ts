import type { Circuit, Element } from '../circuit/circuit.ts';
import { nodeSets } from '../circuit/node-sets.ts';

/** Ohm: the reciprocal of the conductance that the engine gives a lifted node otherwise. */
const HOLDING_RESISTANCE = 1e12;

/**
 * The circuit with a resistor to ground from one node of every part that no direct current can
 * leave. Other programs put no conductance on the nodes of a deck; with this the engine needs none
 * on the others either, and a deck of megohms agrees with them.
 */
export function holdIslands(circuit: Circuit): Circuit {
  const sets = nodeSets();
  const nodes = new Set<string>();
  for (const element of circuit.elements) {
    if (element.kind === 'coupling') continue;
    element.nodes.forEach((node) => nodes.add(node));
    if (element.kind === 'switch') element.control.forEach((node) => nodes.add(node));
    if (isConducting(element)) sets.join(element.nodes[0], element.nodes[1]);
  }
  const holds: Element[] = [];
  for (const node of nodes) {
    if (!sets.join('0', node)) continue;
    const name = `hold of ${node}`;
    const ends = [node, '0'] as const;
    holds.push({ kind: 'resistor', name, nodes: ends, resistance: HOLDING_RESISTANCE });
  }
  return holds.length === 0 ? circuit : { elements: [...circuit.elements, ...holds] };
}

function isConducting({ kind }: Exclude<Element, { kind: 'coupling' }>): boolean {
  return kind !== 'capacitor' && kind !== 'current-source';
}
