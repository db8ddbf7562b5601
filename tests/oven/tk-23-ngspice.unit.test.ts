import { describe } from 'vitest';
import { agreesWithNgspice, pairOn } from './beside-ngspice.ts';
import { loadOven, onBench } from './oven-on-bench.ts';

const bench = onBench(loadOven('tarnwick-tk-23'));
const pair = pairOn(bench);

const apart = ['W24/b', 'W25/a', 'W28/a'];

const pairs = [
  pair('P1.L', 'P1.N', 'ohms-20k', [], [], { isDoorClosed: true, pressed: ['K1'] }),
  pair('P1.L', 'P1.N', 'ohms-2M'),
  pair('F1.1', 'F1.2', 'ohms-200'),
  pair('F4.1', 'F4.2', 'ohms-200', ['W24/a']),
  pair('F4.1', 'F4.2', 'ohms-20M', ['W24/a'], [{ on: 'F4', fault: 'open' }]),
  pair('R1.1', 'R1.2', 'ohms-200', ['W10/b']),
  pair('R1.1', 'Z1.4', 'ohms-200', ['W10/b'], [{ on: 'R1', fault: 'drifted' }]),
  pair('S3.COM', 'Z1.4', 'ohms-200'),
  pair('K1.1', 'K1.2', 'ohms-200', ['W8/b'], [], { pressed: ['K1'] }),
  pair('K1.1', 'K1.2', 'ohms-20M', ['W8/b']),
  pair('K1.2', 'K1.3', 'ohms-200', ['W20/a'], [{ on: 'K1', fault: 'power-burnt' }]),
  pair('K1.M1', 'K1.M2', 'ohms-20k', ['W15/b']),
  pair('K1.2', 'Z1.4', 'ohms-2k'),
  pair('E1.1', 'E1.2', 'ohms-2k', ['W17/a']),
  pair('M1.1', 'M1.2', 'ohms-2k', ['W13/b']),
  pair('M2.1', 'M2.2', 'ohms-20k', ['W14/b']),
  pair('T1.1', 'T1.2', 'ohms-200', ['W20/b']),
  pair('T1.HV', 'T1.core', 'ohms-200', ['W23/a'], [], { cleaned: ['T1.core'] }),
  pair('C1.1', 'CH.2', 'ohms-200'),
  pair('C1.2', 'CH.2', 'ohms-20M'),
  pair('CH.2', 'C1.2', 'ohms-20M', [], [{ on: 'F4', fault: 'open' }]),
  pair('C1.1', 'C1.2', 'ohms-20M', apart),
  pair('D1.a', 'D1.k', 'ohms-2000M', ['W28/b']),
  pair('V1.1', 'V1.2', 'ohms-200', ['W25/b', 'W26/b', 'W27/b']),
  pair('S1.NO', 'Z1.4', 'ohms-200', [], [{ on: 'W10', fault: 'wrong-terminal-a' }]),
];

describe('readings of the TK-23 beside ngspice', () =>
  agreesWithNgspice(bench, pairs, { pairs: 12, withDigits: 18, firstSeed: 300 }));
