import type { WireEvent } from '../../shared/bench/event.ts';
import { appendEvents } from '../../shared/contracts/attempts.ts';
import { call } from '../api/call.ts';
import { Problem } from '../api/problem.ts';
import type { Sent } from './step-queue.ts';

/** The one call that writes the record, with every answer as a value. */
export const sendSteps =
  (attempt: string, writer: string, epoch: number) =>
  async (from: number, events: readonly WireEvent[]): Promise<Sent> => {
    try {
      const { next } = await call(appendEvents, {
        params: { attempt },
        body: { writer, epoch, from, events: [...events] },
      });
      return { kind: 'stored', next };
    } catch (problem) {
      if (!(problem instanceof Problem)) throw problem;
      return sentFrom(problem);
    }
  };

/** What a refusal or a silence means for the steps that were sent. */
export function sentFrom(problem: Problem): Sent {
  const why = problem.message;
  switch (problem.code) {
    case 'sequence-gap':
      return problem.expected === undefined
        ? { kind: 'refused', why }
        : { kind: 'gap', expected: problem.expected };
    case 'another-writer':
      return { kind: 'another-writer', why };
    // Asking again may help: the server is away, busy, or the person can sign in again beside it.
    case 'unreachable':
    case 'unreadable':
    case 'database-away':
    case 'internal':
    case 'too-many-requests':
    case 'not-signed-in':
      return { kind: 'away', why };
    case 'bad-request':
    case 'malformed-json':
    case 'invalid-fields':
    case 'too-large':
    case 'wrong-credentials':
    case 'not-allowed':
    case 'cross-site':
    case 'not-found':
    case 'method-not-allowed':
    case 'email-taken':
    case 'attempt-closed':
    case 'cannot-have-happened':
    case 'not-handed-in':
    case 'scenario-not-published':
    case 'scenario-unchanged':
      return { kind: 'refused', why };
  }
}
