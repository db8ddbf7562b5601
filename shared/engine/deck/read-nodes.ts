import type { TokenReader } from './token-reader.ts';

/** The two nodes every element but a coupling begins with. */
export function readNodes(name: string, reader: TokenReader): readonly [string, string] {
  return [reader.node(`the first node of ${name}`), reader.node(`the second node of ${name}`)];
}
