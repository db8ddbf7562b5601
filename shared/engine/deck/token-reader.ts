import type { DeckError } from './deck.ts';
import { quote } from './quote.ts';
import { readNumber } from './read-number.ts';
import type { Statement, Token } from './split-statements.ts';

/**
 * Reads the tokens of one statement from left to right. The first thing wrong is kept in `error`
 * and everything read after it is a placeholder, so a statement is read in one breath and asked
 * once, at its end, whether it was sound.
 */
export class TokenReader {
  error: DeckError | undefined;
  readonly line: number;
  private position = 0;
  private readonly tokens: readonly Token[];

  constructor(statement: Statement) {
    this.line = statement.line;
    this.tokens = statement.tokens;
  }

  /** Keeps the first error only. */
  fail(message: string, line: number = this.currentLine()): void {
    this.error ??= { line, message };
  }

  peek(): string | undefined {
    return this.error === undefined ? this.tokens[this.position]?.text : undefined;
  }

  /** Steps over the token when it is the one named. */
  skip(text: string): boolean {
    if (this.peek() !== text) return false;
    this.position += 1;
    return true;
  }

  word(what: string): string {
    const text = this.peek();
    if (text === undefined || text === '(' || text === ')' || text === '=') {
      this.fail(text === undefined ? `${what} is missing` : `${what} expected, not ${quote(text)}`);
      return '';
    }
    this.position += 1;
    return text;
  }

  /** A node's name; `gnd` is ground, as other programs have it. */
  node(what: string): string {
    const name = this.word(what);
    // not a key that a plain record can have
    if (name === '__proto__') this.fail(`${what} cannot be ${quote(name)}`);
    return name === 'gnd' ? '0' : name;
  }

  number(what: string): number {
    const line = this.currentLine();
    const text = this.word(what);
    if (this.error !== undefined) return NaN;
    const read = readNumber(text);
    if (read.ok) return read.value;
    this.fail(`${what}: ${read.failure}`, line);
    return NaN;
  }

  positive(what: string): number {
    return this.checked(what, (value) => value > 0, 'must be above zero');
  }

  notNegative(what: string): number {
    return this.checked(what, (value) => value >= 0, 'must not be below zero');
  }

  expect(text: string): void {
    if (this.skip(text) || this.error !== undefined) return;
    const found = this.peek();
    this.fail(
      `${quote(text)} expected${found === undefined ? ' at the end' : `, not ${quote(found)}`}`,
    );
  }

  /** Nothing may follow. */
  end(): void {
    const text = this.peek();
    if (text !== undefined) this.fail(`${quote(text)} is not understood here`);
  }

  private checked(what: string, isSound: (value: number) => boolean, rule: string): number {
    const line = this.currentLine();
    const value = this.number(what);
    if (this.error === undefined && !isSound(value)) {
      this.fail(`${what} is ${value}: it ${rule}`, line);
    }
    return value;
  }

  private currentLine(): number {
    return this.tokens[this.position]?.line ?? this.tokens.at(-1)?.line ?? this.line;
  }
}
