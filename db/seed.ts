import { createHash } from 'node:crypto';
import { pathToFileURL } from 'node:url';
import { sql, type Kysely, type Transaction } from 'kysely';
import { climates } from '@/data/climates/climates';
import { larkspurBills } from '@/data/demonstration/larkspur-bills';
import { demonstration } from '@/data/demonstration/larkspur-house';
import { hashPassword } from '@/lib/auth/password';
import { encodeWeatherYear } from '@/lib/weather/packed-weather';
import { openDatabase } from './client';
import { insertAccount } from './queries/accounts';
import { insertProject } from './queries/projects';
import { findClimateId, upsertClimate } from './queries/weather-years';
import { readablePassword } from './readable-password';
import type { Database } from './schema';

export const OWNER_EMAIL = 'owner@tepidarium.localhost';

export interface Seeded {
  /** only when the owner was created just now with a random password: it is stored nowhere else */
  newOwner?: { email: string; password: string };
}

/**
 * Puts in what the application needs to begin with: the shipped climates, one owner, and for the owner a copy of
 * the demonstration. Running it again renews the climates and changes nothing else. The owner's password is random
 * unless TEPIDARIUM_OWNER_PASSWORD gives one.
 */
export async function seed(url: string): Promise<Seeded> {
  const db = openDatabase(url);
  try {
    return await db.transaction().execute(async (trx) => {
      await sql`select pg_advisory_xact_lock(hashtext('tepidarium seed'))`.execute(trx);
      await seedClimates(trx);
      return seedOwner(trx);
    });
  } finally {
    await db.destroy();
  }
}

async function seedClimates(db: Kysely<Database>): Promise<void> {
  for (const climate of climates) {
    const year = climate.weatherYear();
    const sha256 = createHash('sha256').update(encodeWeatherYear(year)).digest('hex');
    await upsertClimate(db, climate.id, year, sha256);
  }
}

async function seedOwner(db: Transaction<Database>): Promise<Seeded> {
  const anyAccount = await db.selectFrom('account').select('id').limit(1).executeTakeFirst();
  if (anyAccount) return {};
  const chosen = process.env.TEPIDARIUM_OWNER_PASSWORD;
  const password = chosen ?? readablePassword();
  const owner = await insertAccount(db, {
    email: OWNER_EMAIL,
    password_hash: await hashPassword(password),
    name: 'Owner',
  });
  if (!owner) return {};
  const { house, prices, designs, climateId } = demonstration;
  const weatherYearId = (await findClimateId(db, climateId)) ?? null;
  const bills = larkspurBills();
  await insertProject(db, {
    ownerId: owner.id,
    name: house.name,
    house,
    bills,
    prices,
    designs,
    weatherYearId,
  });
  return chosen ? {} : { newOwner: { email: OWNER_EMAIL, password } };
}

if (process.argv[1] && import.meta.url === pathToFileURL(process.argv[1]).href) {
  const url = process.env.DATABASE_URL;
  if (!url)
    throw new Error('DATABASE_URL is not set: npm start sets it, or point it at a database of your own.');
  const { newOwner } = await seed(url);
  if (newOwner) {
    process.stdout.write(
      `Sign in as ${newOwner.email} with the password ${newOwner.password}\n` +
        'This password is shown once and stored nowhere: write it down. (npm run db -- password makes a new one.)\n',
    );
  }
}
