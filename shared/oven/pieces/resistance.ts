import type { Element, NodeName } from '../../engine/circuit/circuit.ts';

/** Ohm: a broken wire, an open fuse; far above every range of every meter. Judgement. */
export const BROKEN = 1e12;
/** Ohm: two pieces of metal melted or pressed together. Judgement. */
export const FUSED = 0.05;

/** A resistor of `resistance` Ohm. */
export function resistance(
  name: string,
  from: NodeName,
  to: NodeName,
  resistance: number,
): Element {
  return { kind: 'resistor', name, nodes: [from, to], resistance };
}
