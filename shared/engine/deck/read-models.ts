import type { DiodeModel, SwitchModel } from '../circuit/circuit.ts';
import type { DeckError } from './deck.ts';
import { quote } from './quote.ts';
import type { Statement } from './split-statements.ts';
import { TokenReader } from './token-reader.ts';

export type Model = { kind: 'diode'; model: DiodeModel } | { kind: 'switch'; model: SwitchModel };

export interface Models {
  /** undefined where the model's own line has an error */
  readonly byName: ReadonlyMap<string, Model | undefined>;
  readonly errors: readonly DeckError[];
}

/**
 * Reads `.model NAME D(IS N RS BV IBV)` and `.model NAME SW(VT VH RON ROFF)`.
 * Values not given are those of the ngspice manual, chapters on diodes and on switches.
 */
export function readModels(statements: readonly Statement[]): Models {
  const byName = new Map<string, Model | undefined>();
  const errors: DeckError[] = [];
  const lines = new Map<string, number>();
  for (const statement of statements) {
    if (statement.tokens[0]?.text !== '.model') continue;
    const reader = new TokenReader(statement);
    reader.word('.model');
    const name = reader.word('the name of the model');
    const model = readModel(reader);
    const earlier = lines.get(name);
    if (earlier !== undefined) {
      reader.fail(`model ${quote(name)} is already on line ${earlier}`, statement.line);
    }
    if (reader.error !== undefined) errors.push(reader.error);
    byName.set(name, reader.error === undefined ? model : undefined);
    lines.set(name, statement.line);
  }
  return { byName, errors };
}

function readModel(reader: TokenReader): Model | undefined {
  const kind = reader.word('the kind of the model');
  if (reader.error !== undefined) return undefined;
  if (kind === 'd') return { kind: 'diode', model: diodeModel(readParameters(reader, DIODE)) };
  if (kind === 'sw') return { kind: 'switch', model: switchModel(readParameters(reader, SWITCH)) };
  reader.fail(`${quote(kind)} is not a kind of model: D or SW`);
  return undefined;
}

type Sign = 'any' | 'positive' | 'not negative';

const DIODE: Readonly<Record<string, Sign>> = {
  is: 'positive',
  n: 'positive',
  rs: 'not negative',
  bv: 'positive',
  ibv: 'positive',
};

const SWITCH: Readonly<Record<string, Sign>> = {
  vt: 'any',
  vh: 'any',
  ron: 'positive',
  roff: 'positive',
};

function readParameters(
  reader: TokenReader,
  known: Readonly<Record<string, Sign>>,
): ReadonlyMap<string, number> {
  const values = new Map<string, number>();
  const hasParenthesis = reader.skip('(');
  for (let next = reader.peek(); next !== undefined && next !== ')'; next = reader.peek()) {
    const sign = Object.hasOwn(known, next) ? known[next] : undefined;
    if (sign === undefined || values.has(next)) {
      const fault = sign === undefined ? 'is not a parameter of this model' : 'is given twice';
      reader.fail(`${quote(next)} ${fault}`);
      break;
    }
    reader.skip(next);
    reader.expect('=');
    values.set(next, readSigned(reader, next.toUpperCase(), sign));
  }
  if (hasParenthesis) reader.expect(')');
  reader.end();
  return values;
}

function readSigned(reader: TokenReader, what: string, sign: Sign): number {
  switch (sign) {
    case 'any':
      return reader.number(what);
    case 'positive':
      return reader.positive(what);
    case 'not negative':
      return reader.notNegative(what);
  }
}

function diodeModel(values: ReadonlyMap<string, number>): DiodeModel {
  const breakdownVoltage = values.get('bv');
  return {
    saturationCurrent: values.get('is') ?? 1e-14,
    emission: values.get('n') ?? 1,
    seriesResistance: values.get('rs') ?? 0,
    ...(breakdownVoltage === undefined
      ? {}
      : { breakdownVoltage, breakdownCurrent: values.get('ibv') ?? 1e-3 }),
  };
}

function switchModel(values: ReadonlyMap<string, number>): SwitchModel {
  return {
    threshold: values.get('vt') ?? 0,
    hysteresis: values.get('vh') ?? 0,
    onResistance: values.get('ron') ?? 1,
    offResistance: values.get('roff') ?? 1e12,
  };
}
