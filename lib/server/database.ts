import 'server-only';
import type { Kysely } from 'kysely';
import { openDatabase } from '@/db/client';
import type { Database } from '@/db/schema';
import { env } from './env';
import { oncePerProcess } from './once-per-process';

/** The application's one pool of connections. */
export function database(): Kysely<Database> {
  return oncePerProcess('database', () => openDatabase(env().DATABASE_URL));
}
