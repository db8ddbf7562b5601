import { describe, expect, it } from 'vitest';
import { solveDeck } from '../../../shared/engine/deck/solve-deck.ts';
import { writeDeck } from '../../../shared/engine/deck/write-deck.ts';
import { runNgspice, type NgspiceAnswer } from '../../support/ngspice.ts';
import { departures } from './agreement.ts';
import { expectedOf, soundDeck } from './expected.ts';
import {
  randomDiodes,
  randomMesh,
  randomNetwork,
  randomRectifier,
  randomWindings,
  type RandomCircuit,
} from './random-circuits.ts';
import { referenceJob } from './reference-job.ts';

/** Each family with how many seeds, counted from 1, are compared. */
const FAMILIES: readonly (readonly [string, (seed: number) => RandomCircuit, number])[] = [
  ['mesh', randomMesh, 100],
  ['diodes', randomDiodes, 100],
  ['windings', randomWindings, 24],
  ['network', randomNetwork, 24],
  ['rectifier', randomRectifier, 14],
];

const drawn = FAMILIES.flatMap(([family, draw, count]) =>
  Array.from({ length: count }, (_, index) => {
    const seed = index + 1;
    return { family, seed, text: deckText(draw(seed), `${family} of seed ${seed}`) };
  }),
);

function deckText({ circuit, analyses, longestStep }: RandomCircuit, title: string): string {
  const reference = longestStep === undefined ? [] : [`* reference: tmax=${longestStep}`];
  return [title, ...reference, ...writeDeck(circuit).lines, ...analyses, '.end', ''].join('\n');
}

let run: { answers: NgspiceAnswer[] } | { error: unknown } | undefined;

/** Runs ngspice once; every test that needs it fails, rather than is skipped, when that fails. */
function referenceAnswers(): NgspiceAnswer[] {
  try {
    run ??= { answers: runNgspice(drawn.map(({ text }) => referenceJob(text))) };
  } catch (error) {
    run = { error };
  }
  if ('error' in run) throw run.error;
  return run.answers;
}

describe('circuits drawn at random, beside ngspice', () => {
  it('are at least two hundred', () => {
    expect(referenceAnswers().length).toBeGreaterThanOrEqual(200);
  }, 300_000);

  it.each(drawn.map(({ family, seed }, index) => ({ family, seed, index })))(
    '$family of seed $seed',
    ({ index }) => {
      const { text } = drawn[index]!;
      const deck = soundDeck(text);
      const solved = solveDeck(deck);
      if (!solved.ok) expect.fail(`${solved.failure.message}\n${text}`);
      const reference = expectedOf(deck, referenceAnswers()[index]!);
      const far = departures(deck.circuit, solved.value, reference).filter(
        ({ ratio }) => !(ratio <= 1),
      );
      expect(far, text).toEqual([]);
    },
    60_000,
  );
});
