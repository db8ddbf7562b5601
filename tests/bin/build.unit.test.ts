import { describe, expect, it } from 'vitest';
import { digestOf } from '../../server/bin/lib/build.mjs';

const files = (...pairs: [string, string][]): [string, Uint8Array][] =>
  pairs.map(([name, text]) => [name, new TextEncoder().encode(text)]);

describe('the digest of the sources', () => {
  const digest = digestOf(files(['a.ts', 'one'], ['b.ts', 'two']));

  it('is that of "name NUL length NUL content", file after file', () => {
    // printf 'a.ts\0003\000oneb.ts\0003\000two' | sha256sum
    expect(digest).toBe('662fd7cd2e2e8aa33a1825f807b5acd9b8fa58424aac37d377c7a7f7f5e9ed27');
  });

  it('stays while nothing changes', () => {
    expect(digestOf(files(['a.ts', 'one'], ['b.ts', 'two']))).toBe(digest);
  });

  it.each([
    ['a content', files(['a.ts', 'one'], ['b.ts', 'twi'])],
    ['a name', files(['a.ts', 'one'], ['c.ts', 'two'])],
    ['a file less', files(['a.ts', 'one'])],
    ['text that moved to the next file', files(['a.ts', 'on'], ['b.ts', 'etwo'])],
  ])('changes with %s', (_, changed) => {
    expect(digestOf(changed)).not.toBe(digest);
  });
});
