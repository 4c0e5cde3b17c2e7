import { epwText } from '@/tests/fakes/epw-text';
import { openDatabase } from '@/db/client';
import { insertAccount } from '@/db/queries/accounts';
import { insertSession } from '@/db/queries/sessions';
import { clonedDatabase, type FreshDatabase } from './fresh-database';

export interface ServerWorld extends FreshDatabase {
  db: ReturnType<typeof openDatabase>;
  /** makes an account and signs it in; returns its session id */
  signUp: (email: string) => Promise<string>;
}

/** A database of this file's own, with the server's functions pointed at it. */
export async function openWorld(): Promise<ServerWorld> {
  const fresh = await clonedDatabase();
  pointServerAt(fresh.url);
  const db = openDatabase(fresh.url);
  return {
    url: fresh.url,
    db,
    signUp: async (email) => {
      const account = await insertAccount(db, { email, password_hash: 'none', name: email });
      return insertSession(db, account!.id, 30);
    },
    drop: async () => {
      await db.destroy();
      const { database } = await import('@/lib/server/database');
      await database().destroy();
      await fresh.drop();
    },
  };
}

/** Sets the environment that `lib/server/env` reads at its first use. */
export function pointServerAt(url: string): void {
  process.env.DATABASE_URL = url;
  process.env.AUTH_SECRET = 'a secret for tests, long enough for the check';
}

export const EPW_BYTES = new TextEncoder().encode(epwText());
