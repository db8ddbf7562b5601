import { z } from 'zod';
import { ovenLayout } from '../oven/layout.ts';
import { ovenDefinition } from '../oven/oven.ts';
import { endpoint } from './endpoint.ts';
import { none } from './fields.ts';

export const listOvens = endpoint({
  method: 'GET',
  path: '/api/ovens',
  params: none,
  query: none,
  body: none,
  response: z.strictObject({
    ovens: z.array(z.strictObject({ id: z.string(), maker: z.string(), model: z.string() })),
  }),
});

export const getOven = endpoint({
  method: 'GET',
  path: '/api/ovens/:oven',
  params: z.strictObject({ oven: z.string().max(60) }),
  query: none,
  body: none,
  response: z.strictObject({ definition: ovenDefinition, layout: ovenLayout }),
});
