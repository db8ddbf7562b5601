import type { Wave } from '../circuit/circuit.ts';
import type { TransientCommand } from './deck.ts';
import type { TokenReader } from './token-reader.ts';

type WaveReader = (reader: TokenReader, transient: TransientCommand | undefined) => Wave;

/** Reads the wave whose name comes next, or reads nothing and returns undefined. */
export function readWave(
  name: string,
  reader: TokenReader,
  transient: TransientCommand | undefined,
): Wave | undefined {
  const readArguments = Object.hasOwn(WAVES, name) ? WAVES[name] : undefined;
  if (readArguments === undefined) return undefined;
  reader.skip(name);
  const hasParenthesis = reader.skip('(');
  const wave = readArguments(reader, transient);
  if (hasParenthesis) reader.expect(')');
  return wave;
}

const WAVES: Readonly<Record<string, WaveReader>> = { sin: readSine, pulse: readPulse };

/** Whether another value of the wave follows, as against `)`, the end, or `AC`. */
function hasMore(reader: TokenReader): boolean {
  const next = reader.peek();
  return next !== undefined && /^[-+.\d]/.test(next);
}

/** A frequency of zero is one cycle in the span of `.tran`, as other programs have it. */
function readSine(reader: TokenReader, transient: TransientCommand | undefined): Wave {
  const optional = (what: string): number => (hasMore(reader) ? reader.number(what) : 0);
  return {
    shape: 'sine',
    offset: reader.number('the offset of SIN'),
    amplitude: reader.number('the amplitude of SIN'),
    frequency:
      reader.notNegative('the frequency of SIN') ||
      (transient === undefined ? 0 : 1 / transient.stop),
    delay: optional('the delay of SIN'),
    damping: optional('the damping of SIN'),
    phaseDegrees: optional('the phase of SIN'),
  };
}

/**
 * Times left out, and a rise or fall of zero, are what SPICE makes of them: the step of `.tran` for
 * rise and fall, its stop for width and period. Without `.tran` nothing reads them.
 */
function readPulse(reader: TokenReader, transient: TransientCommand | undefined): Wave {
  const step = transient?.step ?? 0;
  const stop = transient?.stop ?? 0;
  const time = (what: string, otherwise: number): number =>
    (hasMore(reader) ? reader.notNegative(`the ${what} of PULSE`) : 0) || otherwise;
  return {
    shape: 'pulse',
    low: reader.number('the first value of PULSE'),
    high: reader.number('the second value of PULSE'),
    delay: hasMore(reader) ? reader.number('the delay of PULSE') : 0,
    rise: time('rise', step),
    fall: time('fall', step),
    width: time('width', stop),
    period: time('period', stop),
  };
}
