import { expect, it } from 'vitest';

it('keeps zod from probing for eval, whenever it is loaded', async () => {
  await import('../../src/app/configure-zod.ts');
  const { z } = await import('zod');
  expect(z.config().jitless).toBe(true);
});
