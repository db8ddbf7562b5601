import type { z } from 'zod';
import type { Endpoint } from '../../shared/contracts/endpoint.ts';
import { done, refused, type Outcome } from '../outcome.ts';
import { jsonPath } from './json-path.ts';
import { unstorableText } from './unstorable-text.ts';

type FieldFault = { path: string; message: string };

/** Unknown fields are each named by their own path. */
function faultsOf(error: z.ZodError, prefix: readonly string[]): FieldFault[] {
  return error.issues.flatMap((issue) => {
    const path = [...prefix, ...issue.path];
    if (issue.code !== 'unrecognized_keys')
      return [{ path: jsonPath(path), message: issue.message }];
    return issue.keys.map((key) => ({
      path: jsonPath([...path, key]),
      message: 'an unknown field',
    }));
  });
}

function parse<S extends z.ZodType>(
  schema: S,
  value: unknown,
  prefix: readonly string[],
): { data: z.output<S> } | { faults: FieldFault[] } {
  const parsed = schema.safeParse(value);
  return parsed.success ? { data: parsed.data } : { faults: faultsOf(parsed.error, prefix) };
}

/** At most this many faults are named: a long list helps nobody and costs bandwidth. */
const mostFaults = 20;

/**
 * Parses what was sent with the schemas of the contract. Paths in the answer: those of body fields
 * start in the body (`draft.faults.0.on`), the others with `params.` or `query.`.
 */
export function parseFields<
  P extends z.ZodType,
  Q extends z.ZodType,
  B extends z.ZodType,
  R extends z.ZodType,
>(
  endpoint: Endpoint<P, Q, B, R>,
  raw: { params: unknown; query: unknown; body: unknown },
): Outcome<{ params: z.output<P>; query: z.output<Q>; body: z.output<B> }> {
  const params = parse(endpoint.params, raw.params, ['params']);
  const query = parse(endpoint.query, raw.query, ['query']);
  const body = parse(endpoint.body, raw.body, []);
  if ('data' in params && 'data' in query && 'data' in body) {
    const path = unstorableText(body.data);
    if (path === null) return done({ params: params.data, query: query.data, body: body.data });
    return refused('invalid-fields', 'A text holds a character that cannot be stored.', {
      errors: [{ path: jsonPath(path), message: 'a character that cannot be stored' }],
    });
  }
  const errors = [params, query, body].flatMap((part) => ('faults' in part ? part.faults : []));
  const count = errors.length === 1 ? 'One field is' : `${errors.length} fields are`;
  const named = errors[0] ? `: ${errors[0].path || 'the body'}, ${errors[0].message}` : '';
  return refused('invalid-fields', `${count} not valid${named}.`, {
    errors: errors.slice(0, mostFaults),
  });
}
