import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import { solveDeck, type DeckAnswer } from '../../../shared/engine/deck/solve-deck.ts';
import { departures } from './agreement.ts';
import { soundDeck } from './expected.ts';

const folder = join(import.meta.dirname, '../../golden');
const names = readdirSync(folder);

describe('golden decks, solved by ngspice 39 beforehand', () => {
  it('are at least forty, and cover every analysis', () => {
    const all = names.map((name) => soundDeck(textOf(name)));
    expect(all.length).toBeGreaterThanOrEqual(40);
    expect(all.filter((deck) => deck.asksOperatingPoint).length).toBeGreaterThan(15);
    expect(all.filter((deck) => deck.frequencies !== undefined).length).toBeGreaterThan(8);
    expect(all.filter((deck) => deck.transient !== undefined).length).toBeGreaterThan(15);
  });

  it.each(names)(
    '%s',
    (name) => {
      const deck = soundDeck(textOf(name));
      const solved = solveDeck(deck);
      if (!solved.ok) expect.fail(solved.failure.message);
      const reference = JSON.parse(
        readFileSync(join(folder, name, 'expected.json'), 'utf8'),
      ) as DeckAnswer;
      const all = departures(deck.circuit, solved.value, reference);
      expect(all.length).toBeGreaterThan(0);
      expect(all.filter(({ ratio }) => !(ratio <= 1))).toEqual([]);
    },
    60_000,
  );
});

function textOf(name: string): string {
  return readFileSync(join(folder, name, 'circuit.cir'), 'utf8');
}
