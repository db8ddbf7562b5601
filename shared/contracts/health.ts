import { z } from 'zod';
import { endpoint } from './endpoint.ts';
import { none } from './fields.ts';

export const health = endpoint({
  method: 'GET',
  path: '/api/health',
  params: none,
  query: none,
  body: none,
  response: z.strictObject({ status: z.literal('up'), database: z.enum(['up', 'away']) }),
});
