import { describe, expect, it } from 'vitest';
import { manual2000 } from '../../shared/instruments/manual-2000.ts';
import { OVER_RANGE } from '../../shared/reasoning/fault-table.ts';
import { observations } from '../../shared/reasoning/observations.ts';
import { stepCurve } from '../../shared/reasoning/step-curve.ts';
import { handsOn, lc28, opened, recorded, setupWith, type Hands } from '../support/bench.ts';

/** Puts the tips down and writes what has settled on the job sheet. */
function captures(hands: Hands, setting: string, red: string, black: string): void {
  if (hands.state().meter.setting !== setting) hands.does('SetMeter', { setting });
  hands.does('PlaceProbe', { probe: 'red', target: red });
  hands.does('PlaceProbe', { probe: 'black', target: black });
  hands.does('CaptureReading', {}, 5);
}

describe('the readings of an attempt', () => {
  const hands = opened(handsOn(setupWith([{ on: 'D1', fault: 'shorted' }])));
  hands.does('OpenDoor', {});
  hands.does('SetMeter', { setting: 'ohms-200' });
  hands.does('PlaceProbe', { probe: 'red', target: 'CH.1' });
  hands.does('PlaceProbe', { probe: 'black', target: 'CH.2' });
  hands.does('SetRelative', {}, 3);
  captures(hands, 'ohms-200', 'P1.E', 'CH.1');
  hands.does('LiftLead', { end: 'W27/b' });
  captures(hands, 'ohms-2000M', 'D1.k', 'D1.a');
  captures(hands, 'dc-20', 'D1.k', 'D1.a');
  const events = recorded(hands.events());
  const found = observations(lc28, manual2000, events);

  it('are those of resistance, with the position and what REL took off put back', () => {
    expect(found.map(({ measured }) => measured.setting)).toEqual(['ohms-200', 'ohms-2000M']);
    // 0.08 Ohm of earth lead and 0.16 of test leads: 0.1 shown after REL, two or three counts found
    expect(found[0]!.counts).toBeGreaterThanOrEqual(2);
    expect(found[0]!.counts).not.toBe(OVER_RANGE);
    expect(found[1]!.measured.lift).toEqual(['W27/b']);
    expect(found[1]!.measured.press).toEqual([]);
  });

  it('lower the faults left, and never rule out the true one', () => {
    const { start, steps } = stepCurve(lc28, manual2000, events);
    expect(start).toBeGreaterThan(60);
    expect(steps.map(({ sequence }) => sequence)).toEqual(found.map(({ sequence }) => sequence));
    expect(steps[0]!.left).toBeLessThan(start);
    expect(steps[1]!.left).toBeGreaterThanOrEqual(1);
    // a shorted diode, a leaky one and pairs with it: few out of hundreds
    expect(steps[1]!.left).toBeLessThan(20);
    expect(steps[1]!.best?.label).toBeTruthy();
  }, 60_000);
});
