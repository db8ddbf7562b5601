import { z } from 'zod';

export const none = z.strictObject({});
export const id = z.uuid();
export const instant = z.iso.datetime();
export const email = z.string().trim().toLowerCase().max(254).pipe(z.email('an e-mail address'));
export const newPassword = z
  .string()
  .min(10, 'at least 10 characters')
  .max(128, 'at most 128 characters');
export const personName = z.string().trim().min(1, 'your name').max(80);
export const role = z.enum(['trainee', 'instructor', 'administrator']);
export type Role = z.infer<typeof role>;
