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

/** Changes the password and ends every session of the account; false when there is no such account. */
export function setPassword(db: Kysely<Database>, email: string, passwordHash: string): Promise<boolean> {
  return db.transaction().execute(async (trx) => {
    const account = await trx
      .updateTable('account')
      .set({ password_hash: passwordHash })
      .where('email', '=', email)
      .returning('id')
      .executeTakeFirst();
    if (account) await trx.deleteFrom('session').where('account_id', '=', account.id).execute();
    return account !== undefined;
  });
}
