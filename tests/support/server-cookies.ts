import type { Response } from 'supertest';

/** The cookies an answer set, as a browser would send them back; those it took away are left out. */
export const cookieOf = (response: Response): string =>
  (response.get('Set-Cookie') ?? [])
    .map((line) => line.split(';')[0] ?? '')
    .filter((pair) => !pair.endsWith('='))
    .join('; ');
