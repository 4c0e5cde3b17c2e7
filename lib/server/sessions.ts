import 'server-only';
import { findAccountByEmail } from '@/db/queries/accounts';
import { deleteSession, insertSession } from '@/db/queries/sessions';
import { passwordFits } from '@/lib/auth/password';
import type { Answer, Refusal } from '@/lib/schemas/answer';
import { database } from './database';
import { unlessDatabaseFails } from './database-failure';

export const SESSION_DAYS = 30;

const WRONG: Refusal = {
  ok: false,
  code: 'invalid',
  message: 'E-mail and password do not belong together. Check both and try again.',
};

/** Opens a session for whoever knows the password; the answer never tells which of the two was wrong. */
export function openSession(email: string, password: string): Promise<Answer<{ sessionId: string }>> {
  return unlessDatabaseFails(async () => {
    const account = await findAccountByEmail(database(), email);
    const fits = await passwordFits(password, account?.password_hash);
    if (!account || !fits) return WRONG;
    return { ok: true as const, sessionId: await insertSession(database(), account.id, SESSION_DAYS) };
  });
}

export async function closeSession(sessionId: string): Promise<void> {
  await deleteSession(database(), sessionId);
}
