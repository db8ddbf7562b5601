import type { Circuit, Element } from '../circuit/circuit.ts';
import { createDeckNames, type DeckNames } from './deck-names.ts';
import { writeModels, type ModelNames } from './write-models.ts';
import { writeWave } from './write-wave.ts';

/** A circuit as deck text, and what its names became. */
export interface WrittenDeck {
  /** elements and models, without title, analyses or `.end` */
  readonly lines: readonly string[];
  /** the deck's node for each of the circuit's */
  readonly nodes: ReadonlyMap<string, string>;
  /** the deck's element for each of the circuit's */
  readonly elements: ReadonlyMap<string, string>;
}

/**
 * Writes a sound circuit in the common SPICE deck notation, SI units, every number to its last bit.
 * A name that a deck cannot hold is made up anew. The series resistance of an inductor becomes a
 * resistor of its own behind an added node.
 */
export function writeDeck(circuit: Circuit): WrittenDeck {
  const nodes = createDeckNames(['0']);
  const elements = createDeckNames();
  const letters = new Map(circuit.elements.map(({ name, kind }) => [name, LETTERS[kind]]));
  const models = writeModels(circuit);
  const writer: Writer = {
    node: (name) => nodes.of(name, ''),
    element: (name) => elements.of(name, letters.get(name) ?? ''),
    added: { nodes, elements },
    models,
  };
  const lines = circuit.elements.flatMap((element) => writeElement(element, writer));
  return {
    lines: [...lines, ...models.lines],
    nodes: nodes.written,
    elements: elements.written,
  };
}

interface Writer {
  node(name: string): string;
  element(name: string): string;
  readonly added: { readonly nodes: DeckNames; readonly elements: DeckNames };
  readonly models: ModelNames;
}

const LETTERS: Readonly<Record<Element['kind'], string>> = {
  resistor: 'r',
  capacitor: 'c',
  inductor: 'l',
  coupling: 'k',
  'voltage-source': 'v',
  'current-source': 'i',
  diode: 'd',
  switch: 's',
};

function writeElement(element: Element, writer: Writer): string[] {
  const name = writer.element(element.name);
  if (element.kind === 'coupling') {
    const [first, second] = element.inductors;
    return [`${name} ${writer.element(first)} ${writer.element(second)} ${element.coefficient}`];
  }
  const [from, to] = element.nodes.map(writer.node);
  const head = `${name} ${from} ${to}`;
  switch (element.kind) {
    case 'resistor':
      return [`${head} ${element.resistance}`];
    case 'capacitor':
      return [`${head} ${element.capacitance}${initial(element.initialVoltage)}`];
    case 'inductor':
      return writeInductor(element, writer);
    case 'voltage-source':
    case 'current-source':
      return [`${head} ${writeSource(element)}`];
    case 'diode':
      return [`${head} ${writer.models.diode(element.model)}`];
    case 'switch': {
      const control = element.control.map(writer.node).join(' ');
      const model = writer.models.switch(element.model);
      return [`${head} ${control} ${model}${element.isInitiallyOn ? ' on' : ''}`];
    }
  }
}

const initial = (value: number | undefined): string => (value === undefined ? '' : ` ic=${value}`);

function writeInductor(
  element: Extract<Element, { kind: 'inductor' }>,
  { node, element: nameOf, added }: Writer,
): string[] {
  const name = nameOf(element.name);
  const [from, to] = element.nodes;
  const rest = `${element.inductance}${initial(element.initialCurrent)}`;
  if (!element.seriesResistance) return [`${name} ${node(from)} ${node(to)} ${rest}`];
  const inner = added.nodes.of(`${element.name}\ninner`, '');
  const resistor = added.elements.of(`${element.name}\nresistance`, 'r');
  return [
    `${name} ${node(from)} ${inner} ${rest}`,
    `${resistor} ${inner} ${node(to)} ${element.seriesResistance}`,
  ];
}

function writeSource(
  source: Extract<Element, { kind: 'voltage-source' | 'current-source' }>,
): string {
  const { wave, dc, ac } = source;
  const parts: string[] = [];
  if (dc !== undefined) parts.push(`dc ${dc}`);
  else if (wave.shape === 'dc') parts.push(`dc ${wave.value}`);
  if (ac !== undefined) parts.push(`ac ${ac.magnitude} ${ac.phaseDegrees}`);
  if (wave.shape !== 'dc') parts.push(writeWave(wave));
  return parts.join(' ');
}
