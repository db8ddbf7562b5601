import { describe, expect, it } from 'vitest';
import { LARGEST_DECK, readDeck } from '../../../shared/engine/deck/read-deck.ts';
import type { DeckError } from '../../../shared/engine/deck/deck.ts';

const errorsOf = (text: string): DeckError[] => {
  const read = readDeck(text);
  if (read.ok) throw new Error('the deck was found sound');
  return read.failure;
};

/** The only error of a deck whose third line is the one given. */
const errorOf = (line: string): DeckError => {
  const errors = errorsOf(`t\nR0 a 0 1\n${line}\nD0 a 0 dm\n.model dm D\n.op\n.end`);
  expect(errors).toHaveLength(1);
  return errors[0]!;
};

/** s this process worked since: what it waited for others counts for nothing. */
const secondsOfWork = (began: NodeJS.CpuUsage): number => {
  const { user, system } = process.cpuUsage(began);
  return (user + system) / 1e6;
};

describe('a line that is wrong', () => {
  it.each([
    ['Q1 a b c model', 'unknown element "q1"'],
    ['= a 0 1', 'the name of an element expected'],
    ['R1', 'the first node of r1 is missing'],
    ['R1 a', 'the second node of r1 is missing'],
    ['R1 a __proto__ 1', 'the second node of r1 cannot be "__proto__"'],
    ['R1 a 0', 'the resistance of r1 is missing'],
    ['R1 a 0 1k5', '"1k5" is not a number'],
    ['R1 a 0 10q', '"10q" has an unknown suffix "q"'],
    ['R1 a 0 0', 'the resistance of r1 is 0: it must be above zero'],
    ['R1 a 0 -5', 'the resistance of r1 is -5: it must be above zero'],
    ['R1 a 0 1 2', '"2" is not understood here'],
    ['R0 b 0 1', '"r0" is already on line 2'],
    ['C1 a 0 0', 'the capacitance of c1 is 0'],
    ['C1 a 0 1u IC', '"=" expected at the end'],
    ['C1 a 0 1u IC=', 'the initial condition of c1 is missing'],
    ['L1 a 0 -1', 'the inductance of l1 is -1'],
    ['K1 L1 L2', 'the coefficient of k1 is missing'],
    ['K1 L1 L2 1.5', 'the coefficient of k1 is 1.5'],
    ['K1 L1 L2 0.5', 'there is no inductor l1'],
    ['V1 a 0', 'the value of v1 is missing'],
    ['V1 a 0 DC', 'the DC value of v1 is missing'],
    ['V1 a 0 AC', 'the AC magnitude of v1 is missing'],
    ['V1 a 0 1 DC 2', 'v1 has two DC values'],
    ['V1 a 0 SIN(0 1)', 'the frequency of SIN expected'],
    ['V1 a 0 SIN(0 1 60', '")" expected at the end'],
    ['V1 a 0 SIN(0 1 60 0 0 0 7)', '")" expected, not "7"'],
    ['V1 a 0 PULSE(0 1 0 1u 1u 1 2 3)', '")" expected, not "3"'],
    ['V1 a 0 PULSE(0 1 0 -1u)', 'the rise of PULSE is -0.000001'],
    ['V1 a 0 EXP(0 1)', '"exp" is not understood here'],
    ['D1 a 0', 'the model of d1 is missing'],
    ['D1 a 0 nowhere', 'there is no .model "nowhere"'],
    ['S1 a 0 a 0 dm', '.model "dm" is not that of a switch'],
    ['S1 a 0 a', 'the second control node of s1 is missing'],
    ['.model dm D', 'model "dm" is already on line 3'],
    ['.model m2 NPN', '"npn" is not a kind of model'],
    ['.model m2 D(CJO=1p)', '"cjo" is not a parameter'],
    ['.model m2 D(IS)', '"=" expected, not ")"'],
    ['.model m2 D(IS=1n IS=2n)', '"is" is given twice'],
    ['.model m2 D(N=0)', 'N is 0: it must be above zero'],
    ['.model m2 SW(RON=0)', 'RON is 0: it must be above zero'],
    ['.include other.cir', '".include" is not a command'],
    ['.control', '".control" is not a command'],
    ['.op', '.op is already on line 3'],
    ['.tran 1u', 'the stop of .tran is missing'],
    ['.tran 0 1', 'the step of .tran is 0'],
    ['.tran 1 0.5', 'the step of .tran is longer than its span'],
    ['.tran 1u 1m 2m', '.tran starts at its stop or after it'],
    ['.tran 1n 1', '.tran asks for 1000000000 samples'],
    ['.ac 10 1 100', '"10" is not a spacing'],
    ['.ac dec 0 1 100', 'the number of points of .ac is 0'],
    ['.ac dec 1.5 1 100', 'the number of points of .ac is not whole'],
    ['.ac dec 10 0 100', 'the first frequency of .ac is 0'],
    ['.ac dec 10 100 10', '.ac ends below its first frequency'],
    ['.ac lin 1t 1 100', '.ac asks for more than'],
    ['.ic', '.ic sets nothing'],
    ['.ic a=1', 'V(node)=value expected, not "a"'],
    ['.ic v(a)', '"=" expected at the end'],
    ['.ic v(nowhere)=1', '.ic names no node "nowhere"'],
    ['.ic v(a)=1 v(a)=2', '.ic sets node "a" twice'],
  ])('%s', (line, message) => {
    const error = errorOf(line);
    expect(error.message).toContain(message);
    expect(error.message).not.toContain('\n');
    expect(error.line).toBe(message.includes('already on line 3') ? (line === '.op' ? 6 : 5) : 3);
  });

  it('is named by its own number in a continuation', () => {
    expect(errorsOf('t\nR1 a\n* c\n+ 0\n+ 1q\n.op')[0]).toMatchObject({ line: 5 });
    expect(errorsOf('t\n+ a 0 1\nR1 a 0 1\n.op')[0]).toEqual({
      line: 2,
      message: 'a continuation with nothing before it',
    });
  });

  it('is listed with the others, in the order of their lines', () => {
    const errors = errorsOf('t\n.opp\nR1 a 0\n.model m D(X=1)\nR2 a 0 0\n.op');
    expect(errors.map(({ line }) => line)).toEqual([2, 3, 4, 5]);
  });

  it('is not blamed again where its model is used', () => {
    const errors = errorsOf('t\nD1 a 0 m\nR1 a 0 1\n.model m D(X=1)\n.op');
    expect(errors.map(({ line }) => line)).toEqual([4]);
  });
});

describe('a deck that is wrong as a whole', () => {
  it('has no ground', () => {
    expect(errorsOf('t\n\nR1 a b 1\nV1 a b 1\n.op')).toEqual([
      { line: 3, message: 'no ground: no element is connected to node 0' },
    ]);
  });

  it('has a loop of voltage sources', () => {
    expect(errorsOf('t\nV1 a 0 1\nR1 a 0 1\nV2 a b 1\nV3 b 0 1\n.op')[0]).toMatchObject({
      line: 5,
      message: expect.stringContaining('v3 closes a loop'),
    });
    expect(errorsOf('t\nR1 a 0 1\nV1 a a 1\n.op')[0]).toMatchObject({ line: 3 });
  });

  it('has nothing in it', () => {
    expect(errorsOf('')).toEqual([{ line: 1, message: 'the deck is empty' }]);
    expect(errorsOf('\n\n  \n')).toEqual([{ line: 1, message: 'the deck is empty' }]);
    expect(errorsOf('title\n.op\n')[0]!.message).toBe('the deck has no elements');
  });

  it('asks for nothing', () => {
    expect(errorsOf('t\nR1 a 0 1\n.end')).toEqual([
      { line: 2, message: 'the deck asks for nothing: no .op, .tran or .ac' },
    ]);
  });

  it('is no text', () => {
    expect(errorsOf('t\nR1 a 0 1\n\u0000\u0001ELF')).toEqual([
      { line: 3, message: 'not a text file' },
    ]);
  });

  it('is far too long, and that is said soon', () => {
    const began = process.cpuUsage();
    const line = 'R1 a 0 1\n';
    const errors = errorsOf(`t\n${line.repeat(1_200_000)}`);
    expect(secondsOfWork(began)).toBeLessThan(1);
    expect(errors).toEqual([
      {
        line: Math.floor((LARGEST_DECK - 2) / line.length) + 2,
        message: `the deck is longer than ${LARGEST_DECK} characters`,
      },
    ]);
  });

  it('has an error on every line, and still answers soon', () => {
    const began = process.cpuUsage();
    expect(errorsOf(`t\n${'R1 a 0 1q\n'.repeat(45_000)}`).length).toBeGreaterThan(44_000);
    expect(secondsOfWork(began)).toBeLessThan(1.5);
  });
});
