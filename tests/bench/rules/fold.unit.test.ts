import { expect, it } from 'vitest';
import { fold } from '../../../shared/bench/fold.ts';
import { handsOn, opened, setupWith } from '../../support/bench.ts';

// The server folds the record, the bench runs commands: a last bit of difference would grow into a refusal.
it('a record folded is the bench it came from, to the last bit, hazards and all', () => {
  const setup = setupWith([{ on: 'V1', fault: 'heater-open' }], { lastRunSecondsAgo: 5 });
  const hands = opened(handsOn(setup));
  hands.does('LiftLead', { end: 'W24/a' });
  hands.does('PlaceProbe', { probe: 'red', target: 'C1.1' });
  hands.does('SetMeter', { setting: 'ohms-20M' });
  hands.does('PlaceProbe', { probe: 'black', target: 'C1.2' });
  hands.does('SetMeter', { setting: 'dc-1000' }, 0);
  hands.does('TakeReading', {}, 3);
  expect(hands.events().map(({ type }) => type)).toContain('HazardHappened');
  expect(Math.abs(hands.state().storage.voltages['C1:foils'] ?? 0)).toBeGreaterThan(0);
  const { wayBack: _one, ...folded } = fold(setup, hands.events());
  const { wayBack: _other, ...live } = hands.state();
  expect(folded).toStrictEqual(live);
});
