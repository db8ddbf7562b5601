import type { ProblemCode } from '../../shared/contracts/problem.ts';

/** One status and one title for every stable code (RFC 9457, section 3.1). */
export const problemCatalogue: Readonly<Record<ProblemCode, { status: number; title: string }>> = {
  'bad-request': { status: 400, title: 'The request cannot be read' },
  'malformed-json': { status: 400, title: 'The body is not JSON' },
  'not-signed-in': { status: 401, title: 'Not signed in' },
  'wrong-credentials': { status: 401, title: 'Wrong e-mail address or password' },
  'not-allowed': { status: 403, title: 'Not allowed' },
  'cross-site': { status: 403, title: 'Sent from another site' },
  'not-found': { status: 404, title: 'Not found' },
  'method-not-allowed': { status: 405, title: 'Method not allowed' },
  'email-taken': { status: 409, title: 'E-mail address already in use' },
  'sequence-gap': { status: 409, title: 'Events are missing before these' },
  'another-writer': { status: 409, title: 'Another tab writes this attempt' },
  'attempt-closed': { status: 409, title: 'The attempt is handed in' },
  'not-handed-in': { status: 409, title: 'The attempt is not handed in' },
  'scenario-not-published': { status: 409, title: 'The scenario is not published' },
  'scenario-unchanged': { status: 409, title: 'Nothing changed since the last version' },
  'too-large': { status: 413, title: 'The body is too large' },
  'invalid-fields': { status: 422, title: 'Fields are not valid' },
  'cannot-have-happened': { status: 422, title: 'This cannot have happened on the bench' },
  'too-many-requests': { status: 429, title: 'Too many requests' },
  internal: { status: 500, title: 'A fault of ours' },
  'database-away': { status: 503, title: 'The database is away' },
};
