import { describe, expect, it } from 'vitest';
import { waitingSteps } from '../../../src/simulation/waiting-steps.ts';
import { step } from './events.ts';

const record = [step('AttemptBegan', 0), step('CordPulled', 1000), step('CoverRemoved', 2000)];
const kept = (sequence: number, type: string, benchMs: number) => ({
  sequence,
  event: step(type, benchMs),
});

describe('what of the kept steps is still to be sent', () => {
  it('is all of them when the server has none', () => {
    const found = waitingSteps(record, [kept(3, 'DoorOpened', 3000), kept(4, 'DoorClosed', 4000)]);
    expect(found).toEqual({
      kind: 'follow',
      events: [step('DoorOpened', 3000), step('DoorClosed', 4000)],
    });
  });

  it('leaves out what the record has already', () => {
    const found = waitingSteps(record, [
      kept(2, 'CoverRemoved', 2000),
      kept(3, 'DoorOpened', 3000),
    ]);
    expect(found).toEqual({ kind: 'follow', events: [step('DoorOpened', 3000)] });
  });

  it('is nothing when the job went on elsewhere from another step', () => {
    const found = waitingSteps(record, [kept(2, 'DoorOpened', 1500), kept(3, 'DoorClosed', 1600)]);
    expect(found.kind).toBe('astray');
  });

  it('is nothing when a step in between is lost', () => {
    expect(waitingSteps(record, [kept(4, 'DoorOpened', 3000)]).kind).toBe('astray');
  });

  it('knows a step again whatever the order of its fields', () => {
    const there = [{ ...step('LeadLifted', 5), data: { end: 'W1/a', from: { a: 1, b: [2] } } }];
    const here = { ...step('LeadLifted', 5), data: { from: { b: [2], a: 1 }, end: 'W1/a' } };
    expect(waitingSteps(there, [{ sequence: 0, event: here }])).toEqual({
      kind: 'follow',
      events: [],
    });
  });
});
