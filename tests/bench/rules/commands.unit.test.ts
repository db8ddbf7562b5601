import { describe, expect, it } from 'vitest';
import { handsOn, opened, reads, setupWith } from '../../support/bench.ts';

describe('reaching in', () => {
  it('refuses everything inside while the cover is on', () => {
    const hands = handsOn(setupWith());
    expect(hands.isRefused('LiftLead', { end: 'W27/b' })).toBe('cover-is-on');
    expect(hands.isRefused('PlaceProbe', { probe: 'red', target: 'C1.1' })).toBe('cover-is-on');
    expect(hands.isRefused('PressSwitch', { part: 'S1' })).toBe('cover-is-on');
  });

  it('keeps the cover on while the cord is in', () => {
    expect(handsOn(setupWith()).isRefused('RemoveCover', {})).toBe('cord-is-in');
  });

  it('reaches the plug pins only when the plug is out of the outlet', () => {
    const hands = handsOn(setupWith());
    expect(hands.isRefused('PlaceProbe', { probe: 'red', target: 'P1.L' })).toBe('cover-is-on');
    hands.does('PullCord', {});
    hands.does('PlaceProbe', { probe: 'red', target: 'P1.L' });
    expect(hands.state().probes.red).toBe('P1.L');
  });

  it('knows no terminal or lead that the oven has not', () => {
    const hands = opened(handsOn(setupWith()));
    expect(hands.isRefused('PlaceProbe', { probe: 'red', target: 'C9.1' })).toBe('no-such-target');
    expect(hands.isRefused('PlaceProbe', { probe: 'red', target: 'W27/b' })).toBe('no-such-target');
    expect(hands.isRefused('LiftLead', { end: 'W99/a' })).toBe('no-such-lead');
  });
});

describe('leads', () => {
  it('lifts, hangs loose to be probed, and goes on a wrong terminal if told to', () => {
    const hands = opened(handsOn(setupWith()));
    hands.does('LiftLead', { end: 'W27/b' });
    expect(hands.state().oven.leadEnds['W27/b']).toBeNull();
    hands.does('PlaceProbe', { probe: 'red', target: 'W27/b' });
    hands.does('RefitLead', { end: 'W27/b', terminal: 'D1.k' });
    expect(hands.state().oven.leadEnds['W27/b']).toBe('D1.k');
    expect(hands.state().probes.red).toBeNull();
  });

  it('refuses a lead twice lifted, and a connector on a core', () => {
    const hands = opened(handsOn(setupWith()));
    hands.does('LiftLead', { end: 'W23/a' });
    expect(hands.isRefused('LiftLead', { end: 'W23/a' })).toBe('lifted-already');
    expect(hands.isRefused('RefitLead', { end: 'W23/a', terminal: 'T1.core' })).toBe('no-tab');
  });

  it('changes what the meter reads: heater beside its winding, then alone', () => {
    const hands = opened(handsOn(setupWith()));
    hands.does('SetMeter', { setting: 'ohms-200' });
    const together = reads(hands, 'ohms-200', 'V1.1', 'V1.2');
    hands.does('LiftLead', { end: 'W25/b' });
    const alone = reads(hands, 'ohms-200', 'V1.1', 'V1.2');
    const heater = hands.setup.oven.values['V1']?.['heater'] ?? 0;
    // 0.16 Ohm of test leads is in both; the winding's 8 mOhm hides the heater.
    expect(together.value).toBeLessThan(0.16 + 0.08 + 0.2);
    expect(Math.abs((alone.value ?? 0) - (heater + 0.16))).toBeLessThan(0.2);
    expect(alone.value ?? 0).toBeGreaterThanOrEqual(together.value ?? 0);
  });
});

describe('the job sheet', () => {
  it('refuses to be handed in empty, and nothing happens after it is in', () => {
    const hands = handsOn(setupWith());
    expect(hands.isRefused('HandIn', {})).toBe('empty-sheet');
    hands.does('GiveVerdict', { part: 'D1', verdict: 'good' });
    hands.does('HandIn', {});
    expect(hands.isRefused('PullCord', {})).toBe('handed-in');
  });

  it('captures what the display shows, with what was lifted then', () => {
    const hands = opened(handsOn(setupWith()));
    hands.does('LiftLead', { end: 'W8/b' });
    reads(hands, 'ohms-2k', 'T2.1', 'T2.2');
    hands.does('CaptureReading', {}, 1);
    const [captured] = hands.state().sheet.readings;
    expect(captured?.lifted).toEqual(['W8/b']);
    // 400 Ohm ± its tolerance, shown in kOhm: common practice, no source.
    expect(captured?.value).toBeGreaterThan(340);
    expect(captured?.value).toBeLessThan(460);
  });
});
