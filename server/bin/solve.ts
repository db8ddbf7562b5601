import { createReadStream } from 'node:fs';
import type { EngineFailure } from '../../shared/engine/circuit/circuit.ts';
import type { Deck } from '../../shared/engine/deck/deck.ts';
import { LARGEST_DECK, readDeck } from '../../shared/engine/deck/read-deck.ts';

/**
 * npm run --silent solve -- FILE.cir (or `-` for standard input)
 *
 * Prints what the deck asks for as JSON. Exit 0: solved. 2: the deck, the file or the command line
 * is wrong, and one line on standard error says where. 1: an analysis failed, and one line says at
 * which node, after how many iterations and with what residual.
 */
async function solve(path: string): Promise<number> {
  const text = await readText(path);
  if (text === undefined) return 2;
  const read = readDeck(text);
  if (!read.ok) {
    const [first] = read.failure;
    const others = read.failure.length - 1;
    const more = others > 0 ? ` (and ${others} more)` : '';
    return fail(2, `line ${first?.line ?? 1}: ${first?.message ?? ''}${more}`);
  }
  // Loaded late: most of the engine is not needed to say what is wrong with a deck.
  const { solveDeck } = await import('../../shared/engine/deck/solve-deck.ts');
  const solved = solveDeck(read.value);
  if (!solved.ok) return failAnalysis(read.value, solved.failure);
  process.stdout.write(`${JSON.stringify(solved.value)}\n`);
  return 0;
}

/** A character takes three bytes at most, so what is cut off here is longer than a deck may be. */
const MOST_BYTES = 3 * LARGEST_DECK + 3;

async function readText(path: string): Promise<string | undefined> {
  const chunks: Buffer[] = [];
  let length = 0;
  try {
    for await (const chunk of path === '-' ? process.stdin : createReadStream(path)) {
      const bytes = Buffer.from(chunk);
      chunks.push(bytes);
      length += bytes.length;
      if (length > MOST_BYTES) break;
    }
  } catch (error) {
    if (!(error instanceof Error) || !('code' in error)) throw error;
    fail(2, `line 0: cannot read ${JSON.stringify(path)}: ${String(error.code)}`);
    return undefined;
  }
  return Buffer.concat(chunks).toString('utf8');
}

function failAnalysis(deck: Deck, failure: EngineFailure): number {
  switch (failure.code) {
    case 'voltage-loop':
    case 'bad-element':
      return fail(2, `line ${deck.lineOf.get(failure.element) ?? 1}: ${failure.message}`);
    case 'floating-node':
      return fail(2, `line ${lineOfNode(deck, failure.node)}: ${failure.message}`);
    case 'not-converged': {
      const { node, iteration, residual, time } = failure;
      const when = time === undefined ? '' : ` at ${time} s`;
      return fail(
        1,
        `not converged${when}: node ${node}, iteration ${iteration}, residual ${residual}: ${failure.message}`,
      );
    }
  }
}

function lineOfNode(deck: Deck, node: string): number {
  const element = deck.circuit.elements.find(
    (candidate) => candidate.kind !== 'coupling' && candidate.nodes.includes(node),
  );
  return deck.lineOf.get(element?.name ?? '') ?? 1;
}

function fail(code: number, line: string): number {
  process.stderr.write(`${line.replace(/\s*\n\s*/g, ' ')}\n`);
  return code;
}

const [path, ...rest] = process.argv.slice(2);
process.exitCode =
  path === undefined || rest.length > 0
    ? fail(2, 'usage: solve FILE.cir, or - for standard input')
    : await solve(path);
