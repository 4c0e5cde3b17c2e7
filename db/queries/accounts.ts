import type { Kysely } from 'kysely';
import type { Database } from '../schema';

export function findAccountByEmail(db: Kysely<Database>, email: string) {
  return db
    .selectFrom('account')
    .select(['id', 'password_hash'])
    .where('email', '=', email.toLowerCase())
    .executeTakeFirst();
}

/** Creates the account unless the e-mail is taken; undefined then. */
export function insertAccount(
  db: Kysely<Database>,
  account: { email: string; password_hash: string; name: string },
) {
  return db
    .insertInto('account')
    .values(account)
    .onConflict((conflict) => conflict.column('email').doNothing())
    .returning('id')
    .executeTakeFirst();
}
