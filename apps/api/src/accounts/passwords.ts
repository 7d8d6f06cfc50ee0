import { hash, verify } from '@node-rs/argon2';

/** argon2id (the library's own choice) with 19 MiB, two passes, one lane: the least that ASVS 5.0.0 (11.4.2) accepts. */
const cost = { memoryCost: 19_456, timeCost: 2, parallelism: 1 } as const;

export function hashPassword(password: string): Promise<string> {
  return hash(password.normalize('NFC'), cost);
}

/** Of a random password that nobody knows; compared where there is no account, so that both cases take as long. */
let nobodysHash: Promise<string> | null = null;

/**
 * Whether the password belongs to the hash. `null` (no such account, or no password set) takes the same time
 * and is always false.
 */
export async function passwordMatches(encoded: string | null, password: string): Promise<boolean> {
  nobodysHash ??= hashPassword(crypto.randomUUID());
  const matches = await verify(encoded ?? (await nobodysHash), password.normalize('NFC'));
  return encoded !== null && matches;
}
