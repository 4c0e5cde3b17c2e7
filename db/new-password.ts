import { hashPassword } from '@/lib/auth/password';
import { openDatabase } from './client';
import { setPassword } from './queries/accounts';
import { readablePassword } from './readable-password';
import { OWNER_EMAIL } from './seed';

/* Gives the owner a new random password and ends every session; for whoever lost the one that the first start printed. */

const url = process.env.DATABASE_URL;
if (!url) throw new Error('DATABASE_URL is not set: npm run db -- password sets it.');
const db = openDatabase(url);
const password = readablePassword();
const found = await setPassword(db, OWNER_EMAIL, await hashPassword(password));
await db.destroy();
process.stdout.write(
  found
    ? `Sign in as ${OWNER_EMAIL} with the password ${password}\n`
    : `There is no account ${OWNER_EMAIL} yet: npm start makes it.\n`,
);
