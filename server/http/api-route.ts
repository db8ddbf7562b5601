import type { z } from 'zod';
import type { AnyEndpoint, Endpoint } from '../../shared/contracts/endpoint.ts';
import type { Outcome } from '../outcome.ts';
import type { Caller } from './caller.ts';
import type { CookieJar } from './cookie-jar.ts';
import { parseFields } from './parse-fields.ts';
import { admit, type CallerOf, type Policy } from './policy.ts';

/** Which counters a route draws on, named in `rate-limits.ts`. */
export type RateLimit = 'sign-in' | 'sign-up' | 'visit';

/** What a handler is given: everything parsed, the caller admitted by the route's policy. */
export interface Call<P, Q, B, C> {
  params: P;
  query: Q;
  body: B;
  caller: C;
  cookies: CookieJar;
}

export interface RawCall {
  params: unknown;
  query: unknown;
  body: unknown;
  caller: Caller;
  cookies: CookieJar;
}

/** A contract endpoint with its policy and handler, ready to be mounted. */
export interface ApiRoute {
  endpoint: AnyEndpoint;
  policy: Policy;
  limit: RateLimit | null;
  run: (raw: RawCall) => Promise<Outcome<unknown>>;
}

/**
 * Binds an endpoint of the contract to who may call it and what is done. First the policy (401,
 * 403), then the fields (422), then the handler: nobody learns about fields they may not send.
 */
export function route<
  P extends z.ZodType,
  Q extends z.ZodType,
  B extends z.ZodType,
  R extends z.ZodType,
  K extends Policy,
>(
  endpoint: Endpoint<P, Q, B, R>,
  policy: K,
  handler: (
    call: Call<z.output<P>, z.output<Q>, z.output<B>, CallerOf<K>>,
  ) => Promise<Outcome<z.input<R>>>,
  limit: RateLimit | null = null,
): ApiRoute {
  return {
    endpoint,
    policy,
    limit,
    run: async (raw) => {
      const admitted = admit(policy, raw.caller);
      if (!admitted.ok) return admitted;
      const fields = parseFields(endpoint, raw);
      if (!fields.ok) return fields;
      return handler({ ...fields.value, caller: admitted.value, cookies: raw.cookies });
    },
  };
}
