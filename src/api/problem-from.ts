import { problemDetails } from '../../shared/contracts/problem.ts';
import { Problem, unreadable } from './problem.ts';

/** From the JSON of an answer that is no success; anything but problem details is unreadable. */
export const problemFrom = (status: number, json: unknown): Problem => {
  const parsed = problemDetails.safeParse(json);
  if (!parsed.success) return unreadable(status);
  const { code, detail, errors, expected, epoch } = parsed.data;
  return new Problem({ code, message: detail, status, errors, expected, epoch });
};
