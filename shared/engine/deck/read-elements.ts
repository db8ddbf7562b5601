import type { Element } from '../circuit/circuit.ts';
import type { DeckError } from './deck.ts';
import type { ElementContext, ElementReaders } from './element-reader.ts';
import { modelledReaders } from './modelled-readers.ts';
import { passiveReaders } from './passive-readers.ts';
import { quote } from './quote.ts';
import { sourceReaders } from './source-readers.ts';
import type { Statement } from './split-statements.ts';
import { TokenReader } from './token-reader.ts';

export interface Elements {
  readonly elements: readonly Element[];
  /** the line of each element, by name */
  readonly lineOf: ReadonlyMap<string, number>;
  readonly errors: readonly DeckError[];
}

const READERS: ElementReaders = { ...passiveReaders, ...sourceReaders, ...modelledReaders };

/** Reads every statement that is not a command: the first letter of its name is its kind. */
export function readElements(statements: readonly Statement[], context: ElementContext): Elements {
  const elements: Element[] = [];
  const lineOf = new Map<string, number>();
  const errors: DeckError[] = [];
  for (const statement of statements) {
    if (statement.tokens[0]!.text.startsWith('.')) continue;
    const reader = new TokenReader(statement);
    const element = readElement(reader, context);
    const name = statement.tokens[0]!.text;
    const earlier = lineOf.get(name);
    if (earlier !== undefined) {
      reader.fail(`${quote(name)} is already on line ${earlier}`, statement.line);
    }
    if (reader.error !== undefined) errors.push(reader.error);
    else if (element !== undefined) elements.push(element);
    if (earlier === undefined) lineOf.set(name, statement.line);
  }
  return { elements, lineOf, errors };
}

function readElement(reader: TokenReader, context: ElementContext): Element | undefined {
  const name = reader.word('the name of an element');
  const letter = name.charAt(0);
  const read = Object.hasOwn(READERS, letter) ? READERS[letter] : undefined;
  if (read === undefined) {
    reader.fail(`unknown element ${quote(name)}: R C L K V I D or S expected`, reader.line);
    return undefined;
  }
  const element = read(name, reader, context);
  reader.end();
  return element;
}
