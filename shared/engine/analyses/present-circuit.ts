import type { Circuit, Element } from '../circuit/circuit.ts';
import type { Machine } from './machine.ts';

/** The machine's circuit with the values its elements have now, where some were changed. */
export function presentCircuit(machine: Machine): Circuit {
  const { circuit, netlist, resistors, capacitors, inductors, sources } = machine;
  const values = new Map<string, number>();
  for (const { branch, value } of [...resistors, ...capacitors, ...inductors]) {
    values.set(netlist.branches[branch]!.name, value);
  }
  for (const { element, fixed } of sources)
    if (fixed !== undefined) values.set(element.name, fixed);
  return {
    elements: circuit.elements.map((element) => withValue(element, values.get(element.name))),
  };
}

function withValue(element: Element, value: number | undefined): Element {
  if (value === undefined) return element;
  switch (element.kind) {
    case 'resistor':
      return { ...element, resistance: value };
    case 'capacitor':
      return { ...element, capacitance: value };
    case 'inductor':
      return { ...element, inductance: value };
    case 'voltage-source':
    case 'current-source':
      return { ...element, dc: value, wave: { shape: 'dc', value } };
    case 'coupling':
    case 'diode':
    case 'switch':
      return element;
  }
}
