import { afterEach, vi } from 'vitest';
import type { z } from 'zod';
import type { AnyEndpoint } from '../../shared/contracts/endpoint.ts';
import { problemDetails, type ProblemCode } from '../../shared/contracts/problem.ts';

/** A call as it arrived, parsed by its contract. */
export interface ReceivedCall<E extends AnyEndpoint> {
  params: z.output<E['params']>;
  query: z.output<E['query']>;
  body: z.output<E['body']>;
}

type Answer<E extends AnyEndpoint> =
  z.input<E['response']> | Refusal | 'no network' | 'nonsense' | 'never';

interface Refusal {
  status: number;
  code: ProblemCode;
  detail: string;
  errors?: { path: string; message: string }[];
}

interface Handler {
  endpoint: AnyEndpoint;
  answer: (received: ReceivedCall<AnyEndpoint>) => unknown;
}

const json = (status: number, body: unknown): Response =>
  new Response(JSON.stringify(body), {
    status,
    headers: { 'content-type': status < 400 ? 'application/json' : 'application/problem+json' },
  });

const isRefusal = (answer: unknown): answer is Refusal =>
  typeof answer === 'object' && answer !== null && 'code' in answer && 'detail' in answer;

const paramsIn = (path: string, actual: string): Record<string, string> | null => {
  const names = path.split('/');
  const values = actual.split('/');
  if (names.length !== values.length) return null;
  const params: Record<string, string> = {};
  for (const [index, name] of names.entries()) {
    const value = decodeURIComponent(values[index] ?? '');
    if (name.startsWith(':')) params[name.slice(1)] = value;
    else if (name !== value) return null;
  }
  return params;
};

/**
 * Stands in for the server at the edge of the network: `fetch`. Calls and answers are parsed by the
 * contracts, so a fake that drifts from the API fails; so does a call nobody expected.
 */
export class FakeApi {
  readonly calls: { endpoint: AnyEndpoint; received: ReceivedCall<AnyEndpoint> }[] = [];
  readonly #handlers: Handler[] = [];

  constructor() {
    vi.stubGlobal('fetch', (address: string, init: RequestInit) => this.#answer(address, init));
  }

  /** The newest answer for an endpoint is the one given. */
  on<E extends AnyEndpoint>(
    endpoint: E,
    answer: Answer<E> | ((received: ReceivedCall<E>) => Answer<E>),
  ): this {
    this.#handlers.unshift({
      endpoint,
      answer: (received) =>
        typeof answer === 'function' ? (answer as (one: unknown) => unknown)(received) : answer,
    });
    return this;
  }

  callsOf<E extends AnyEndpoint>(endpoint: E): ReceivedCall<E>[] {
    return this.calls
      .filter((one) => one.endpoint === endpoint)
      .map(({ received }) => received as ReceivedCall<E>);
  }

  async #answer(address: string, { method = 'GET', body, signal }: RequestInit): Promise<Response> {
    const url = new URL(address, 'http://bench.example');
    for (const { endpoint, answer } of this.#handlers) {
      const params = endpoint.method === method ? paramsIn(endpoint.path, url.pathname) : null;
      // `/scenarios/publish` is no uuid: a path that fails its schema is another route.
      if (!params || !endpoint.params.safeParse(params).success) continue;
      const received = {
        params: endpoint.params.parse(params),
        query: endpoint.query.parse(Object.fromEntries(url.searchParams)),
        body: endpoint.body.parse(typeof body === 'string' ? JSON.parse(body) : {}),
      };
      this.calls.push({ endpoint, received });
      return this.#respond(endpoint, answer(received), signal ?? null);
    }
    throw new Error(`nobody answers ${method} ${url.pathname}`);
  }

  async #respond(
    endpoint: AnyEndpoint,
    answer: unknown,
    signal: AbortSignal | null,
  ): Promise<Response> {
    if (answer === 'no network') throw new TypeError('Failed to fetch');
    if (answer === 'nonsense') return new Response('<html></html>', { status: 502 });
    if (answer === 'never')
      return new Promise((_resolve, reject) =>
        signal?.addEventListener('abort', () => reject(new DOMException('gone', 'AbortError'))),
      );
    if (isRefusal(answer)) {
      const { code, status } = answer;
      const details = { type: `urn:coldbench:problem:${code}`, title: code, ...answer };
      return json(status, problemDetails.parse(details));
    }
    return json(200, endpoint.response.parse(answer));
  }
}

/** A server for one test; the real `fetch` is back after it. */
export const fakeApi = (): FakeApi => new FakeApi();

afterEach(() => vi.unstubAllGlobals());
