import type { ProblemCode, ProblemDetails } from '../shared/contracts/problem.ts';

/** Why a request was not done, in the words of the catalogue of problem codes. */
export interface Problem {
  code: ProblemCode;
  /** one sentence for the person, naming what was wrong */ detail: string;
  errors?: ProblemDetails['errors'];
  expected?: number;
  epoch?: number;
}

export interface Refused {
  ok: false;
  problem: Problem;
}

/** What a service answers: expected refusals are values, a thrown error is a bug or a lost database. */
export type Outcome<T> = { ok: true; value: T } | Refused;

export const done = <T>(value: T): { ok: true; value: T } => ({ ok: true, value });

export const refused = (
  code: ProblemCode,
  detail: string,
  more: Omit<Problem, 'code' | 'detail'> = {},
): Refused => ({ ok: false, problem: { code, detail, ...more } });
