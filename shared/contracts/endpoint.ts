import type { z } from 'zod';

/** One route of the API: the same object makes the Express route and the client's call, so a wrong field on either side does not compile. */
export interface Endpoint<
  P extends z.ZodType,
  Q extends z.ZodType,
  B extends z.ZodType,
  R extends z.ZodType,
> {
  method: 'GET' | 'POST' | 'PUT' | 'PATCH' | 'DELETE';
  /** Express notation: `/api/attempts/:attempt` */ path: string;
  params: P;
  query: Q;
  body: B;
  response: R;
}

export type AnyEndpoint = Endpoint<z.ZodType, z.ZodType, z.ZodType, z.ZodType>;

export const endpoint = <
  P extends z.ZodType,
  Q extends z.ZodType,
  B extends z.ZodType,
  R extends z.ZodType,
>(
  definition: Endpoint<P, Q, B, R>,
): Endpoint<P, Q, B, R> => definition;
