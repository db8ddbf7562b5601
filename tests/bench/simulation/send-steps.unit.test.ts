import { describe, expect, it } from 'vitest';
import { problemCode } from '../../../shared/contracts/problem.ts';
import { Problem, type ClientProblemCode } from '../../../src/api/problem.ts';
import { sentFrom } from '../../../src/simulation/send-steps.ts';

const problem = (code: ClientProblemCode, status: number, more: object = {}) =>
  new Problem({ code, status, message: 'why', ...more });

describe('what an answer means for the steps', () => {
  it('names the step that the record expects', () => {
    expect(sentFrom(problem('sequence-gap', 409, { expected: 12 }))).toEqual({
      kind: 'gap',
      expected: 12,
    });
  });

  it('hands over to another writer', () => {
    expect(sentFrom(problem('another-writer', 409, { epoch: 3 })).kind).toBe('another-writer');
  });

  it.each<[ClientProblemCode, number]>([
    ['unreachable', 0],
    ['unreadable', 502],
    ['database-away', 503],
    ['internal', 500],
    ['too-many-requests', 429],
    ['not-signed-in', 401],
  ])('waits and tries again on %s', (code, status) => {
    expect(sentFrom(problem(code, status))).toEqual({ kind: 'away', why: 'why' });
  });

  it.each<[ClientProblemCode, number]>([
    ['cannot-have-happened', 422],
    ['invalid-fields', 422],
    ['too-large', 413],
    ['attempt-closed', 409],
    ['not-found', 404],
  ])('keeps everything and stops on %s', (code, status) => {
    expect(sentFrom(problem(code, status))).toEqual({ kind: 'refused', why: 'why' });
  });

  it('has a meaning for every code', () => {
    for (const code of problemCode.options) expect(sentFrom(problem(code, 400)).kind).toBeTruthy();
  });
});
