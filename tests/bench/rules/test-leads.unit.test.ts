import { describe, expect, it } from 'vitest';
import { begin } from '../../../shared/bench/begin.ts';
import type { ProbeHold } from '../../../shared/bench/record.ts';
import type { Setup } from '../../../shared/bench/setup.ts';
import { heldWords } from '../../../shared/bench/test-leads.ts';
import { verify } from '../../../shared/bench/verify.ts';
import { exactMeter } from '../../../shared/instruments/draw-meter.ts';
import { handsOn, opened, reads, setupWith, type Hands } from '../../support/bench.ts';

/** The drawn oven with a meter that has no error of its own: the reading is the circuit's. */
const exact = (setup = setupWith()): Setup => ({ ...setup, unit: exactMeter() });

const hold = (hands: Hands, red: ProbeHold, black: ProbeHold): void => {
  if (hands.state().holds.red !== red) hands.does('HoldProbe', { probe: 'red', hold: red });
  if (hands.state().holds.black !== black) hands.does('HoldProbe', { probe: 'black', hold: black });
};

/** Both leads off one side: the capacitor's own 10 MOhm stands alone. */
const bleederAlone = (): Hands => {
  const hands = opened(handsOn(exact()));
  for (const end of ['W24/a', 'W27/a', 'W23/b']) hands.does('LiftLead', { end });
  return hands;
};

describe('fingers on the tips', () => {
  it('read 1 MOhm beside the bleeder of the capacitor, and a clip lead reads it alone', () => {
    const hands = bleederAlone();
    const bleeder = hands.setup.oven.values['C1']?.['bleeder'] ?? 0;
    // 10 MOhm within 3 %: with 1 MOhm across it 0.909 MOhm. A count of the range is 0.01 MOhm.
    const across = 1 / (1 / bleeder + 1 / 1e6);
    expect(across / 1e6).toBeCloseTo(0.909, 2);
    const read = () => reads(hands, 'ohms-20M', 'C1.1', 'C1.2', 60);
    hold(hands, 'fingers', 'fingers');
    expect(Math.abs((read().value ?? 0) - across)).toBeLessThan(0.015e6);
    hold(hands, 'clip', 'clip');
    expect(Math.abs((read().value ?? 0) - bleeder)).toBeLessThan(0.015e6);
    hold(hands, 'handle', 'handle');
    expect(Math.abs((read().value ?? 0) - bleeder)).toBeLessThan(0.015e6);
  });

  it('do nothing while one hand keeps to the handle', () => {
    const hands = bleederAlone();
    hold(hands, 'fingers', 'handle');
    expect(reads(hands, 'ohms-20M', 'C1.1', 'C1.2', 60).value).toBeGreaterThan(9e6);
  });

  it('show where nothing else conducts, and not on a low range', () => {
    const hands = opened(handsOn(exact()));
    hands.does('LiftLead', { end: 'W24/b' });
    hold(hands, 'fingers', 'fingers');
    expect(reads(hands, 'ohms-20M', 'W24/b', 'BAT.pos').display).toBe('1.00');
    expect(reads(hands, 'ohms-200', 'W24/b', 'BAT.pos').display).toBe('OL');
  });
});

describe('clip leads', () => {
  /** The heater of the magnetron with one lead off. */
  const heater = () => {
    const hands = opened(handsOn(exact()));
    hands.does('LiftLead', { end: 'W25/b' });
    hands.does('LiftLead', { end: 'W24/b' });
    const read = () => reads(hands, 'ohms-200', 'V1.1', 'V1.2').value ?? NaN;
    return { hands, read };
  };

  it('add 0.2 Ohm each to what the test leads add', () => {
    const { hands, read } = heater();
    const byHandle = read();
    // A cold heater of 0.05 to 0.2 Ohm and 0.16 Ohm of test leads; a count is 0.1 Ohm.
    expect(byHandle).toBeGreaterThan(0.1);
    expect(byHandle).toBeLessThan(0.5);
    hold(hands, 'clip', 'handle');
    expect(Math.abs(read() - byHandle - 0.2)).toBeLessThan(0.11);
    hold(hands, 'clip', 'clip');
    expect(read() - byHandle).toBeCloseTo(0.4, 5);
  });

  it('are zeroed away with REL, clip on clip', () => {
    const { hands, read } = heater();
    const byHandle = read();
    hold(hands, 'clip', 'clip');
    reads(hands, 'ohms-200', 'V1.1', 'V1.1');
    const [zero] = hands.does('SetRelative', {});
    // 0.16 + 2 x 0.2 Ohm
    expect(zero?.data).toMatchObject({ display: '0.6' });
    expect(Math.abs(read() - (byHandle - 0.16))).toBeLessThan(0.11);
  });
});

describe('a hand on the metal', () => {
  const charged = () => {
    const faults = [
      { on: 'V1', fault: 'heater-open' },
      { on: 'C1', fault: 'bleeder-open' },
    ];
    return opened(handsOn(setupWith(faults, { lastRunSecondsAgo: 60 })));
  };
  const kinds = (events: readonly { type: string; data: object }[]) =>
    events.flatMap(({ type, data }) =>
      type === 'HazardHappened' ? [(data as { kind: string }).kind] : [],
    );

  it.each(['clip', 'fingers'] as const)('meets the charge: %s', (how) => {
    const hands = charged();
    hands.does('HoldProbe', { probe: 'red', hold: how });
    expect(kinds(hands.does('PlaceProbe', { probe: 'red', target: 'C1.2' }))).toEqual(['shock']);
  });

  it('meets it too when it slips down from the handle, and nothing at the handle', () => {
    const hands = charged();
    expect(kinds(hands.does('PlaceProbe', { probe: 'red', target: 'C1.2' }))).toEqual([]);
    expect(kinds(hands.does('HoldProbe', { probe: 'red', hold: 'fingers' }))).toEqual(['shock']);
  });

  it('lies across a capacitor that stands free of the chassis, from one hand to the other', () => {
    const hands = charged();
    // As if the leads had come off by themselves: whoever lifts them by hand is hit before.
    const before = hands.state();
    const free = {
      ...before,
      oven: {
        ...before.oven,
        leadEnds: { ...before.oven.leadEnds, 'W23/b': null, 'W24/a': null, 'W27/a': null },
      },
    };
    const floating = handsOn(hands.setup, { ...begin(hands.setup), state: free });
    floating.does('HoldProbe', { probe: 'red', hold: 'fingers' });
    floating.does('HoldProbe', { probe: 'black', hold: 'fingers' });
    expect(kinds(floating.does('PlaceProbe', { probe: 'red', target: 'C1.1' }))).toEqual([]);
    const events = floating.does('PlaceProbe', { probe: 'black', target: 'C1.2' });
    expect(events[1]?.data).toMatchObject({ kind: 'shock', at: 'C1.1', to: 'C1.2' });
    const left = floating.state().storage.voltages['C1:foils'] ?? NaN;
    expect(Math.abs(left)).toBeLessThan(60);
  });
});

describe('how a reading was held', () => {
  it('stands on the sheet when it was not by the handles, and in no reading that was', () => {
    const hands = bleederAlone();
    const usual = reads(hands, 'ohms-20M', 'C1.1', 'C1.2');
    expect('held' in usual).toBe(false);
    hold(hands, 'fingers', 'fingers');
    hands.does('CaptureReading', {}, 20);
    expect(hands.state().sheet.readings[0]).toMatchObject({
      held: { red: 'fingers', black: 'fingers' },
    });
    const events = hands.events().slice(1);
    expect(verify(hands.setup, begin(hands.setup).state, events)).toMatchObject({ ok: true });
    const hidden = events.map((event) => {
      const { held: _held, ...data } = event.data;
      return event.type === 'ReadingCaptured' ? { ...event, data } : event;
    });
    expect(verify(hands.setup, begin(hands.setup).state, hidden)).toMatchObject({
      ok: false,
      reason: 'cannot-have-happened',
    });
  });

  it('is said in words', () => {
    expect(heldWords(undefined)).toBe('');
    expect(heldWords({ red: 'clip', black: 'clip' })).toBe('through clip leads');
    expect(heldWords({ red: 'clip', black: 'fingers' })).toBe(
      'red through a clip lead, black tip in the fingers',
    );
  });

  it('is not chosen twice', () => {
    const hands = handsOn(setupWith());
    expect(hands.isRefused('HoldProbe', { probe: 'red', hold: 'handle' })).toBe('held-so');
  });
});
