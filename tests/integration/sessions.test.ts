import { sql } from 'kysely';
import { afterAll, beforeAll, describe, expect, it, vi } from 'vitest';
import { insertAccount } from '@/db/queries/accounts';
import { hashPassword } from '@/lib/auth/password';
import { currentAccount } from '@/lib/server/current-account';
import { closeSession, openSession } from '@/lib/server/sessions';
import { hasPostgres } from './fresh-database';
import { openWorld, type ServerWorld } from './server-world';
import { visitor } from './visitor';

vi.mock('@/lib/auth/session-id', () => import('./visitor'));

const EMAIL = 'rowan@tepidarium.example';
const PASSWORD = 'a warm floor in January';

async function msOf(work: () => Promise<unknown>): Promise<number> {
  const times: number[] = [];
  for (let i = 0; i < 5; i++) {
    const began = performance.now();
    await work();
    times.push(performance.now() - began);
  }
  return times.sort((a, b) => a - b)[2]!;
}

describe.skipIf(!hasPostgres)('sessions', { timeout: 30_000 }, () => {
  let world: ServerWorld;
  beforeAll(async () => {
    world = await openWorld();
    await insertAccount(world.db, {
      email: EMAIL,
      password_hash: await hashPassword(PASSWORD),
      name: 'Rowan',
    });
  });
  afterAll(() => world.drop());

  it('opens one for the right password, however the e-mail is written', async () => {
    const answer = await openSession('Rowan@Tepidarium.example', PASSWORD);
    if (!answer.ok) throw new Error(answer.message);
    visitor.sessionId = answer.sessionId;
    expect(await currentAccount()).toMatchObject({ ok: true, account: { email: EMAIL, name: 'Rowan' } });
  });

  it('says the same for an unknown e-mail and a wrong password, and takes as long', async () => {
    const wrong = () => openSession(EMAIL, 'another');
    const unknown = () => openSession('nobody@tepidarium.example', 'another');
    expect(await unknown()).toEqual(await wrong());
    // Without the hash an unknown e-mail answers in a tenth of the time; the rest is room for a busy machine.
    expect(await msOf(unknown)).toBeGreaterThan(0.4 * (await msOf(wrong)));
  });

  it('refuses a closed session at the next request', async () => {
    await closeSession(visitor.sessionId!);
    expect(await currentAccount()).toMatchObject({ ok: false, code: 'signed out' });
  });

  it('refuses a session that has run out, and one that is no id', async () => {
    visitor.sessionId = await world.signUp('ash@tepidarium.example');
    await world.db
      .updateTable('session')
      .set({ expires_at: sql<Date>`now() - interval '1 second'` })
      .execute();
    expect(await currentAccount()).toMatchObject({ ok: false, code: 'signed out' });
    visitor.sessionId = "1' or true --";
    expect(await currentAccount()).toMatchObject({ ok: false, code: 'signed out' });
  });
});
