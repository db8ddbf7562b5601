import type { Element } from '../circuit/circuit.ts';
import { badElement } from '../circuit/check.ts';
import { voltageLoop } from '../circuit/loops-and-islands.ts';
import type { Commands } from './read-commands.ts';
import type { Deck, DeckError } from './deck.ts';
import { quote } from './quote.ts';

/**
 * What is wrong with a deck whose every line reads well: no element, no ground, a coupling or `.ic`
 * that names what is not there, a loop of voltage sources, nothing asked for.
 */
export function checkDeck(deck: Deck, commands: Commands, lastLine: number): DeckError[] {
  const { elements } = deck.circuit;
  const first = elements[0];
  if (first === undefined) return [{ line: lastLine, message: 'the deck has no elements' }];
  const nodes = new Set(elements.flatMap(nodesOf));
  const errors: DeckError[] = [];
  if (!nodes.has('0')) {
    const message = 'no ground: no element is connected to node 0';
    errors.push({ line: lineOf(deck, first.name), message });
  }
  for (const [node, { line }] of commands.initialVoltages) {
    if (!nodes.has(node)) errors.push({ line, message: `.ic names no node ${quote(node)}` });
  }
  const failure = badElement(deck.circuit) ?? voltageLoop(deck.circuit, 'moving');
  if (failure !== undefined && 'element' in failure) {
    errors.push({ line: lineOf(deck, failure.element), message: failure.message });
  }
  const { asksOperatingPoint, transient, frequencies } = deck;
  if (!asksOperatingPoint && transient === undefined && frequencies === undefined) {
    errors.push({ line: lastLine, message: 'the deck asks for nothing: no .op, .tran or .ac' });
  }
  return errors;
}

function nodesOf(element: Element): readonly string[] {
  if (element.kind === 'coupling') return [];
  return element.kind === 'switch' ? [...element.nodes, ...element.control] : element.nodes;
}

const lineOf = (deck: Deck, element: string): number => deck.lineOf.get(element) ?? 1;
