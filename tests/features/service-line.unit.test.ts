import { describe, expect, it } from 'vitest';
import type { ShownReading } from '../../shared/bench/record.ts';
import type { ServiceMeasurement } from '../../shared/oven/oven.ts';
import {
  isWithin,
  limitsText,
  placeOnBar,
  serviceLineOf,
} from '../../src/features/debrief/service-line.ts';

const reading = (more: Partial<ShownReading>): ShownReading => ({
  red: 'C1.1',
  black: 'C1.2',
  setting: 'ohms-20M',
  display: '10.02',
  unit: 'MΩ',
  value: 10.02e6,
  isSettled: true,
  isBeeping: false,
  isRelative: false,
  ...more,
});

const line = (more: Partial<ServiceMeasurement>): ServiceMeasurement => ({
  id: 'bleeder',
  part: 'C1',
  label: 'Bleeder',
  between: ['C1.1', 'C1.2'],
  lift: [],
  setting: 'ohms-20M',
  low: 9,
  high: 11,
  expect: 'range',
  unit: 'MΩ',
  ...more,
});

const bleeder = line({});
const terminals = line({ id: 'terminals', setting: 'ohms-200', expect: 'open', unit: 'Ω' });
const forward = line({ id: 'forward', between: ['D1.a', 'D1.k'], setting: 'ohms-2000M' });
const reverse = line({ id: 'reverse', between: ['D1.k', 'D1.a'], setting: 'ohms-2000M' });

describe('serviceLineOf', () => {
  it('takes the line of the same range where the pair has several', () => {
    expect(serviceLineOf(reading({}), [terminals, bleeder])).toBe(bleeder);
    expect(serviceLineOf(reading({ setting: 'ohms-200' }), [terminals, bleeder])).toBe(terminals);
  });

  it('takes the line of the same polarity where the pair has both', () => {
    const back = reading({ red: 'D1.k', black: 'D1.a', setting: 'ohms-2000M' });
    expect(serviceLineOf(back, [forward, reverse])).toBe(reverse);
  });

  it('takes probes the other way round where polarity does not matter', () => {
    expect(serviceLineOf(reading({ red: 'C1.2', black: 'C1.1' }), [bleeder])).toBe(bleeder);
  });

  it('takes the only line of the pair on another range of the same function', () => {
    expect(serviceLineOf(reading({ setting: 'ohms-2000M' }), [bleeder])).toBe(bleeder);
  });

  it('takes none when two lines would do, and none of another function or pair', () => {
    expect(serviceLineOf(reading({ setting: 'ohms-2k' }), [terminals, bleeder])).toBeUndefined();
    expect(serviceLineOf(reading({ setting: 'dc-20' }), [bleeder])).toBeUndefined();
    expect(serviceLineOf(reading({ black: 'C1.can' }), [bleeder])).toBeUndefined();
  });

  it('takes none for an over-range on another range', () => {
    const over = reading({ setting: 'ohms-200', display: 'OL', value: null });
    expect(serviceLineOf(over, [bleeder])).toBeUndefined();
  });
});

describe('isWithin', () => {
  it('compares in the unit of the line', () => {
    expect(isWithin(reading({}), bleeder)).toBe(true);
    expect(isWithin(reading({ value: 8.99e6 }), bleeder)).toBe(false);
    expect(isWithin(reading({ value: null }), bleeder)).toBe(false);
    expect(isWithin(reading({ value: 0.4 }), line({ low: undefined, high: 0.5, unit: 'Ω' }))).toBe(
      true,
    );
  });

  it('takes an over-range for open and a beep for continuity', () => {
    expect(isWithin(reading({ value: null }), terminals)).toBe(true);
    expect(isWithin(reading({ value: 12 }), terminals)).toBe(false);
    const beep = line({ expect: 'beep', setting: 'beep' });
    expect(isWithin(reading({ setting: 'beep', isBeeping: true }), beep)).toBe(true);
    expect(isWithin(reading({ setting: 'beep' }), beep)).toBe(false);
  });
});

describe('limitsText', () => {
  it.each([
    [bleeder, '9 to 11 MΩ'],
    [line({ low: undefined }), 'up to 11 MΩ'],
    [line({ high: undefined }), 'from 9 MΩ'],
    [terminals, 'open'],
    [line({ expect: 'beep' }), 'beep'],
  ])('says %#', (one, text) => {
    expect(limitsText(one)).toBe(text);
  });
});

describe('placeOnBar', () => {
  it('puts the limits at 0.3 and 0.7 and holds the ends', () => {
    expect(placeOnBar(reading({ value: 9e6 }), bleeder)).toBeCloseTo(0.3);
    expect(placeOnBar(reading({ value: 10e6 }), bleeder)).toBeCloseTo(0.5);
    expect(placeOnBar(reading({ value: 11e6 }), bleeder)).toBeCloseTo(0.7);
    expect(placeOnBar(reading({ value: 0 }), bleeder)).toBe(0.03);
    expect(placeOnBar(reading({ value: 99e6 }), bleeder)).toBe(0.97);
  });

  it('has no place without two limits or without a value', () => {
    expect(placeOnBar(reading({}), line({ low: undefined }))).toBeNull();
    expect(placeOnBar(reading({ value: null }), bleeder)).toBeNull();
  });
});
