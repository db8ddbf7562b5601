import type { BenchBox } from './bench-box.ts';
import type { BenchPoint } from './bench-point.ts';

// What stands on the bench whatever the oven is. Layouts keep clear of it.

/** The whole bench, units. */
export const benchSize: BenchPoint = [1000, 760];

/** The outlet on the bench's edge that the cord goes into. */
export const outlet: BenchBox = { at: [18, 66], size: [104, 84] };

/** The 12.6 V battery and, above it, its 1 kOhm resistor. */
export const battery: BenchBox = { at: [18, 478], size: [104, 128] };

/** The battery's poles and the free end of its 1 kOhm, all touchable. */
export const batteryTargets: Readonly<Record<string, BenchPoint>> = {
  'BAT.pos': [44, 500],
  'BAT.neg': [96, 500],
  'BAT.1k': [96, 444],
};

/** Where tools lie while nobody uses them. */
export const rest = {
  probe: { red: [772, 714], black: [772, 738] },
  discharge: { clip: [838, 714], tip: [976, 736] },
  battery: { neg: [44, 660], oneK: [100, 660] },
} as const satisfies Record<string, Record<string, BenchPoint>>;

/** Where the test leads leave towards the meter, on the bench's lower edge. */
export const meterJacks: Readonly<Record<'red' | 'black', BenchPoint>> = {
  red: [528, 772],
  black: [504, 772],
};
