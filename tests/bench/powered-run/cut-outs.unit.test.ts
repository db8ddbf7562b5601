import { describe, expect, it } from 'vitest';
import {
  cutOutsOf,
  openNow,
  temperaturesAround,
} from '../../../shared/bench/powered-run/cut-outs.ts';
import { nominalOven } from '../../../shared/oven/draw.ts';
import { lc28 } from '../../support/bench.ts';

const oven = nominalOven(lc28);
const at = (magnetron: number, waterRise = 0) => temperaturesAround(magnetron, waterRise);

// FACTS 8 (SM-5, SM-4): 138 °C open, 82 °C closed; cavity 104 °C, one-shot.
describe('cut-outs of the LC-28', () => {
  const sound = cutOutsOf(oven, []);

  it('opens the one on the magnetron above 138 °C and closes it below 82 °C', () => {
    expect(openNow(sound, [], at(137))).toEqual([]);
    expect(openNow(sound, [], at(139))).toEqual(['F2']);
    expect(openNow(sound, ['F2'], at(83))).toEqual(['F2']);
    expect(openNow(sound, ['F2'], at(81))).toEqual([]);
  });

  it('never closes the one-shot on the cavity again', () => {
    expect(openNow(sound, [], at(98, 70))).toEqual([]);
    expect(openNow(sound, [], at(98, 90))).toEqual(['F3']);
    expect(openNow(sound, ['F3'], at(22))).toEqual(['F3']);
  });

  it('opens a weak one early and closes it as much earlier: 75 °C and 75 x 82 / 138 = 44.6 °C', () => {
    const weak = cutOutsOf(oven, [{ on: 'F2', fault: 'weak' }]);
    expect(openNow(weak, [], at(76))).toEqual(['F2']);
    expect(openNow(weak, ['F2'], at(45))).toEqual(['F2']);
    expect(openNow(weak, ['F2'], at(44))).toEqual([]);
  });

  it('moves a welded one for no heat', () => {
    expect(openNow(cutOutsOf(oven, [{ on: 'F2', fault: 'welded' }]), [], at(200))).toEqual([]);
  });
});
