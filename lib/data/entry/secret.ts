import 'server-only';
import { createHash, randomBytes } from 'node:crypto';

/** A new secret of 256 bits, in characters that an address may hold. */
export function newSecret(): string {
  return randomBytes(32).toString('base64url');
}

/** What the database keeps of a secret: enough to know it again, not enough to use it. */
export function hashSecret(secret: string): string {
  return createHash('sha256').update(secret).digest('base64url');
}
