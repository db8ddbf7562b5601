import { describe, expect, it } from 'vitest';
import { begin } from '../../../shared/bench/begin.ts';
import type { WireEvent } from '../../../shared/bench/event.ts';
import { verify } from '../../../shared/bench/verify.ts';
import { handsOn, opened, reads, setupWith } from '../../support/bench.ts';
import { recordings } from '../../support/recordings.ts';

const worked = () => {
  const hands = opened(handsOn(setupWith()));
  hands.does('LiftLead', { end: 'W8/b' });
  reads(hands, 'ohms-2k', 'T2.1', 'T2.2');
  hands.does('CaptureReading', {});
  return hands;
};

const judged = (events: readonly WireEvent[]) => {
  const setup = setupWith();
  return verify(setup, begin(setup).state, events.slice(1));
};

const changed = (events: readonly WireEvent[], type: string, data: object): WireEvent[] =>
  events.map((event) =>
    event.type === type ? { ...event, data: { ...event.data, ...data } } : event,
  );

describe('what another machine says happened', () => {
  it.each(recordings.map((one) => [one.file, one] as const))(
    'is taken when the same rules give it: %s',
    (_file, { setup, events }) => {
      const began = begin(setup);
      expect(events[0]).toMatchObject({ type: 'AttemptBegan', data: { seed: setup.seed } });
      expect(verify(setup, began.state, events.slice(1))).toMatchObject({
        ok: true,
        state: { isHandedIn: true },
      });
    },
    60_000,
  );

  it('is refused when a reading is not what the circuit gives, and names the event', () => {
    const { events } = { events: worked().events() };
    const verified = judged(changed(events, 'ReadingCaptured', { display: '1.234', value: 1234 }));
    expect(verified).toMatchObject({
      ok: false,
      reason: 'cannot-have-happened',
      index: events.findIndex((event) => event.type === 'ReadingCaptured') - 1,
    });
  });

  it('is refused when a display is one count off', () => {
    const events = worked().events();
    const captured = events.find((event) => event.type === 'ReadingCaptured');
    const display = (Number(captured?.data['display']) + 0.001).toFixed(3);
    expect(judged(events).ok).toBe(true);
    expect(judged(changed(events, 'ReadingCaptured', { display })).ok).toBe(false);
  });

  it('is refused when a step is missing before it', () => {
    const events = worked().events();
    const without = events.filter((event) => event.type !== 'CoverRemoved');
    expect(judged(without)).toMatchObject({ ok: false, message: expect.stringContaining('cover') });
  });

  it('is refused when a hazard is left out', () => {
    const setup = setupWith([{ on: 'V1', fault: 'heater-open' }], { lastRunSecondsAgo: 5 });
    const hands = opened(handsOn(setup));
    const events = [...hands.events(), ...hands.does('LiftLead', { end: 'W24/a' })];
    const kept = events.filter((event) => event.type !== 'HazardHappened');
    expect(kept.length).toBe(events.length - 1);
    expect(verify(setup, begin(setup).state, kept.slice(1))).toMatchObject({
      ok: false,
      message: 'HazardHappened is missing after LeadLifted.',
    });
  });

  it('is refused when it is of no known type, has wrong data, or runs back in time', () => {
    const event = (type: string, data: Record<string, unknown>, benchMs = 10): WireEvent => ({
      type,
      version: 1,
      data,
      benchMs,
    });
    const judge = (...events: WireEvent[]) => {
      const setup = setupWith();
      return verify(setup, begin(setup).state, events);
    };
    expect(judge(event('OvenStolen', {}))).toMatchObject({ ok: false, reason: 'unknown-type' });
    expect(judge(event('ProbePlaced', { probe: 'green', target: 'C1.1' }))).toMatchObject({
      ok: false,
      reason: 'invalid-data',
      path: 'data.probe',
    });
    expect(judge(event('CordPulled', { why: 'x' }))).toMatchObject({ reason: 'invalid-data' });
    expect(judge(event('AttemptBegan', {}))).toMatchObject({ reason: 'cannot-have-happened' });
    expect(judge(event('CordPulled', {}, 50), event('CoverRemoved', {}, 40))).toMatchObject({
      index: 1,
      message: 'Bench time cannot run back.',
    });
  });
});
