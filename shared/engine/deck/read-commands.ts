import type { DeckError, TransientCommand } from './deck.ts';
import { quote } from './quote.ts';
import type { Statement } from './split-statements.ts';
import { sweepFrequencies } from './sweep-frequencies.ts';
import { TokenReader } from './token-reader.ts';

export interface Commands {
  asksOperatingPoint: boolean;
  transient?: TransientCommand;
  frequencies?: readonly number[];
  /** V by node, and the line that sets it */
  readonly initialVoltages: Map<string, { voltage: number; line: number }>;
  readonly errors: DeckError[];
}

/** More than this is a slip of the keyboard, and would not fit the answer. */
const MOST_SAMPLES = 1_000_000;

/** Reads `.op`, `.tran`, `.ac` and `.ic`; `.model` is read elsewhere, anything else is an error. */
export function readCommands(statements: readonly Statement[]): Commands {
  const commands: Commands = {
    asksOperatingPoint: false,
    initialVoltages: new Map(),
    errors: [],
  };
  const seen = new Map<string, number>();
  for (const statement of statements) {
    const name = statement.tokens[0]!.text;
    if (!name.startsWith('.') || name === '.model') continue;
    const reader = new TokenReader(statement);
    reader.word('the command');
    const earlier = name === '.ic' ? undefined : seen.get(name);
    if (earlier !== undefined) reader.fail(`${name} is already on line ${earlier}`);
    else readCommand(name, reader, commands);
    seen.set(name, statement.line);
    reader.end();
    if (reader.error !== undefined) commands.errors.push(reader.error);
  }
  return commands;
}

function readCommand(name: string, reader: TokenReader, commands: Commands): void {
  if (name === '.op') commands.asksOperatingPoint = true;
  else if (name === '.tran') commands.transient = readTransient(reader);
  else if (name === '.ac') commands.frequencies = readSweep(reader);
  else if (name === '.ic') readInitialVoltages(reader, commands);
  else reader.fail(`${quote(name)} is not a command: .op .tran .ac .ic .model .end`, reader.line);
}

function readTransient(reader: TokenReader): TransientCommand {
  const step = reader.positive('the step of .tran');
  const stop = reader.positive('the stop of .tran');
  const command: TransientCommand = { step, stop, useInitialConditions: false };
  if (hasNumberNext(reader)) command.start = reader.notNegative('the start of .tran');
  if (hasNumberNext(reader)) command.maxStep = reader.positive('the longest step of .tran');
  command.useInitialConditions = reader.skip('uic');
  const start = command.start ?? 0;
  if (start >= stop) reader.fail('.tran starts at its stop or after it', reader.line);
  if (step > stop - start) reader.fail('the step of .tran is longer than its span', reader.line);
  if ((stop - start) / step > MOST_SAMPLES) {
    const asked = Math.round((stop - start) / step);
    reader.fail(`.tran asks for ${asked} samples: at most ${MOST_SAMPLES}`, reader.line);
  }
  return command;
}

function hasNumberNext(reader: TokenReader): boolean {
  const next = reader.peek();
  return next !== undefined && next !== 'uic';
}

function readSweep(reader: TokenReader): readonly number[] {
  const spacing = reader.word('the spacing of .ac');
  if (spacing !== 'dec' && spacing !== 'oct' && spacing !== 'lin') {
    reader.fail(`${quote(spacing)} is not a spacing: dec, oct or lin`);
    return [];
  }
  const count = reader.positive('the number of points of .ac');
  const first = spacing === 'lin' ? reader.notNegative(FIRST) : reader.positive(FIRST);
  const last = reader.notNegative('the last frequency of .ac');
  if (!Number.isInteger(count))
    reader.fail('the number of points of .ac is not whole', reader.line);
  if (last < first) reader.fail('.ac ends below its first frequency', reader.line);
  if (reader.error !== undefined) return [];
  const frequencies = sweepFrequencies(spacing, count, first, last, MOST_SAMPLES);
  if (frequencies === undefined) {
    reader.fail(`.ac asks for more than ${MOST_SAMPLES} frequencies`, reader.line);
  }
  return frequencies ?? [];
}

const FIRST = 'the first frequency of .ac';

function readInitialVoltages(reader: TokenReader, commands: Commands): void {
  if (reader.peek() === undefined) reader.fail('.ic sets nothing: V(node)=value expected');
  while (reader.peek() !== undefined) {
    if (!reader.skip('v')) {
      reader.fail(`V(node)=value expected, not ${quote(reader.peek() ?? '')}`);
      return;
    }
    reader.expect('(');
    const node = reader.node('the node of .ic');
    reader.expect(')');
    reader.expect('=');
    const voltage = reader.number(`the voltage of node ${node}`);
    if (commands.initialVoltages.has(node)) reader.fail(`.ic sets node ${quote(node)} twice`);
    if (reader.error !== undefined) return;
    commands.initialVoltages.set(node, { voltage, line: reader.line });
  }
}
