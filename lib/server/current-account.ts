import 'server-only';
import { z } from 'zod';
import { findSessionAccount, touchSession } from '@/db/queries/sessions';
import { sessionId } from '@/lib/auth/session-id';
import type { Answer, Refusal } from '@/lib/schemas/answer';
import { database } from './database';
import { unlessDatabaseFails } from './database-failure';

export interface Account {
  id: string;
  email: string;
  name: string;
}

const SIGNED_OUT: Refusal = {
  ok: false,
  code: 'signed out',
  message: 'You are signed out. Sign in in another tab, then try again here: what you typed is still there.',
};

/** Who asks: session and account are read from the database each time, never from the cookie. */
export function currentAccount(): Promise<Answer<{ account: Account }>> {
  return unlessDatabaseFails(async () => {
    const id = z.uuid().safeParse(await sessionId());
    if (!id.success) return SIGNED_OUT;
    const account = await findSessionAccount(database(), id.data);
    if (!account) return SIGNED_OUT;
    await touchSession(database(), id.data);
    return { ok: true, account };
  });
}
