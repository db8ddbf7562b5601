import { describe, expect, it } from 'vitest';
import { nextPath } from '../../src/features/account/next-path.ts';

describe('nextPath', () => {
  it('takes a path of ours', () => {
    expect(nextPath('/jobs?level=2', '/x')).toBe('/jobs?level=2');
  });

  it.each([
    null,
    '',
    'jobs',
    '//elsewhere.example',
    '/\\elsewhere.example',
    'https://elsewhere.example',
  ])('falls back for %j', (then) => {
    expect(nextPath(then, '/usual')).toBe('/usual');
  });
});
