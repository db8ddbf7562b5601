import { describe, expect, it } from 'vitest';
import { hazardKind } from '../../../shared/bench/record.ts';
import type { RunOutcome } from '../../../shared/bench/record.ts';
import { expectedText } from '../../../src/bench/panels/expected-text.ts';
import { figure, hazardWords } from '../../../src/bench/panels/hazard-words.ts';
import { logLine } from '../../../src/bench/panels/log-line.ts';
import { placeBeside } from '../../../src/bench/panels/place-beside.ts';
import { runWords } from '../../../shared/bench/run-words.ts';
import { saveText } from '../../../src/bench/panels/save-text.ts';
import { manual2000 } from '../../../shared/instruments/manual-2000.ts';
import { oven } from '../../support/client-fixtures.ts';

describe('figures', () => {
  it.each([
    [2140, 'V', '2.14 kV'],
    [311.4, 'V', '311 V'],
    [0.0000451, 'C', '45.1 µC'],
    [2.176, 'J', '2.18 J'],
    [0.31, 'J', '310 mJ'],
    [0, 'J', '0 J'],
    [1e-12, 'C', '0.001 nC'],
  ])('%f %s reads %s', (value, unit, text) => {
    expect(figure(value, unit)).toBe(text);
  });
});

describe('hazards in words', () => {
  const data = { at: 'C1.2', to: 'CH.2', volts: -2140, charge: 2.03e-3, energy: 2.18 };

  it.each(hazardKind.options)(
    '%s says what happened, to whom, to the meter, and what comes first',
    (kind) => {
      const words = hazardWords({ kind, ...data });
      for (const text of Object.values(words)) expect(text.trim()).not.toBe('');
      expect(Object.values(words).join(' ')).not.toMatch(/!|undefined|NaN/);
    },
  );

  it('names place, voltage and energy of a shock', () => {
    const { title, happened, person } = hazardWords({ kind: 'shock', ...data });
    expect(title).toBe('Shock from C1.2');
    expect(happened).toBe(
      'Your hand met C1.2 while it stood 2.14 kV above chassis. 2.03 mC flowed, 2.18 J in all.',
    );
    expect(person).toMatch(/stop a heart/);
    expect(hazardWords({ kind: 'shock', ...data, energy: 0.002 }).person).toMatch(/sting/);
  });

  it('tells mains that lies open from mains that was touched', () => {
    const open = {
      kind: 'mains-exposed' as const,
      at: null,
      to: null,
      volts: 0,
      charge: 0,
      energy: 0,
    };
    expect(hazardWords(open).title).toBe('Mains within reach');
    expect(hazardWords({ ...open, at: 'F1.1', volts: 120 }).title).toBe('Mains on F1.1');
  });
});

describe('the state of the record', () => {
  it('is said as it is', () => {
    const at = new Date(2026, 0, 5, 14, 8).getTime();
    expect(saveText({ kind: 'saved', at })).toBe('saved at 14:08');
    expect(saveText({ kind: 'saving', steps: 3 })).toBe('saving');
    expect(saveText({ kind: 'waiting', steps: 12, why: '', isKept: true })).toBe(
      'not saved: 12 steps kept on this device',
    );
    expect(saveText({ kind: 'waiting', steps: 1, why: '', isKept: false })).toBe(
      'not saved: 1 step kept in this tab only',
    );
    expect(saveText({ kind: 'refused', steps: 2, why: '' })).toBe(
      'not saved: 2 steps refused, kept on this device',
    );
  });
});

const run: RunOutcome = {
  ordered: 60,
  seconds: 2.34,
  isDisplayLit: true,
  isLampLit: true,
  isFanTurning: true,
  isTurntableTurning: false,
  hum: 'loud',
  current: 30,
  microwavePower: 0,
  waterRise: 0.02,
  opened: ['F1'],
  charge: {},
};

describe('a run', () => {
  it('tells what is seen, heard and felt, never what the circuit alone knows', () => {
    const words = runWords(run).map(({ label, value }) => `${label}: ${value}`);
    expect(words).toContain('Sound: a loud hum');
    expect(words).toContain('Turntable: still');
    expect(words).toContain('Water: stayed cold');
    expect(words.join(' ')).not.toMatch(/F1|30/);
  });

  it('gives no fuse away in the log either', () => {
    const event = { type: 'OvenRun', version: 1 as const, benchMs: 0, data: { ...run } };
    expect(logLine(manual2000, event)).toBe(
      'run: display lit, lamp lit, a loud hum, water cold, over after 2.3 s',
    );
  });
});

describe('a run of an oven with a timer', () => {
  const { isDisplayLit: _, ...others } = run;
  const timed: RunOutcome = {
    ...others,
    seconds: 60,
    isTimerRunning: true,
    hum: 'quiet',
    atFirst: { hum: 'loud', seconds: 1.33 },
  };

  it('tells of the knob and not of a display, and what it sounded like before', () => {
    const words = runWords(timed).map(({ label, value }) => `${label}: ${value}`);
    expect(words).toContain('Timer: ticking, knob coming down');
    expect(words).toContain('Sound: a loud hum for 1.3 s, then a quiet hum');
    expect(words.join(' ')).not.toContain('Display');
  });

  it('says in the log that the knob stays when the gear does not turn it', () => {
    const event = {
      type: 'OvenRun',
      version: 1 as const,
      benchMs: 0,
      data: { ...timed, isTimerRunning: false },
    };
    expect(logLine(manual2000, event)).toContain('timer knob stays where it is');
  });

  it('tells of a bang when a door opens on a welded switch, never of the fuse', () => {
    const event = {
      type: 'DoorOpened',
      version: 1 as const,
      benchMs: 0,
      data: { opened: ['F1'] },
    };
    expect(logLine(manual2000, event)).toBe('door open, a bang inside');
  });
});

describe('the log', () => {
  it('calls a setting by its name', () => {
    const event = {
      type: 'MeterSet',
      version: 1 as const,
      benchMs: 0,
      data: { setting: 'dc-200m' },
    };
    expect(logLine(manual2000, event)).toBe('meter to 200 mV DC');
  });
});

describe('service data', () => {
  const line = (id: string) => {
    const found = oven.serviceData.find((one) => one.id === id);
    if (!found) throw new Error(`no ${id}`);
    return expectedText(found);
  };
  it('prints ranges in their units, one-sided limits, open and beeps', () => {
    expect(line('fuse')).toBe('beeps');
    expect(line('hv-relay-contact')).toBe('open');
    expect(line('lamp')).toBe('40 – 58 Ω');
    expect(line('earth')).toBe('< 0.5 Ω');
  });
});

describe('a panel beside its subject', () => {
  const view = { width: 836, height: 600 };
  it.each([
    [20, 20],
    [816, 20],
    [20, 580],
    [816, 580],
    [418, 300],
  ] as const)('covers neither %i, %i nor the edge of the view', (x, y) => {
    const style = placeBeside([x, y], view, 300);
    const left = Number(style.left);
    expect(left).toBeGreaterThanOrEqual(8);
    expect(left + 300).toBeLessThanOrEqual(view.width - 8);
    expect(x < left || x > left + 300).toBe(true);
  });

  it('goes below or above where the view is too narrow to go aside', () => {
    const style = placeBeside([190, 100], { width: 380, height: 600 }, 300);
    expect(Number(style.top)).toBeGreaterThan(100);
  });
});
