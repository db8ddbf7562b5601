import type { Circuit, Element, NodeName } from './circuit.ts';

/**
 * The same circuit with fewer nodes: where nothing but resistors meets, the node is eliminated.
 *   one resistor leads nowhere and goes; two are in series, Ra + Rb;
 *   three are a star, and become the triangle Rab = Ra + Rb + Ra Rb / Rc;  in parallel Ra Rb / (Ra + Rb).
 * Voltages and currents of all that is left are what they were, but for the conductance that a node of
 * its own would have had to ground. Resistors named in `keep` stay as they are.
 * Source: A. E. Kennelly, Electrical World and Engineer 34 (1899) 413-414 (from memory).
 */
export function condense(circuit: Circuit, keep: ReadonlySet<string>): Circuit {
  const fixed: Element[] = [];
  const mesh: Mesh = new Map();
  const held = new Set<NodeName>(['0']);
  for (const element of circuit.elements) {
    if (element.kind === 'resistor' && !keep.has(element.name)) {
      join(mesh, element.nodes[0], element.nodes[1], element.resistance);
      continue;
    }
    fixed.push(element);
    if (element.kind === 'coupling') continue;
    for (const node of element.nodes) held.add(node);
    if (element.kind === 'switch') for (const node of element.control) held.add(node);
  }
  for (let most = 0; most <= 3;) {
    const node = [...mesh.keys()].find((one) => !held.has(one) && mesh.get(one)!.size <= most);
    if (node === undefined) most += 1;
    else {
      eliminate(mesh, node);
      most = 0;
    }
  }
  return { elements: [...fixed, ...resistorsOf(mesh)] };
}

/** Ohm by the two nodes it lies between, kept both ways round. */
type Mesh = Map<NodeName, Map<NodeName, number>>;

function join(mesh: Mesh, a: NodeName, b: NodeName, ohms: number): void {
  if (a === b) return;
  const beside = mesh.get(a)?.get(b);
  const together = beside === undefined ? ohms : (ohms * beside) / (ohms + beside);
  for (const [from, to] of [
    [a, b],
    [b, a],
  ] as const) {
    const ends = mesh.get(from) ?? new Map<NodeName, number>();
    ends.set(to, together);
    mesh.set(from, ends);
  }
}

function eliminate(mesh: Mesh, node: NodeName): void {
  const [a, b, c] = [...mesh.get(node)!];
  mesh.delete(node);
  for (const end of [a, b, c]) if (end) mesh.get(end[0])!.delete(node);
  if (!a || !b) return;
  if (!c) {
    join(mesh, a[0], b[0], a[1] + b[1]);
    return;
  }
  join(mesh, a[0], b[0], a[1] + b[1] + (a[1] * b[1]) / c[1]);
  join(mesh, b[0], c[0], b[1] + c[1] + (b[1] * c[1]) / a[1]);
  join(mesh, c[0], a[0], c[1] + a[1] + (c[1] * a[1]) / b[1]);
}

function* resistorsOf(mesh: Mesh): Generator<Element> {
  const told = new Set<NodeName>();
  for (const [from, ends] of mesh) {
    told.add(from);
    for (const [to, resistance] of ends)
      if (!told.has(to))
        yield { kind: 'resistor', name: `${from}~${to}`, nodes: [from, to], resistance };
  }
}
