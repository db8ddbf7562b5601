import { describe, expect, it } from 'vitest';
import { selectSteps } from '../../server/bin/lib/test-steps.mjs';

const namesOf = (...asked: string[]): string[] => {
  const selection = selectSteps(asked);
  return selection.ok ? selection.steps.map(({ name }) => name) : [selection.fault];
};
const all = ['types', 'lint', 'walls', 'format', 'unit', 'client', 'db', 'build', 'e2e'];

describe('the steps of npm test', () => {
  it('are all when none is named', () => {
    expect(namesOf()).toEqual(all);
  });

  it('are those named, in the order in which they run', () => {
    expect(namesOf('db', 'unit', 'unit')).toEqual(['unit', 'db']);
  });

  it('build before the end-to-end tests', () => {
    expect(namesOf('e2e')).toEqual(['build', 'e2e']);
  });

  it('are listed when one is not known', () => {
    expect(namesOf('unit', 'units')).toEqual([
      `No step is called units; there are ${all.join(', ')}.`,
    ]);
  });
});
