import type { ElementContext, ElementReader, ElementReaders } from './element-reader.ts';
import { quote } from './quote.ts';
import { readNodes } from './read-nodes.ts';
import type { Model } from './read-models.ts';
import type { TokenReader } from './token-reader.ts';

const readDiode: ElementReader = (name, reader, context) => {
  const nodes = readNodes(name, reader);
  const found = findModel(name, 'diode', reader, context);
  return found?.kind === 'diode' ? { kind: 'diode', name, nodes, model: found.model } : undefined;
};

const readSwitch: ElementReader = (name, reader, context) => {
  const nodes = readNodes(name, reader);
  const control: readonly [string, string] = [
    reader.node(`the first control node of ${name}`),
    reader.node(`the second control node of ${name}`),
  ];
  const found = findModel(name, 'switch', reader, context);
  const isInitiallyOn = reader.skip('on');
  if (!isInitiallyOn) reader.skip('off');
  return found?.kind === 'switch'
    ? { kind: 'switch', name, nodes, control, model: found.model, isInitiallyOn }
    : undefined;
};

function findModel(
  name: string,
  kind: Model['kind'],
  reader: TokenReader,
  { models }: ElementContext,
): Model | undefined {
  const modelName = reader.word(`the model of ${name}`);
  if (reader.error !== undefined) return undefined;
  const model = models.get(modelName);
  if (!models.has(modelName)) reader.fail(`there is no .model ${quote(modelName)}`);
  else if (model !== undefined && model.kind !== kind)
    reader.fail(`.model ${quote(modelName)} is not that of a ${kind}`);
  return model;
}

/** `D anode cathode MODEL`, `S n+ n- control+ control- MODEL [ON|OFF]`. */
export const modelledReaders: ElementReaders = { d: readDiode, s: readSwitch };
