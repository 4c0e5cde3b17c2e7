import '../db/local/node-version.mjs';
import { randomUUID } from 'node:crypto';
import { closeSync, openSync, rmSync } from 'node:fs';
import path from 'node:path';
import { ensureBuild } from '../db/local/build.mjs';
import { endOf, run } from '../db/local/child.mjs';
import { ensureChromium } from '../db/local/chromium.mjs';
import { holdCluster } from '../db/local/cluster.mjs';
import { dropDatabase, withDatabase } from '../db/local/databases.mjs';
import { withLock } from '../db/local/lock.mjs';
import { assertWritable } from '../db/local/ownership.mjs';
import { ensurePackages } from '../db/local/packages.mjs';
import { localPath, ROOT } from '../db/local/paths.mjs';
import { nextFreePort } from '../db/local/ports.mjs';
import { Refusal, say } from '../db/local/say.mjs';
import { seed } from '../db/local/schema.mjs';
import { authSecret } from '../db/local/secret.mjs';
import { serve } from '../db/local/serve.mjs';
import { listenForShutdown } from '../db/local/shutdown.mjs';
import { cloneForThisRun, ensureTemplate } from '../db/local/template.mjs';
import { counts, inWords, oneTest, playwrightCounts, sum, vitestCounts } from './counts.mjs';

const FIRST_PORT = 3900;
const BIN = path.join(ROOT, 'node_modules/.bin');

/** The whole of `npm test`: the set-up of `npm start`, then every stage, whether or not one before it failed. */
async function main() {
  const install = !process.argv.includes('--no-install');
  const shutdown = listenForShutdown();
  const { signal } = shutdown;
  const began = Date.now();
  let server;
  try {
    assertWritable();
    const prepared = await withLock(
      localPath('start-lock'),
      async () => {
        const chromium = await ensureChromium({ install, signal });
        server = await openDatabaseServer({ install, signal });
        await ensurePackages(signal);
        return { chromium, server };
      },
      { signal, onWait: () => say('Another start or test run prepares this folder: waiting for it …') },
    );
    const results = await runStages({ ...prepared, signal });
    signal.throwIfAborted();
    const total = sum(results);
    say(`\nAll of it took ${Math.round((Date.now() - began) / 1000)} s.`);
    say(inWords(total));
    process.exitCode = total.failed > 0 ? 1 : 0;
  } catch (error) {
    if (!signal.aborted) throw error;
    process.exitCode = shutdown.exitCode();
  } finally {
    await server?.release();
  }
}

/** The project's own cluster, or the server that DATABASE_URL names. */
async function openDatabaseServer({ install, signal }) {
  const external = process.env.DATABASE_URL;
  if (!external) return holdCluster({ install, signal });
  return {
    url: (database) => withDatabase(external, database),
    lock: localPath('template-lock'),
    release: () => Promise.resolve(),
  };
}

/** Stages share the environment; the first one puts the run's own database into it. */
async function runStages({ chromium, server, signal }) {
  const adminUrl = server.url('postgres');
  const env = {
    ...process.env,
    // Tools that colour their words even in a file make a log hard to read.
    ...(process.stdout.isTTY ? {} : { NO_COLOR: '1' }),
    CHROMIUM: chromium,
    TEPIDARIUM_ADMIN_URL: adminUrl,
    NEXT_TELEMETRY_DISABLED: '1',
  };
  const tool = (name, ...args) => run(path.join(BIN, name), args, { cwd: ROOT, env, signal });
  let ownDatabase;
  const stages = {
    database: async () => {
      env.TEPIDARIUM_TEMPLATE_DATABASE = await ensureTemplate(adminUrl, server.lock, signal);
      ownDatabase = await cloneForThisRun(adminUrl, env.TEPIDARIUM_TEMPLATE_DATABASE);
      env.DATABASE_URL = withDatabase(adminUrl, ownDatabase);
      env.TEPIDARIUM_OWNER_PASSWORD = randomUUID();
      await seed(env.DATABASE_URL, signal, env.TEPIDARIUM_OWNER_PASSWORD);
      return counts(1);
    },
    build: async () => {
      await withLock(localPath('start-lock'), () => ensureBuild(signal), { signal });
      return counts(1);
    },
    eslint: async () => oneTest(await tool('eslint', '.', '--max-warnings=0')),
    prettier: async () => oneTest(await tool('prettier', '--check', '--log-level=warn', '.')),
    // After the build, which writes the types of the routes.
    types: async () => oneTest(await tool('tsc', '--noEmit')),
    'unit and integration': () => vitest(tool),
    'end to end': () => endToEnd(env, signal),
  };
  const results = [];
  try {
    for (const [name, stage] of Object.entries(stages)) {
      signal.throwIfAborted();
      results.push(await runStage(name, stage, signal));
    }
  } finally {
    if (ownDatabase !== undefined) await dropDatabase(adminUrl, ownDatabase);
  }
  return results;
}

async function runStage(name, stage, signal) {
  say(`\n— ${name} —`);
  const began = Date.now();
  let result;
  try {
    result = await stage();
  } catch (error) {
    if (signal.aborted) throw error;
    say(error instanceof Refusal ? error.message : error.stack);
    result = counts(0, 1);
  }
  say(`${name}: ${inWords(result)} in ${((Date.now() - began) / 1000).toFixed(1)} s`);
  return result;
}

async function vitest(tool) {
  const report = localPath('test', 'vitest.json');
  rmSync(report, { force: true });
  const code = await tool(
    'vitest',
    'run',
    '--reporter=dot',
    '--reporter=json',
    `--outputFile.json=${report}`,
  );
  return vitestCounts(report, code);
}

async function endToEnd(env, signal) {
  const report = localPath('test', 'playwright.json');
  const logFile = localPath('test', 'server.log');
  rmSync(report, { force: true });
  const log = openSync(logFile, 'w');
  const port = await nextFreePort(FIRST_PORT);
  const server = await serve({
    port,
    env: { ...env, AUTH_SECRET: authSecret(), PORT: String(port) },
    stderr: log,
    signal,
  }).finally(() => closeSync(log));
  try {
    const code = await run(path.join(BIN, 'playwright'), ['test', '--reporter=list,json'], {
      cwd: ROOT,
      signal,
      env: { ...env, BASE_URL: `http://localhost:${port}`, PLAYWRIGHT_JSON_OUTPUT_NAME: report },
    });
    if (code !== 0) say(`The server's own words (${logFile}):\n${endOf(logFile)}`);
    return playwrightCounts(report, code);
  } finally {
    await server.stop();
  }
}

main().catch((error) => {
  process.stderr.write(`${error instanceof Refusal ? error.message : error.stack}\n`);
  process.exitCode = error.exitCode ?? 1;
});
