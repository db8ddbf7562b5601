import type { Wave } from '../circuit/circuit.ts';
import type { TransientCommand } from './deck.ts';
import type { ElementReader, ElementReaders } from './element-reader.ts';
import { quote } from './quote.ts';
import { readNodes } from './read-nodes.ts';
import { readWave } from './read-wave.ts';
import type { TokenReader } from './token-reader.ts';

interface Values {
  dc?: number;
  ac?: { magnitude: number; phaseDegrees: number };
  wave?: Wave;
}

const readSource =
  (kind: 'voltage-source' | 'current-source'): ElementReader =>
  (name, reader, { transient }) => {
    const nodes = readNodes(name, reader);
    const values: Values = {};
    if (reader.peek() === undefined) reader.fail(`the value of ${name} is missing`);
    for (let next = reader.peek(); next !== undefined; next = reader.peek()) {
      readValue(name, next, reader, values, transient);
    }
    const { dc, ac, wave } = values;
    return {
      kind,
      name,
      nodes,
      wave: wave ?? { shape: 'dc', value: dc ?? 0 },
      ...(wave !== undefined && dc !== undefined ? { dc } : {}),
      ...(ac === undefined ? {} : { ac }),
    };
  };

function readValue(
  name: string,
  next: string,
  reader: TokenReader,
  values: Values,
  transient: TransientCommand | undefined,
): void {
  if (next === 'dc' || (isNumeric(next) && values.dc === undefined)) {
    if (values.dc !== undefined) reader.fail(`${name} has two DC values`);
    reader.skip('dc');
    values.dc = reader.number(`the DC value of ${name}`);
  } else if (next === 'ac') {
    if (values.ac !== undefined) reader.fail(`${name} has two AC values`);
    reader.skip('ac');
    const magnitude = reader.number(`the AC magnitude of ${name}`);
    const phaseDegrees = isNumeric(reader.peek()) ? reader.number(`the AC phase of ${name}`) : 0;
    values.ac = { magnitude, phaseDegrees };
  } else {
    const wave = readWave(next, reader, transient);
    if (wave === undefined) {
      reader.fail(`${quote(next)} is not understood here: DC, AC, SIN or PULSE expected`);
    } else if (values.wave !== undefined) reader.fail(`${name} has two waves`);
    values.wave = wave;
  }
}

const isNumeric = (text: string | undefined): boolean =>
  text !== undefined && /^[-+.\d]/.test(text);

/**
 * `V|I n+ n- [[DC] value] [AC magnitude [phase]] [SIN(…)|PULSE(…)]`; at least one of them.
 * With a wave and a DC value, `.op` has the DC value and `.tran` starts from the wave's own.
 */
export const sourceReaders: ElementReaders = {
  v: readSource('voltage-source'),
  i: readSource('current-source'),
};
