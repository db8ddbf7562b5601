import { describe } from 'vitest';
import { agreesWithNgspice, pairOn } from './beside-ngspice.ts';
import { or16OnBench } from './or-16.ts';

const pair = pairOn(or16OnBench);

const ventApart = ['W26/b', 'W27/b'];

const pairs = [
  pair('P1.L', 'P1.N', 'ohms-2k'),
  pair('P1.E', 'CH.1', 'ohms-200'),
  pair('F2.1', 'F2.2', 'ohms-200', ['W14/b'], [{ on: 'F2', fault: 'high-resistance' }]),
  pair('M3.1', 'M3.2', 'ohms-200', ventApart),
  pair('M3.3', 'M3.2', 'ohms-200', ventApart),
  pair('M3.3', 'M3.2', 'ohms-200', ventApart, [{ on: 'M3', fault: 'shorted-turns' }]),
  pair('M3.1', 'M3.2', 'ohms-200'),
  pair('M1.1', 'M1.2', 'ohms-200', ['W21/b']),
  pair('E1.1', 'E1.2', 'ohms-200'),
  pair('E2.1', 'E2.2', 'ohms-200', ['W29/b']),
  pair('K3.A1', 'K3.A2', 'ohms-2k'),
  pair('S4.COM', 'S4.NO', 'ohms-200k', ['W41/a'], [{ on: 'S4', fault: 'film' }], {
    pressed: ['S4'],
  }),
  pair('A1.5', 'A1.6', 'ohms-20k', ['W41/a']),
  pair('T1.1', 'T1.2', 'ohms-200'),
  pair('T2.1', 'T2.2', 'ohms-2k', ['W7/b']),
  pair('C1.1', 'C1.2', 'ohms-20M'),
  pair('C1.2', 'CH.2', 'ohms-20M'),
  pair('D1.a', 'D1.k', 'ohms-2000M', ['W35/b']),
];

describe('readings of the OR-16 beside ngspice', () =>
  agreesWithNgspice(or16OnBench, pairs, { pairs: 12, withDigits: 12, firstSeed: 300 }));
