import { describe, expect, it } from 'vitest';
import { wholeDecisions } from '../../../src/simulation/whole-decisions.ts';
import { step } from './events.ts';

const typesOf = (...types: string[]) =>
  wholeDecisions(types.map((type, i) => step(type, i))).map((one) => one.map(({ type }) => type));

describe('wholeDecisions', () => {
  it('keeps what happened with what brought it about', () => {
    expect(
      typesOf('CordPulled', 'LeadLifted', 'HazardHappened', 'HazardHappened', 'DoorOpened'),
    ).toEqual([['CordPulled'], ['LeadLifted', 'HazardHappened', 'HazardHappened'], ['DoorOpened']]);
  });

  it('lets an outcome that nothing came before stand alone', () => {
    expect(typesOf('AttemptBegan', 'CordPulled')).toEqual([['AttemptBegan'], ['CordPulled']]);
    expect(typesOf()).toEqual([]);
  });
});
