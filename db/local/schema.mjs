import { existsSync } from 'node:fs';
import path from 'node:path';
import { run } from './child.mjs';
import { ROOT } from './paths.mjs';
import { Refusal } from './say.mjs';

/** Brings a database to the newest migration. @param {string} url @param {AbortSignal} [signal] */
export async function migrate(url, signal) {
  await runScript('db/migrate.ts', 'Migrating the database', url, signal);
}

/**
 * Puts in what the application needs to begin with, once.
 * @param {string} url
 * @param {AbortSignal} [signal]
 * @param {string} [ownerPassword] of the owner's account; without it the seed makes one and prints it
 */
export async function seed(url, signal, ownerPassword) {
  const chosen = ownerPassword === undefined ? {} : { TEPIDARIUM_OWNER_PASSWORD: ownerPassword };
  await runScript('db/seed.ts', 'Seeding the database', url, signal, chosen);
}

/** Gives the owner a new password and says it. @param {string} url */
export async function newPassword(url) {
  await runScript('db/new-password.ts', 'Setting the password', url);
}

async function runScript(script, what, url, signal, env = {}) {
  if (!existsSync(path.join(ROOT, script))) return;
  const code = await run(process.execPath, ['--import', 'tsx', script], {
    cwd: ROOT,
    signal,
    env: { ...process.env, ...env, DATABASE_URL: url },
  });
  if (code !== 0) throw new Refusal(`${what} failed (exit code ${code}); the reason stands above.`, 1);
}
