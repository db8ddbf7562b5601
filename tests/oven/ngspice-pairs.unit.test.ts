import { describe } from 'vitest';
import { agreesWithNgspice, pairOn } from './beside-ngspice.ts';
import { loadOven, onBench } from './oven-on-bench.ts';

const bench = onBench(loadOven('larkfield-lc-28'));
const pair = pairOn(bench);

const capacitorApart = ['W23/b', 'W24/a', 'W27/a'];
const heaterApart = ['W24/b', 'W25/b', 'W26/b'];
const clean = { cleaned: ['T1.core', 'T2.core'] };

const pairs = [
  pair('P1.L', 'P1.N', 'ohms-2k'),
  pair('P1.E', 'CH.1', 'ohms-200'),
  pair('F1.1', 'F1.2', 'ohms-200'),
  pair('F1.1', 'F1.2', 'ohms-20M', ['W4/a'], [{ on: 'F1', fault: 'open' }]),
  pair('Z1.1', 'Z1.2', 'ohms-2M', ['W4/b', 'W5/a']),
  pair('F2.1', 'F2.2', 'ohms-200', [], [{ on: 'F2', fault: 'high-resistance' }]),
  pair('S1.COM', 'S1.NO', 'ohms-2k'),
  pair('S1.COM', 'S1.NO', 'beep', ['W7/b'], [], { pressed: ['S1'] }),
  pair('S2.COM', 'S2.NO', 'ohms-20M', ['W13/a'], [{ on: 'S2', fault: 'leaky' }]),
  pair('S3.COM', 'S3.NC', 'beep'),
  pair('K1.A1', 'K1.A2', 'ohms-2k'),
  pair('E1.1', 'E1.2', 'ohms-200'),
  pair('E1.1', 'E1.2', 'ohms-200', ['W17/b']),
  pair('M1.1', 'M1.2', 'ohms-200', ['W18/b']),
  pair('M2.1', 'M2.2', 'ohms-20k', ['W19/b']),
  pair('T2.1', 'T2.2', 'ohms-2k', ['W8/b'], [{ on: 'T2', fault: 'shorted-turns' }]),
  pair('T2.3', 'T2.4', 'ohms-200'),
  pair('T2.5', 'T2.6', 'ohms-200'),
  pair('T2.1', 'T2.core', 'ohms-20M', [], [{ on: 'T2', fault: 'primary-leaky-to-core' }], clean),
  pair('A1.1', 'A1.2', 'diode', ['W29/b']),
  pair('T1.1', 'T1.2', 'ohms-200'),
  pair('T1.HV', 'T1.core', 'ohms-200', ['W23/a'], [], clean),
  pair(
    'T1.HV',
    'T1.core',
    'ohms-200',
    ['W23/a'],
    [{ on: 'T1', fault: 'hv-shorted-to-core' }],
    clean,
  ),
  pair('C1.1', 'C1.2', 'ohms-20M', capacitorApart),
  pair('C1.1', 'C1.2', 'ohms-20M'),
  pair('C1.2', 'CH.2', 'ohms-20M'),
  pair('CH.2', 'C1.2', 'ohms-20M'),
  pair('C1.2', 'CH.2', 'ohms-2000M'),
  pair('C1.2', 'CH.2', 'ohms-200', [], [{ on: 'C1', fault: 'shorted' }]),
  pair('C1.1', 'C1.can', 'ohms-20M', capacitorApart, [{ on: 'C1', fault: 'leaky-to-can' }]),
  pair('D1.a', 'D1.k', 'ohms-2000M', ['W27/b']),
  pair('D1.k', 'D1.a', 'ohms-2000M', ['W27/b']),
  pair('D1.k', 'D1.a', 'ohms-2000M', ['W27/b'], [{ on: 'D1', fault: 'leaky' }]),
  pair('V1.1', 'V1.2', 'ohms-200', heaterApart),
  pair('V1.1', 'V1.2', 'ohms-200', [], [{ on: 'V1', fault: 'heater-open' }]),
  pair('V1.1', 'V1.body', 'ohms-20M', heaterApart, [{ on: 'V1', fault: 'leaky' }]),
  pair('W24/a', 'CH.3', 'ohms-20M', ['W24/a']),
  pair('BAT.1k', 'BAT.neg', 'dc-20'),
];

describe('readings of the LC-28 beside ngspice', () =>
  agreesWithNgspice(bench, pairs, { pairs: 20, withDigits: 30, firstSeed: 100 }));
