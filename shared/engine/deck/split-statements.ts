import type { DeckError } from './deck.ts';

/** A word of the deck in lower case, or one of `(`, `)`, `=`; commas and blanks separate. */
export interface Token {
  readonly text: string;
  readonly line: number;
}

/** One line of the deck with its continuations, without comments. */
export interface Statement {
  readonly line: number;
  readonly tokens: readonly Token[];
}

export interface Statements {
  readonly title: string;
  readonly statements: readonly Statement[];
  readonly errors: readonly DeckError[];
}

/** Splits a deck's text; the first line is the title, and nothing after `.end` is read. */
export function splitStatements(text: string): Statements {
  const lines = text.split(/\r\n|\n|\r/);
  const statements: { line: number; tokens: Token[] }[] = [];
  const errors: DeckError[] = [];
  for (let index = 1; index < lines.length; index += 1) {
    const line = index + 1;
    const body = withoutComment(lines[index]!).trim();
    if (body === '') continue;
    const last = statements.at(-1);
    if (!body.startsWith('+')) {
      const tokens = tokensOf(body, line);
      if (tokens[0]?.text === '.end') break;
      if (tokens.length > 0) statements.push({ line, tokens });
    } else if (last === undefined) {
      errors.push({ line, message: 'a continuation with nothing before it' });
    } else {
      for (const token of tokensOf(body.slice(1), line)) last.tokens.push(token);
    }
  }
  return { title: lines[0]!.trim(), statements, errors };
}

function withoutComment(line: string): string {
  if (line.trimStart().startsWith('*')) return '';
  const semicolon = line.indexOf(';');
  const body = semicolon < 0 ? line : line.slice(0, semicolon);
  const dollar = body.search(/\$(\s|$)/);
  return dollar < 0 ? body : body.slice(0, dollar);
}

function tokensOf(body: string, line: number): Token[] {
  const words = body.toLowerCase().match(/[()=]|[^\s,()=]+/g) ?? [];
  return words.map((text) => ({ text, line }));
}
