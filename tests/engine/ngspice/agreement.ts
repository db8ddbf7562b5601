import type { Circuit } from '../../../shared/engine/circuit/circuit.ts';
import type { Complex } from '../../../shared/engine/analyses/phasor.ts';
import type { DeckAnswer } from '../../../shared/engine/deck/solve-deck.ts';

/** How far a signal is from the reference where it is furthest; a ratio above 1 is too far. */
export interface Departure {
  part: keyof DeckAnswer;
  signal: string;
  /** in units of what is allowed */ ratio: number;
  /** the sample, counted from 0 */ sample: number;
  ours: number | Complex;
  reference: number | Complex;
}

/** Of an operating point or a phasor, by the larger of the two. */
const RELATIVE = 1e-6;
/** V and A, where a value is nothing but rounding. */
const FLOOR = { v: 1e-9, i: 1e-12 };
/** Of a transient, share of the signal's own peak. */
const LINEAR_SHARE = 1e-3;
const SWITCHING_SHARE = 5e-3;
/** V and A; a transient that never exceeds this is taken as zero with this for its peak. */
const LEAST_PEAK = { v: 1e-6, i: 1e-9 };

/** The departures of an answer from the reference, the worst first. Throws when signals are missing. */
export function departures(circuit: Circuit, ours: DeckAnswer, reference: DeckAnswer): Departure[] {
  const isLinear = circuit.elements.every(({ kind }) => kind !== 'diode' && kind !== 'switch');
  const share = isLinear ? LINEAR_SHARE : SWITCHING_SHARE;
  const closeTo: Allowed = (kind, value) => Math.max(RELATIVE * modulus(value), FLOOR[kind]);
  const inBand: Allowed = (kind, _value, peak) => share * Math.max(peak, LEAST_PEAK[kind]);
  return [
    ...compare('op', asSamples(ours.op), asSamples(reference.op), closeTo),
    ...compare('ac', ours.ac, reference.ac, closeTo),
    ...compare('tran', onTimesOf(reference, ours), reference.tran, inBand),
  ].sort((a, b) => b.ratio - a.ratio);
}

type Sample = number | Complex;
type Signals = Record<string, readonly Sample[]>;
type Allowed = (kind: 'v' | 'i', value: Sample, peak: number) => number;

const modulus = (value: Sample): number =>
  typeof value === 'number' ? Math.abs(value) : Math.hypot(value[0], value[1]);

const difference = (a: Sample, b: Sample): number =>
  typeof a === 'number' || typeof b === 'number'
    ? Math.abs(Number(a) - Number(b))
    : Math.hypot(a[0] - b[0], a[1] - b[1]);

function asSamples(point: Record<string, number> | undefined): Signals | undefined {
  return point && Object.fromEntries(Object.entries(point).map(([name, value]) => [name, [value]]));
}

/** The reference may lack the first sample, which ngspice does not keep when told initial conditions. */
function onTimesOf(reference: DeckAnswer, ours: DeckAnswer): Signals | undefined {
  const missing = (ours.tran?.['time']?.length ?? 0) - (reference.tran?.['time']?.length ?? 0);
  if (missing !== 0 && missing !== 1) throw new Error(`${missing} samples more than the reference`);
  const cut = Object.entries(ours.tran ?? {}).map(([name, values]) => [
    name,
    values.slice(missing),
  ]);
  return ours.tran && (Object.fromEntries(cut) as Signals);
}

function compare(
  part: keyof DeckAnswer,
  ours: Signals | undefined,
  reference: Signals | undefined,
  allowed: Allowed,
): Departure[] {
  const names = Object.keys(reference ?? {}).sort();
  const mine = Object.keys(ours ?? {}).sort();
  if (names.join() !== mine.join()) throw new Error(`${part}: ${mine.join()} for ${names.join()}`);
  return names.map((signal) =>
    furthest(part, signal, ours![signal]!, reference![signal]!, allowed),
  );
}

function furthest(
  part: keyof DeckAnswer,
  signal: string,
  ours: readonly Sample[],
  reference: readonly Sample[],
  allowed: Allowed,
): Departure {
  if (ours.length !== reference.length) throw new Error(`${part} ${signal}: another length`);
  const kind = signal.startsWith('i(') ? 'i' : 'v';
  const peak = reference.reduce<number>((most, value) => Math.max(most, modulus(value)), 0);
  let worst: Departure = { part, signal, ratio: -1, sample: 0, ours: 0, reference: 0 };
  reference.forEach((value, sample) => {
    const ratio = difference(ours[sample]!, value) / allowed(kind, value, peak);
    // a value that is not a number must count as too far
    if (!(ratio <= worst.ratio))
      worst = { part, signal, ratio, sample, ours: ours[sample]!, reference: value };
  });
  return worst;
}
