import { hash, verify } from '@node-rs/argon2';
import type { Algorithm } from '@node-rs/argon2';
import { env } from './env';

const cost = {
  // The enumeration is `const`, and a file that is compiled alone cannot read it: 2 is argon2id.
  algorithm: 2 as Algorithm,
  memoryCost: env.ARGON2_MEMORY_KIB,
  timeCost: env.ARGON2_PASSES,
  parallelism: 1,
};

/** argon2id of a password or a PIN. */
export function hashSecret(secret: string): Promise<string> {
  return hash(secret, cost);
}

let spare: Promise<string> | undefined;

/**
 * Whether the secret is the one behind the hash. Where there is no hash (an
 * unknown account, no PIN yet) the same work is done, so that the time of the
 * answer tells nothing.
 */
export async function verifySecret(stored: string | null | undefined, secret: string) {
  if (typeof stored === 'string') return verify(stored, secret);
  spare ??= hashSecret('nobody has this one');
  await verify(await spare, secret);
  return false;
}
