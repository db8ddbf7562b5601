import { describe, expect, it } from 'vitest';
import type { BenchState } from '../../../shared/bench/bench-state.ts';
import type { WireEvent } from '../../../shared/bench/event.ts';
import { untouched } from '../../../shared/bench/fold.ts';
import type { CapturedReading } from '../../../shared/bench/record.ts';
import { causeText, faultChoices } from '../../../src/bench/panels/cause-choices.ts';
import { chipsFor } from '../../../src/bench/panels/chips.ts';
import { lookAtPart } from '../../../src/bench/panels/look-at-part.ts';
import { openPoints } from '../../../src/bench/panels/open-points.ts';
import { partOfReading, partOfTarget } from '../../../src/bench/panels/part-of-target.ts';
import { provedDead } from '../../../src/bench/panels/proved-dead.ts';
import { readingsByPart } from '../../../src/bench/panels/readings-by-part.ts';
import { choicesFor } from '../../../src/bench/panels/selection-choices.ts';
import { setupWith } from '../../support/bench.ts';
import { oven } from '../../support/client-fixtures.ts';

const fresh = untouched(setupWith());
const open: BenchState = { ...fresh, isCordIn: false, isCoverOn: false };
const withLifted = (...ends: string[]): BenchState => ({
  ...open,
  oven: {
    ...open.oven,
    leadEnds: { ...open.oven.leadEnds, ...Object.fromEntries(ends.map((end) => [end, null])) },
  },
});

const event = (type: string, data: Record<string, unknown> = {}, benchMs = 131_000): WireEvent => ({
  type,
  version: 1,
  data,
  benchMs,
});

const reading = (red: string, black: string, setting: string, value: number | null) => ({
  red,
  black,
  setting,
  display: value === null ? 'OL' : String(value),
  unit: 'V',
  value,
  isSettled: true,
  isBeeping: false,
  isRelative: false,
});

describe('proved dead', () => {
  const proof = event('ReadingTaken', reading('C1.1', 'C1.2', 'dc-200', 0));

  it('is a DC reading near 0 V across the capacitor that the trainee took', () => {
    expect(provedDead(oven, [proof])).toEqual([
      { part: 'C1', name: 'High-voltage capacitor', atMs: 131_000 },
    ]);
  });

  it.each([
    ['ohms', reading('C1.1', 'C1.2', 'ohms-200', 0)],
    ['AC', reading('C1.1', 'C1.2', 'ac-200', 0)],
    ['one terminal twice', reading('C1.1', 'C1.1', 'dc-200', 0)],
    ['another part', reading('T1.1', 'T1.2', 'dc-200', 0)],
    ['a voltage', reading('C1.1', 'C1.2', 'dc-200', 38)],
    ['over range', reading('C1.1', 'C1.2', 'dc-2', null)],
    ['zeroed by REL', { ...reading('C1.1', 'C1.2', 'dc-200', 0), isRelative: true }],
  ])('is not %s', (_what, data) => {
    expect(provedDead(oven, [event('ReadingTaken', data)])).toEqual([]);
  });

  it('is void after a run', () => {
    expect(provedDead(oven, [proof, event('OvenRun')])).toEqual([]);
    expect(provedDead(oven, [event('OvenRun'), proof])).toHaveLength(1);
  });
});

describe('chips', () => {
  const texts = (state: BenchState, events: WireEvent[] = []) =>
    chipsFor(oven, state, events).map(({ text, tone }) => `${text} ${tone}`);

  it('say what can be seen', () => {
    expect(texts({ ...fresh, isDisplayLit: true })).toEqual([
      'cord in caution',
      'cover on plain',
      'display lit plain',
    ]);
    expect(texts(open)).toEqual(['cord out safe', 'cover off caution']);
    const ajar = { ...open, oven: { ...open.oven, isDoorClosed: false } };
    expect(texts(ajar)).toContain('door open plain');
  });

  it('count lifted leads and labels, and name what is proved and pressed', () => {
    const state: BenchState = {
      ...withLifted('W23/a', 'W24/a'),
      labels: { 'W23/a': 'T1.HV', 'W1/a': 'x' },
    };
    const held = { ...state, oven: { ...state.oven, pressed: ['S1', 'S2'] } };
    const proof = event('ReadingTaken', reading('C1.2', 'C1.1', 'dc-20', 0));
    expect(texts(held, [proof])).toEqual([
      'cord out safe',
      'cover off caution',
      'C1 proved 0 V at 02:11 safe',
      '2 leads lifted, 1 labelled caution',
      'S1, S2 held by hand plain',
    ]);
  });
});

describe('before handing in', () => {
  const openOf = (state: BenchState, events: WireEvent[] = []) =>
    openPoints(oven, state, events)
      .filter(({ isDone }) => !isDone)
      .map(({ open: what }) => what);

  it('names what is still open', () => {
    const state: BenchState = {
      ...withLifted('W23/a'),
      probes: { red: 'T1.1', black: null },
      sheet: { ...open.sheet, verdicts: { D1: 'faulty', C1: 'good' } },
    };
    expect(openOf(state)).toEqual([
      'No cause is stated.',
      'Judged faulty and still in the oven: D1.',
      'Still lifted: W23/a.',
      'Still connected: red probe.',
      'The cover is off.',
      'The oven was not run after the last repair.',
      'The report does not say both what was done and what the customer is told.',
    ]);
  });

  it('is empty after a whole repair, and not when something was changed after the run', () => {
    const state: BenchState = {
      ...fresh,
      replaced: ['D1'],
      sheet: {
        ...fresh.sheet,
        verdicts: { D1: 'faulty' },
        causes: [{ on: 'D1', fault: 'shorted' }],
        report: { repair: 'New diode.', customer: 'It heats again.' },
      },
    };
    const repair = [event('PartReplaced'), event('CoverFitted'), event('OvenRun')];
    expect(openOf(state, repair)).toEqual([]);
    expect(openOf(state, [...repair, event('CoverRemoved')])).toEqual([
      'The oven was not run after the last repair.',
    ]);
  });
});

describe('the part a reading speaks of', () => {
  it('is the part of the terminals, not the chassis beside it', () => {
    expect(partOfReading(open.oven, 'CH.1', 'P1.E')).toBe('P1');
    expect(partOfReading(open.oven, 'T1.HV', 'T1.core')).toBe('T1');
    expect(partOfReading(open.oven, 'CH.1', 'CH.2')).toBe('CH');
  });

  it('through a lifted end is the part at the other end of the lead', () => {
    const { oven: state } = withLifted('W23/b');
    expect(partOfTarget(state, 'W23/b')).toBe('T1');
    expect(partOfTarget(withLifted('W23/a', 'W23/b').oven, 'W23/b')).toBeNull();
    expect(partOfTarget(state, 'BAT.pos')).toBeNull();
  });

  it('stays the same when the lead is refitted afterwards', () => {
    const captured: CapturedReading = {
      ...reading('W23/b', 'CH.1', 'ohms-200', 94.8),
      benchMs: 1,
      lifted: ['W23/b'],
    };
    const state = { ...open, sheet: { ...open.sheet, readings: [captured] } };
    expect([...readingsByPart(state).keys()]).toEqual(['T1']);
  });
});

describe('what can be done', () => {
  const labels = (state: BenchState, selection: Parameters<typeof choicesFor>[2]) =>
    choicesFor(oven, state, selection)?.groups.flatMap(({ choices }) =>
      choices.map(({ label }) => label),
    ) ?? [];

  it('with a terminal: tools on it, each lead on it lifted or labelled', () => {
    const found = labels(open, { kind: 'target', ref: 'C1.2' });
    expect(found).toEqual(
      expect.arrayContaining([
        'Red probe here',
        'Black probe here',
        'Discharge clip here',
        'Discharge tip here',
        'Battery − here',
        'Lift W24/a, capacitor to magnetron',
        'Label W24/a',
        'Lift W27/a, capacitor to diode',
        'Part C1',
      ]),
    );
    expect(found).not.toContain('Clean a spot with the pad');
  });

  it('with varnish: clean a spot, until it is clean', () => {
    const spot = { kind: 'target', ref: 'T1.core' } as const;
    expect(labels(open, spot)).toContain('Clean a spot with the pad');
    const clean = { ...open, oven: { ...open.oven, cleaned: ['T1.core'] } };
    expect(labels(clean, spot)).not.toContain('Clean a spot with the pad');
  });

  it('with a probe on it: take it off', () => {
    const state = { ...open, probes: { red: 'T1.1', black: null } };
    expect(labels(state, { kind: 'target', ref: 'T1.1' })).toContain('Red probe off');
  });

  it('with a lifted end: refit, take elsewhere, label; gone once it is refitted', () => {
    const end = { kind: 'target', ref: 'W23/a' } as const;
    expect(labels(withLifted('W23/a'), end)).toEqual(
      expect.arrayContaining(['Refit on T1.HV', 'Take it to another terminal', 'Label W23/a']),
    );
    expect(choicesFor(oven, open, end)).toBeNull();
  });

  it('with a terminal while ends are lifted: fit any of them, its own first', () => {
    const state = { ...withLifted('W24/a', 'W23/a'), labels: { 'W23/a': '1 HV' } };
    const fits = labels(state, { kind: 'target', ref: 'T1.HV' }).filter((one) =>
      one.startsWith('Fit'),
    );
    expect(fits).toEqual(['Fit W23/a here, labelled 1 HV', 'Fit W24/a here']);
  });

  it('with a switch: hold its actuator, let it go', () => {
    const part = { kind: 'part', ref: 'S1' } as const;
    expect(labels(open, part)).toContain('Hold the actuator pressed');
    const held = { ...open, oven: { ...open.oven, pressed: ['S1'] } };
    expect(labels(held, part)).toContain('Let the actuator go');
  });

  it('with a lead: both its ends, and the lead itself', () => {
    expect(labels(withLifted('W23/a'), { kind: 'lead', ref: 'W23' })).toEqual([
      'Refit on T1.HV',
      'Take it to another terminal',
      'Label W23/a',
      'Lift W23/b off C1.1',
      'Label W23/b',
      'Give it new connectors',
    ]);
  });
});

describe('a look from close', () => {
  const seen = (faults: { on: string; fault: string }[], part: string) =>
    lookAtPart(oven, untouched(setupWith(faults)), part);

  it('shows what can be seen of a fault, on the part and on connectors that belong there', () => {
    expect(seen([{ on: 'C1', fault: 'shorted' }], 'C1')).toEqual([
      'The can is swollen at its broad side.',
    ]);
    expect(seen([{ on: 'W23', fault: 'burnt-connector-b' }], 'C1')[0]).toMatch(/^W23\/b: .*brown/);
    expect(seen([{ on: 'W23', fault: 'burnt-connector-b' }], 'T1')).toEqual([]);
  });

  it('shows nothing of what cannot be seen', () => {
    expect(seen([{ on: 'C1', fault: 'bleeder-open' }], 'C1')).toEqual([]);
  });
});

describe('causes', () => {
  it('are the faults that the kind of the part, or a lead, can have', () => {
    expect(faultChoices(oven, 'D1').map(({ id }) => id)).toContain('shorted');
    expect(faultChoices(oven, 'W12').map(({ id }) => id)).toContain('open-inside');
    expect(faultChoices(oven, 'X9')).toEqual([]);
    expect(causeText(oven, { on: 'D1', fault: 'shorted' })).toBe('D1 High-voltage diode: shorted');
  });
});
