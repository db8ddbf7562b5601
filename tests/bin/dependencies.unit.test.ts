import { describe, expect, it } from 'vitest';
import { firstDifference } from '../../server/bin/lib/dependencies.mjs';

const lock = {
  packages: {
    '': { version: '0.1.0' },
    'node_modules/konva': { version: '10.9.1', integrity: 'sha512-a' },
    'node_modules/fsevents': { version: '2.3.3', integrity: 'sha512-b', optional: true },
  },
};
const konva = { 'node_modules/konva': { version: '10.9.1', integrity: 'sha512-a' } };

describe('what is installed against the lock', () => {
  it('agrees when an optional package was left out', () => {
    expect(firstDifference(lock, { packages: konva })).toBeNull();
  });

  it('agrees with all of them', () => {
    const { '': _, ...all } = lock.packages;
    expect(firstDifference(lock, { packages: all })).toBeNull();
  });

  it('names a package that is missing', () => {
    expect(firstDifference(lock, { packages: {} })).toBe('node_modules/konva');
  });

  it('names a package of another version', () => {
    const older = { 'node_modules/konva': { version: '10.9.0', integrity: 'sha512-a' } };
    expect(firstDifference(lock, { packages: older })).toBe('node_modules/konva');
  });

  it('names a package of other content', () => {
    const other = { 'node_modules/konva': { version: '10.9.1', integrity: 'sha512-z' } };
    expect(firstDifference(lock, { packages: other })).toBe('node_modules/konva');
  });

  it('names an optional package of another version', () => {
    const packages = { ...konva, 'node_modules/fsevents': { version: '1.0.0' } };
    expect(firstDifference(lock, { packages })).toBe('node_modules/fsevents');
  });

  it('names a package that the lock no longer has', () => {
    const packages = { ...konva, 'node_modules/left': { version: '1.0.0' } };
    expect(firstDifference(lock, { packages })).toBe('node_modules/left');
  });
});
