import { afterEach, describe, expect, it, vi } from 'vitest';
import { z } from 'zod';
import { call } from '../../src/api/call.ts';
import { Problem } from '../../src/api/problem.ts';
import { endpoint } from '../../shared/contracts/endpoint.ts';

const rename = endpoint({
  method: 'PUT',
  path: '/api/parts/:part/terminals/:terminal',
  params: z.strictObject({ part: z.string(), terminal: z.string() }),
  query: z.strictObject({ note: z.string().optional(), page: z.int().optional() }),
  body: z.strictObject({ name: z.string() }),
  response: z.strictObject({ done: z.boolean() }),
});

const answer = (status: number, body: string | null): ReturnType<typeof vi.fn> => {
  const fetched = vi.fn(() => Promise.resolve(new Response(body, { status })));
  vi.stubGlobal('fetch', fetched);
  return fetched;
};

const input = { params: { part: 'C1', terminal: 'a/b' }, query: {}, body: { name: 'x' } };

const failure = async (more: { signal?: AbortSignal } = {}): Promise<unknown> =>
  call(rename, { ...input, ...more }).then(
    () => 'no failure',
    (reason: unknown) => reason,
  );

afterEach(() => vi.unstubAllGlobals());

describe('call', () => {
  it('fills the path, leaves out what is undefined and sends JSON', async () => {
    const fetched = answer(200, '{"done":true}');
    const done = await call(rename, { ...input, query: { note: 'two words', page: undefined } });
    expect(done).toEqual({ done: true });
    expect(fetched.mock.calls[0]?.[0]).toBe('/api/parts/C1/terminals/a%2Fb?note=two+words');
    expect(fetched.mock.calls[0]?.[1]).toMatchObject({
      method: 'PUT',
      credentials: 'same-origin',
      body: '{"name":"x"}',
      headers: { 'content-type': 'application/json' },
    });
  });

  it('gives the problem the server states', async () => {
    answer(
      409,
      JSON.stringify({
        type: 'urn:coldbench:problem:sequence-gap',
        title: 'Sequence gap',
        status: 409,
        detail: 'The record expects event 12.',
        code: 'sequence-gap',
        expected: 12,
      }),
    );
    const problem = await failure();
    expect(problem).toBeInstanceOf(Problem);
    expect(problem).toMatchObject({
      code: 'sequence-gap',
      status: 409,
      message: 'The record expects event 12.',
      expected: 12,
      errors: [],
    });
  });

  it('says that the server cannot be reached', async () => {
    vi.stubGlobal('fetch', () => Promise.reject(new TypeError('Failed to fetch')));
    expect(await failure()).toMatchObject({
      code: 'unreachable',
      status: 0,
      message: 'The server cannot be reached. Check the connection, then try again.',
    });
  });

  it.each([
    ['a page of a proxy', 502, '<html>Bad gateway</html>'],
    ['JSON that is no problem', 500, '{"error":"boom"}'],
    ['an answer the contract does not allow', 200, '{"done":"yes"}'],
    ['an answer with a field more', 200, '{"done":true,"extra":1}'],
    ['a cut answer', 200, '{"done":tr'],
  ])('calls %s unreadable', async (_what, status, body) => {
    answer(status, body);
    expect(await failure()).toMatchObject({ code: 'unreadable', status });
  });

  it('passes an abort on as it is', async () => {
    const controller = new AbortController();
    controller.abort(new DOMException('gone', 'AbortError'));
    vi.stubGlobal('fetch', (_address: string, init: RequestInit) =>
      Promise.reject(init.signal?.reason as Error),
    );
    const reason = await failure({ signal: controller.signal });
    expect(reason).not.toBeInstanceOf(Problem);
    expect(reason).toMatchObject({ name: 'AbortError' });
  });
});
