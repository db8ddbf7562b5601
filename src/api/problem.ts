import type { ProblemCode } from '../../shared/contracts/problem.ts';

/** The server's codes, and the two that only a client can find. */
export type ClientProblemCode = ProblemCode | 'unreachable' | 'unreadable';

interface Facts {
  code: ClientProblemCode;
  /** one sentence for the person */ message: string;
  /** HTTP status; 0 when no answer came */ status: number;
  errors?: readonly { path: string; message: string }[] | undefined;
  expected?: number | undefined;
  epoch?: number | undefined;
}

/**
 * A call that did not bring what was asked for. An Error because TanStack Query knows failure only
 * as a rejection; `code` is what to branch on, `message` is what to show.
 */
export class Problem extends Error {
  readonly code: ClientProblemCode;
  readonly status: number;
  readonly errors: readonly { path: string; message: string }[];
  readonly expected: number | undefined;
  readonly epoch: number | undefined;

  constructor(facts: Facts) {
    super(facts.message);
    this.name = 'Problem';
    this.code = facts.code;
    this.status = facts.status;
    this.errors = facts.errors ?? [];
    this.expected = facts.expected;
    this.epoch = facts.epoch;
  }
}

export const unreachable = (): Problem =>
  new Problem({
    code: 'unreachable',
    status: 0,
    message: 'The server cannot be reached. Check the connection, then try again.',
  });

export const unreadable = (status: number): Problem =>
  new Problem({
    code: 'unreadable',
    status,
    message:
      status >= 500
        ? 'The server is not answering as it should. Wait a minute, then try again.'
        : 'The answer of the server could not be read. Reload the page: it may be older than the server.',
  });
