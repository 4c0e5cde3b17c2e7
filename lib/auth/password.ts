import { hash, verify } from '@node-rs/argon2';

/** Longer ones are refused before they cost any time. */
export const LONGEST_PASSWORD = 200;

/** Hashes a password with argon2id at the library's default cost (19 MiB, two passes). */
export function hashPassword(password: string): Promise<string> {
  return hash(password);
}

/** Whether the password fits; takes as long for an account that does not exist. */
export async function passwordFits(password: string, storedHash: string | undefined): Promise<boolean> {
  if (password.length > LONGEST_PASSWORD) return false;
  if (storedHash === undefined) {
    await hash(password);
    return false;
  }
  return verify(storedHash, password);
}
