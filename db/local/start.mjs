import './node-version.mjs';
import { ensureBuild } from './build.mjs';
import { holdCluster } from './cluster.mjs';
import { assertReachable, ensureDatabase } from './databases.mjs';
import { withLock } from './lock.mjs';
import { assertWritable } from './ownership.mjs';
import { ensurePackages } from './packages.mjs';
import { localPath } from './paths.mjs';
import { nextFreePort } from './ports.mjs';
import { Refusal, say } from './say.mjs';
import { migrate, seed } from './schema.mjs';
import { authSecret } from './secret.mjs';
import { PortLost, serve } from './serve.mjs';
import { listenForShutdown } from './shutdown.mjs';

const DATABASE = 'tepidarium';
const FIRST_PORT = 3000;
const PORT_TRIES = 5;

const FLAGS = ['--no-install', '--dev'];
const USAGE = `npm start            everything: packages, database, build, server
npm start -- --no-install   the same, but never installs Debian packages
npm run dev          the same with the development server, which follows every change
PORT=4000 npm start         another first choice of port
DATABASE_URL=… npm start    a PostgreSQL server of your own`;

/** The whole of `npm start`. */
async function main() {
  const flags = process.argv.slice(2);
  if (flags.some((flag) => !FLAGS.includes(flag))) throw new Refusal(USAGE, 2);
  const development = flags.includes('--dev');
  const firstPort = portWanted();
  const shutdown = listenForShutdown();
  const { signal } = shutdown;
  let database;
  let server;
  try {
    assertWritable();
    // Two starts at once in one checkout take turns until each one's server answers.
    await withLock(
      localPath('start-lock'),
      async () => {
        database = await openDatabase({ install: !flags.includes('--no-install'), signal });
        await ensurePackages(signal);
        await database.ensure();
        await migrate(database.url, signal);
        await seed(database.url, signal);
        if (!development) await ensureBuild(signal);
        server = await serveOnFreePort(firstPort, { databaseUrl: database.url, development, signal });
      },
      { signal, onWait: () => say('Another start or test run prepares this folder: waiting for it …') },
    );
    say(`Tepidarium is at http://localhost:${server.port}`);
    const code = await Promise.race([server.ended, aborted(signal)]);
    if (code !== undefined) throw new Refusal(`The server ended by itself (exit code ${code}).`, code || 1);
  } catch (error) {
    if (!signal.aborted) throw error;
  } finally {
    await server?.stop();
    await database?.release();
  }
  process.exitCode = shutdown.exitCode();
}

function portWanted() {
  const wanted = process.env.PORT ?? String(FIRST_PORT);
  const port = Number(wanted);
  if (!Number.isInteger(port) || port < 1 || port > 65_535) {
    throw new Refusal(`PORT is "${wanted}": give a number from 1 to 65535.`, 2);
  }
  return port;
}

async function openDatabase({ install, signal }) {
  const external = process.env.DATABASE_URL;
  if (external) {
    say('Using the database of DATABASE_URL.');
    return { url: external, ensure: () => assertReachable(external), release: () => Promise.resolve() };
  }
  const { url, release } = await holdCluster({ install, signal });
  return { url: url(DATABASE), ensure: () => ensureDatabase(url('postgres'), DATABASE), release };
}

async function serveOnFreePort(firstPort, { databaseUrl, development, signal }) {
  let port = firstPort;
  for (let attempt = 1; ; attempt += 1) {
    port = await nextFreePort(port);
    if (port !== firstPort) say(`Port ${firstPort} is taken: using ${port}.`);
    try {
      const env = { DATABASE_URL: databaseUrl, AUTH_SECRET: authSecret(), PORT: String(port) };
      return { port, ...(await serve({ port, env, development, signal })) };
    } catch (error) {
      if (!(error instanceof PortLost) || attempt === PORT_TRIES) throw error;
    }
  }
}

function aborted(signal) {
  return new Promise((resolve) => {
    if (signal.aborted) resolve(undefined);
    signal.addEventListener('abort', () => resolve(undefined), { once: true });
  });
}

main().catch((error) => {
  process.stderr.write(`${error instanceof Refusal ? error.message : error.stack}\n`);
  process.exitCode = error.exitCode ?? 1;
});
