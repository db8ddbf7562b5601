import type { Circuit, Element } from '../../engine/circuit/circuit.ts';

/** F; below, a capacitor takes under a tenth of an ampere at 4 kV and mains frequency. */
const leastCapacitance = 20e-9;
/** H; below, a lone choke drops under a volt at 15 A and mains frequency. */
const leastInductance = 5e-3;

/**
 * The circuit as it is at mains frequency: feed-through and interference capacitors are left out and
 * chokes are their wire. What they do happens in microseconds and changes no mean by a thousandth.
 */
export function withoutParasitics(circuit: Circuit): Circuit {
  const coupled = new Set(
    circuit.elements.flatMap((one) => (one.kind === 'coupling' ? [...one.inductors] : [])),
  );
  return { elements: circuit.elements.flatMap((one) => atMains(one, coupled)) };
}

function atMains(element: Element, coupled: ReadonlySet<string>): Element[] {
  if (element.kind === 'capacitor' && element.capacitance < leastCapacitance) return [];
  if (
    element.kind === 'inductor' &&
    element.inductance < leastInductance &&
    !coupled.has(element.name)
  ) {
    const { name, nodes, seriesResistance = 0 } = element;
    return [{ kind: 'resistor', name, nodes, resistance: Math.max(seriesResistance, 1e-4) }];
  }
  return [element];
}
