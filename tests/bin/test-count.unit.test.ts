import { describe, expect, it } from 'vitest';
import { addCounts, countTests, summaryLine } from '../../server/bin/lib/test-count.mjs';

const report = {
  numPassedTests: 5,
  numFailedTests: 0,
  numPendingTests: 0,
  numTodoTests: 0,
  testResults: [{ name: 'a.unit.test.ts', status: 'passed', assertionResults: [] }],
};

describe('counting the tests of one project', () => {
  it('counts what passed', () => {
    expect(countTests('unit', report, 0)).toEqual({ passed: 5, failed: 0, notes: [] });
  });

  it('counts what failed, once', () => {
    const file = {
      name: 'b.unit.test.ts',
      status: 'failed',
      assertionResults: [{ status: 'passed' }, { status: 'failed' }, { status: 'failed' }],
    };
    const failing = { ...report, numFailedTests: 2, testResults: [file] };
    expect(countTests('unit', failing, 1)).toEqual({ passed: 5, failed: 2, notes: [] });
  });

  it('counts a file that could not be read as one failure and names it', () => {
    const file = { name: 'b.unit.test.ts', status: 'failed', assertionResults: [] };
    const count = countTests('unit', { ...report, testResults: [file] }, 1);
    expect(count).toEqual({
      passed: 5,
      failed: 1,
      notes: ['unit: b.unit.test.ts could not be run'],
    });
  });

  it('counts skipped and postponed tests as failures', () => {
    const count = countTests('unit', { ...report, numPendingTests: 2, numTodoTests: 1 }, 0);
    expect(count).toMatchObject({ passed: 5, failed: 3 });
  });

  it('counts a project without tests as a failure', () => {
    const empty = { ...report, numPassedTests: 0, testResults: [] };
    expect(countTests('client', empty, 0)).toEqual({
      passed: 0,
      failed: 1,
      notes: ['client: no test ran'],
    });
  });

  it('counts an error outside every test as a failure', () => {
    expect(countTests('unit', report, 1)).toMatchObject({ passed: 5, failed: 1 });
  });

  it('counts a missing report as a failure', () => {
    expect(countTests('db', null, 0)).toMatchObject({ passed: 0, failed: 1 });
  });
});

describe('the summary', () => {
  it('adds the steps up', () => {
    const total = addCounts([
      { passed: 1, failed: 0, notes: [] },
      { passed: 40, failed: 2, notes: ['unit: one'] },
      { passed: 0, failed: 1, notes: ['db: two'] },
    ]);
    expect(total).toEqual({ passed: 41, failed: 3, notes: ['unit: one', 'db: two'] });
  });

  it('is one line', () => {
    expect(summaryLine({ passed: 41, failed: 0 })).toBe('41 passed, 0 failed');
  });
});
