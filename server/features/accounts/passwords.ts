import { createHash, randomBytes } from 'node:crypto';
import argon2 from 'argon2';

// OWASP's first choice for argon2id: 19 MiB, two passes, one lane.
const cost = { type: argon2.argon2id, memoryCost: 19_456, timeCost: 2, parallelism: 1 } as const;

export const hashPassword = (password: string): Promise<string> => argon2.hash(password, cost);

let decoy: Promise<string> | undefined;

/** True when it matches. An unknown person takes as long as a wrong password. */
export async function checkPassword(hash: string | undefined, password: string): Promise<boolean> {
  decoy ??= hashPassword(randomBytes(12).toString('hex'));
  const known = hash ?? (await decoy);
  const matches = await argon2.verify(known, password).catch(() => false);
  return matches && hash !== undefined;
}

export const newToken = (): string => randomBytes(32).toString('base64url');
export const tokenHash = (token: string): string =>
  createHash('sha256').update(token).digest('hex');
