import type { Element } from '../circuit/circuit.ts';
import type { TransientCommand } from './deck.ts';
import type { Model } from './read-models.ts';
import type { TokenReader } from './token-reader.ts';

/** What an element may refer to elsewhere in the deck. */
export interface ElementContext {
  /** undefined where the model's own line has an error */
  readonly models: ReadonlyMap<string, Model | undefined>;
  readonly transient: TransientCommand | undefined;
}

/** Reads what follows the name of an element; what it returns counts only if the reader has no error. */
export type ElementReader = (
  name: string,
  reader: TokenReader,
  context: ElementContext,
) => Element | undefined;

/** Readers by the first letter of the name. */
export type ElementReaders = Readonly<Record<string, ElementReader>>;
