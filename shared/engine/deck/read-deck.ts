import type { Result } from '../circuit/circuit.ts';
import { checkDeck } from './check-deck.ts';
import type { Deck, DeckError } from './deck.ts';
import { readCommands } from './read-commands.ts';
import { readElements } from './read-elements.ts';
import { readModels } from './read-models.ts';
import { splitStatements } from './split-statements.ts';

/** Characters, some twenty thousand elements: what is longer is another kind of file. */
export const LARGEST_DECK = 500_000;

/**
 * Reads a circuit in the common SPICE deck notation: R C L K V I D S, `.model` of D and SW, `.op`,
 * `.tran`, `.ac`, `.ic`, `.end`. Fails with every error found, in the order of their lines.
 * Source of the notation: ngspice manual, chapters on circuit description and on analyses.
 */
export function readDeck(text: string): Result<Deck, DeckError[]> {
  const unreadable = findUnreadable(text);
  if (unreadable !== undefined) return { ok: false, failure: [unreadable] };
  const { title, statements, errors } = splitStatements(text);
  const models = readModels(statements);
  const commands = readCommands(statements);
  const read = readElements(statements, {
    models: models.byName,
    transient: commands.transient,
  });
  const found = [...errors, ...models.errors, ...commands.errors, ...read.errors];
  if (found.length > 0) return { ok: false, failure: inOrder(found) };
  const deck: Deck = {
    title,
    circuit: { elements: read.elements },
    asksOperatingPoint: commands.asksOperatingPoint,
    transient: commands.transient,
    frequencies: commands.frequencies,
    initialVoltages: new Map(
      Array.from(commands.initialVoltages, ([node, { voltage }]) => [node, voltage]),
    ),
    lineOf: read.lineOf,
  };
  const faults = checkDeck(deck, commands, statements.at(-1)?.line ?? 1);
  return faults.length > 0 ? { ok: false, failure: inOrder(faults) } : { ok: true, value: deck };
}

const inOrder = (errors: DeckError[]): DeckError[] => errors.sort((a, b) => a.line - b.line);

const CONTROL = /(?![\t\n\f\r])\p{Cc}/u;

function findUnreadable(text: string): DeckError | undefined {
  const control = CONTROL.exec(text);
  if (control !== null) {
    return { line: lineAt(text, control.index), message: 'not a text file' };
  }
  if (text.length > LARGEST_DECK) {
    const message = `the deck is longer than ${LARGEST_DECK} characters`;
    return { line: lineAt(text, LARGEST_DECK), message };
  }
  return text.trim() === '' ? { line: 1, message: 'the deck is empty' } : undefined;
}

/** Counts lines as the splitter does: CR LF, LF or CR. */
function lineAt(text: string, index: number): number {
  return (text.slice(0, index).match(/\r\n|\n|\r/g)?.length ?? 0) + 1;
}
