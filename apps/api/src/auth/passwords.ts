import { hash, verify } from '@node-rs/argon2';

/** OWASP's first recommendation for argon2id: 19 MiB, two passes, one lane (Password Storage Cheat Sheet). */
const OPTIONS = { memoryCost: 19_456, timeCost: 2, parallelism: 1 };

/** A hash of nothing anybody types; checking against it takes as long as against a real one. */
const decoy = hash('a password that no account has', OPTIONS);

/** Hashes a password with argon2id, off the event loop. */
export function hashPassword(password: string): Promise<string> {
  return hash(password, OPTIONS);
}

/** Whether the password fits. With no hash (an unknown account) it takes as long and says no. */
export async function verifyPassword(stored: string | null, password: string): Promise<boolean> {
  const fits = await verify(stored ?? (await decoy), password);
  return stored !== null && fits;
}
