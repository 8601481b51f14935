import { randomBytes } from 'node:crypto';
import { hash, verify } from '@node-rs/argon2';

// argon2id. Memory (KiB), passes and lanes are the least of the OWASP Password Storage Cheat Sheet (2025):
// "Use Argon2id with a minimum configuration of 19 MiB of memory, an iteration count of 2, and 1 degree of parallelism."
// argon2id is the package's own default; its name is a const enum, which cannot be named from here.
const cost = { memoryCost: 19_456, timeCost: 2, parallelism: 1 };

export function hashPassword(password: string): Promise<string> {
  return hash(password, cost);
}

// Made as the program starts, so that an unknown address costs one check like any other, not a hash and a check.
const nobodys = hashPassword(randomBytes(32).toString('base64'));

/** Whether the password is the one hashed. Does the same work when there is nobody to check against. */
export async function isPassword(passwordHash: string | null | undefined, password: string): Promise<boolean> {
  const matches = await verify(passwordHash ?? (await nobodys), password);
  return passwordHash != null && matches;
}
