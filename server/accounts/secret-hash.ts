import { createHash, randomBytes } from 'node:crypto';

/** 256 random bits, fit for a cookie. */
export const newSecret = (): string => randomBytes(32).toString('base64url');

/** What the database holds of a secret with full entropy: SHA-256, no salt needed. */
export const secretHash = (secret: string): string =>
  createHash('sha256').update(secret).digest('hex');
