import { readFile } from 'node:fs/promises';
import { join } from 'node:path';
import { z } from 'zod';
import { email, newPassword, personName, role } from '../../shared/contracts/fields.ts';

const demoAccounts = z.strictObject({
  organisation: z.string().min(1).max(120),
  password: newPassword,
  accounts: z.array(z.strictObject({ email, name: personName, role })).min(1),
});
export type DemoAccounts = z.infer<typeof demoAccounts>;

/** @throws when the file is not there or not right: it is part of the project */
export async function readDemoAccounts(root: string): Promise<DemoAccounts> {
  const text = await readFile(join(root, 'server', 'demo-accounts.json'), 'utf8');
  return demoAccounts.parse(JSON.parse(text));
}
