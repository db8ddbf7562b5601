import type { ElementReader, ElementReaders } from './element-reader.ts';
import { readNodes } from './read-nodes.ts';
import type { TokenReader } from './token-reader.ts';

const readResistor: ElementReader = (name, reader) => ({
  kind: 'resistor',
  name,
  nodes: readNodes(name, reader),
  resistance: reader.positive(`the resistance of ${name}`),
});

const readCapacitor: ElementReader = (name, reader) => {
  const nodes = readNodes(name, reader);
  const capacitance = reader.positive(`the capacitance of ${name}`);
  const initialVoltage = readInitial(name, reader);
  return {
    kind: 'capacitor',
    name,
    nodes,
    capacitance,
    ...(initialVoltage === undefined ? {} : { initialVoltage }),
  };
};

const readInductor: ElementReader = (name, reader) => {
  const nodes = readNodes(name, reader);
  const inductance = reader.positive(`the inductance of ${name}`);
  const initialCurrent = readInitial(name, reader);
  return {
    kind: 'inductor',
    name,
    nodes,
    inductance,
    ...(initialCurrent === undefined ? {} : { initialCurrent }),
  };
};

const readCoupling: ElementReader = (name, reader) => {
  const inductors: [string, string] = [
    reader.word(`the first inductor of ${name}`),
    reader.word(`the second inductor of ${name}`),
  ];
  const coefficient = reader.number(`the coefficient of ${name}`);
  if (Math.abs(coefficient) > 1) {
    reader.fail(`the coefficient of ${name} is ${coefficient}: it must be within -1 to 1`);
  }
  return { kind: 'coupling', name, inductors, coefficient };
};

function readInitial(name: string, reader: TokenReader): number | undefined {
  if (!reader.skip('ic')) return undefined;
  reader.expect('=');
  return reader.number(`the initial condition of ${name}`);
}

/** `R n+ n- value`, `C n+ n- value [IC=]`, `L n+ n- value [IC=]`, `K L1 L2 k`. */
export const passiveReaders: ElementReaders = {
  r: readResistor,
  c: readCapacitor,
  l: readInductor,
  k: readCoupling,
};
