import { sql } from 'kysely';
import type { Kysely } from 'kysely';
import type { Database } from '../schema';

/** Opens a session and clears away those that have run out. */
export async function insertSession(db: Kysely<Database>, accountId: string, days: number): Promise<string> {
  await db
    .deleteFrom('session')
    .where('expires_at', '<', sql<Date>`now()`)
    .execute();
  const session = await db
    .insertInto('session')
    .values({
      account_id: accountId,
      expires_at: sql<Date>`now() + make_interval(days => ${sql.lit(days)})`,
    })
    .returning('id')
    .executeTakeFirstOrThrow();
  return session.id;
}

/** The account behind a session that has not run out. */
export function findSessionAccount(db: Kysely<Database>, sessionId: string) {
  return db
    .selectFrom('session')
    .innerJoin('account', 'account.id', 'session.account_id')
    .select(['account.id', 'account.email', 'account.name'])
    .where('session.id', '=', sessionId)
    .where('session.expires_at', '>', sql<Date>`now()`)
    .executeTakeFirst();
}

/** Notes that a session is in use, to ten minutes, so that reading a page seldom writes. */
export async function touchSession(db: Kysely<Database>, sessionId: string): Promise<void> {
  await db
    .updateTable('session')
    .set({ last_seen_at: sql<Date>`now()` })
    .where('id', '=', sessionId)
    .where('last_seen_at', '<', sql<Date>`now() - interval '10 minutes'`)
    .execute();
}

export async function deleteSession(db: Kysely<Database>, sessionId: string): Promise<void> {
  await db.deleteFrom('session').where('id', '=', sessionId).execute();
}
