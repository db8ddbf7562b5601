import type { z } from 'zod';
import type { AnyEndpoint } from '../../shared/contracts/endpoint.ts';
import { problemFrom } from './problem-from.ts';
import { unreachable, unreadable } from './problem.ts';

type Part<K extends string, S extends z.ZodType> =
  Record<string, never> extends z.input<S>
    ? { [key in K]?: z.input<S> }
    : { [key in K]: z.input<S> };

/** What a call must be given; a part that the contract leaves empty may be left out. */
export type CallInput<E extends AnyEndpoint> = Part<'params', E['params']> &
  Part<'query', E['query']> &
  Part<'body', E['body']> & { signal?: AbortSignal | undefined };

interface LooseInput {
  params?: unknown;
  query?: unknown;
  body?: unknown;
  signal?: AbortSignal | undefined;
}

const entries = (record: unknown): [string, unknown][] => Object.entries(record ?? {});

const address = (path: string, { params, query }: LooseInput): string => {
  const filled = entries(params).reduce(
    (text, [name, value]) => text.replace(`:${name}`, encodeURIComponent(String(value))),
    path,
  );
  const given = entries(query).filter(([, value]) => value !== undefined);
  const search = new URLSearchParams(given.map(([name, value]) => [name, String(value)]));
  return given.length === 0 ? filled : `${filled}?${search}`;
};

const send = async (endpoint: AnyEndpoint, input: LooseInput): Promise<Response> => {
  const hasBody = endpoint.method !== 'GET' && endpoint.method !== 'DELETE';
  try {
    return await fetch(address(endpoint.path, input), {
      method: endpoint.method,
      credentials: 'same-origin',
      headers: {
        accept: 'application/json',
        ...(hasBody ? { 'content-type': 'application/json' } : {}),
      },
      ...(hasBody ? { body: JSON.stringify(input.body ?? {}) } : {}),
      ...(input.signal ? { signal: input.signal } : {}),
    });
  } catch (cause) {
    if (input.signal?.aborted) throw cause;
    throw unreachable();
  }
};

const readJson = async (response: Response): Promise<unknown> => {
  if (response.status === 204) return {};
  try {
    return await response.json();
  } catch {
    throw unreadable(response.status);
  }
};

/**
 * Calls one route of the API, as its contract says.
 * @throws Problem when the server cannot be reached, refuses, or answers what the contract does not allow;
 * the signal's own reason when aborted
 */
export const call = async <E extends AnyEndpoint>(
  endpoint: E,
  input: CallInput<E>,
): Promise<z.output<E['response']>> => {
  const response = await send(endpoint, input as LooseInput);
  const json = await readJson(response);
  if (!response.ok) throw problemFrom(response.status, json);
  const parsed = endpoint.response.safeParse(json);
  if (!parsed.success) throw unreadable(response.status);
  return parsed.data as z.output<E['response']>;
};
