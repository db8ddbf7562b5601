import { describe, expect, it } from 'vitest';
import { neighbour } from '../../../src/bench/mirror/neighbour.ts';
import {
  findTyped,
  nothingTyped,
  typeKey,
  type TypeAhead,
} from '../../../src/bench/mirror/type-ahead.ts';

const place = (ref: string, x: number, y: number) => ({ ref, at: [x, y] as const });

describe('the neighbour by arrow key', () => {
  const a = place('a', 0, 0);
  const right = place('right', 50, 0);
  const far = place('far', 200, 0);
  const aslant = place('aslant', 40, 35);
  const below = place('below', 0, 60);
  const places = [a, far, right, aslant, below];

  it('is what lies straight ahead before what lies aside', () => {
    expect(neighbour(a, places, 'right')?.ref).toBe('right');
    expect(neighbour(a, places, 'down')?.ref).toBe('below');
    expect(neighbour(right, places, 'right')?.ref).toBe('far');
  });

  it('is nothing where nothing lies', () => {
    expect(neighbour(a, places, 'left')).toBeNull();
    expect(neighbour(a, places, 'up')).toBeNull();
    expect(neighbour(a, [a], 'right')).toBeNull();
  });
});

describe('typing a name', () => {
  const things = [
    { ref: 'C1.1', name: 'C1.1, High-voltage capacitor, transformer side' },
    { ref: 'T1.HV', name: 'T1.HV, High-voltage transformer, high-voltage winding' },
    { ref: 'T1.core', name: 'T1.core, High-voltage transformer, core' },
    { ref: 'CH.2', name: 'CH.2, Chassis, bare screw by the capacitor' },
  ];
  const type = (keys: string, every = 100): TypeAhead | null =>
    [...keys].reduce<TypeAhead | null>(
      (typed, key, i) => typed && typeKey(typed, key, i * every),
      nothingTyped,
    );
  const found = (keys: string) => {
    const typed = type(keys);
    return typed && findTyped(typed, things)?.ref;
  };

  it('goes to what is called so, letter by letter', () => {
    expect(found('t')).toBe('T1.HV');
    expect(found('T1.c')).toBe('T1.core');
    expect(found('/c1')).toBe('C1.1');
    expect(found('/CH')).toBe('CH.2');
    expect(found('/bare')).toBe('CH.2');
  });

  it('leaves the letters of the shortcuts alone unless a name has begun', () => {
    for (const key of ['r', 'b', 'c', 'd', 'u', '?', 'C'])
      expect(typeKey(nothingTyped, key, 0)).toBeNull();
    expect(typeKey({ typed: 't1.', at: 0 }, 'c', 100)?.typed).toBe('t1.c');
  });

  it('begins anew after a pause, and takes a letter back', () => {
    expect(typeKey({ typed: 't1', at: 0 }, 'v', 2000)?.typed).toBe('v');
    expect(typeKey({ typed: 't1', at: 0 }, 'Backspace', 100)?.typed).toBe('t');
  });

  it('leaves keys alone that are no part of a name', () => {
    for (const key of ['Enter', 'Tab', 'Escape', ' ', '1'])
      expect(typeKey(nothingTyped, key, 0)).toBeNull();
  });
});
