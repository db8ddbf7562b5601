import { nodeSets } from './node-sets.ts';
import type { Circuit, Element, EngineFailure } from './circuit.ts';

/** What a capacitor and an inductor are to direct current, or to a step in time. */
export type Regime = 'steady' | 'moving';

/**
 * A loop of voltage sources, and in the steady regime of inductors without resistance: its current
 * has no single answer.
 */
export function voltageLoop(circuit: Circuit, regime: Regime): EngineFailure | undefined {
  const sets = nodeSets();
  for (const element of circuit.elements) {
    if (!fixesVoltage(element, regime)) continue;
    if (!sets.join(element.nodes[0], element.nodes[1])) {
      const message = `${element.name} closes a loop that has no resistance`;
      return { code: 'voltage-loop', element: element.name, message };
    }
  }
  return undefined;
}

function fixesVoltage(
  element: Element,
  regime: Regime,
): element is Extract<Element, { kind: 'voltage-source' | 'inductor' }> {
  if (element.kind === 'voltage-source') return true;
  return regime === 'steady' && element.kind === 'inductor' && !element.seriesResistance;
}

/**
 * A current driven into a part of the circuit that has no way back: a lifted node is legal because
 * of the conductance to ground, but a current through that alone would be gigavolts.
 */
export function floatingNode(circuit: Circuit, regime: Regime): EngineFailure | undefined {
  const sets = nodeSets();
  for (const element of circuit.elements) {
    const isConducting =
      element.kind !== 'coupling' &&
      element.kind !== 'current-source' &&
      (element.kind !== 'capacitor' || regime === 'moving');
    if (isConducting) sets.join(element.nodes[0], element.nodes[1]);
  }
  for (const element of circuit.elements) {
    if (element.kind !== 'current-source' || isIdle(element)) continue;
    const [from, to] = element.nodes;
    if (sets.find(from) === sets.find(to)) continue;
    const node = sets.find(from) === sets.find('0') ? to : from;
    const message = `${element.name} drives node ${node}, which has no way back`;
    return { code: 'floating-node', node, message };
  }
  return undefined;
}

function isIdle(source: Extract<Element, { kind: 'current-source' }>): boolean {
  return source.wave.shape === 'dc' && source.wave.value === 0 && !source.dc;
}
