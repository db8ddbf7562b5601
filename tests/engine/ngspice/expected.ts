import { readDeck } from '../../../shared/engine/deck/read-deck.ts';
import type { Deck } from '../../../shared/engine/deck/deck.ts';
import type { DeckAnswer } from '../../../shared/engine/deck/solve-deck.ts';
import type { NgspiceAnswer, Signals } from '../../support/ngspice.ts';

/** What the reference simulator says of a deck, in the form that the solve command prints. */
export type Expected = DeckAnswer;

/** A deck that must be sound. */
export function soundDeck(text: string): Deck {
  const read = readDeck(text);
  if (!read.ok) throw new Error(JSON.stringify(read.failure));
  return read.value;
}

/** Puts a reference answer on the deck's own grid of times. */
export function expectedOf(deck: Deck, answer: NgspiceAnswer): Expected {
  const expected: Expected = {};
  if (answer.op !== undefined) expected.op = answer.op;
  if (answer.tran !== undefined) expected.tran = onGrid(deck, answer.tran);
  if (answer.ac !== undefined)
    expected.ac = { ...answer.ac.signals, frequency: answer.ac.frequency };
  return expected;
}

/** At multiples of the step; with `uic` without t = 0, of which ngspice keeps no point. */
function onGrid(deck: Deck, signals: Signals): Record<string, number[]> {
  const { step, stop, start, useInitialConditions } = deck.transient!;
  const first = Math.max(Math.ceil((start ?? 0) / step - 1e-9), useInitialConditions ? 1 : 0);
  const last = Math.floor(stop / step + 1e-9);
  const time = Array.from({ length: last - first + 1 }, (_, index) => (first + index) * step);
  const reached = signals['time']!.at(-1)!;
  if (reached < stop * (1 - 1e-9)) throw new Error(`the reference stopped at ${reached} s`);
  const names = Object.keys(signals).filter((name) => name !== 'time');
  const sampled = names.map((name) => [name, interpolate(signals['time']!, signals[name]!, time)]);
  return { time, ...(Object.fromEntries(sampled) as Record<string, number[]>) };
}

/** Straight between the points around each time; times ascend. */
function interpolate(
  times: readonly number[],
  values: readonly number[],
  at: readonly number[],
): number[] {
  let right = 1;
  return at.map((time) => {
    while (right < times.length - 1 && times[right]! < time) right += 1;
    const [before, after] = [times[right - 1]!, times[right]!];
    const share = Math.min(1, Math.max(0, (time - before) / (after - before)));
    return values[right - 1]! + share * (values[right]! - values[right - 1]!);
  });
}
