import { setTimeout as sleep } from 'node:timers/promises';
import { Refusal } from './say.mjs';

const DUPLICATE_DATABASE = '42P04';
const STARTING_UP = '57P03';
const PATIENCE_MS = 30_000;

/** Refuses in words a server that does not let one in. @param {string} url */
export async function assertReachable(url) {
  try {
    await withClient(url, () => undefined);
  } catch (error) {
    throw new Refusal(`DATABASE_URL names a database that cannot be opened: ${error.message || error.code}`);
  }
}

/** Makes the database unless it exists. @param {string} adminUrl any database of the server @param {string} name */
export async function ensureDatabase(adminUrl, name) {
  await withClient(adminUrl, async (client) => {
    if (await exists(client, name)) return;
    try {
      await client.query(`create database ${quoted(name)}`);
    } catch (error) {
      if (error.code !== DUPLICATE_DATABASE) throw error;
    }
  });
}

/** Whether the server has that database. @param {string} adminUrl @param {string} name */
export async function databaseExists(adminUrl, name) {
  return withClient(adminUrl, (client) => exists(client, name));
}

/** Copies a database to which nobody is connected. @param {string} adminUrl @param {string} template @param {string} name */
export async function cloneDatabase(adminUrl, template, name) {
  await withClient(adminUrl, (client) =>
    client.query(`create database ${quoted(name)} template ${quoted(template)} strategy wal_log`),
  );
}

/** @param {string} adminUrl @param {string} from @param {string} to */
export async function renameDatabase(adminUrl, from, to) {
  await withClient(adminUrl, (client) =>
    client.query(`alter database ${quoted(from)} rename to ${quoted(to)}`),
  );
}

/** Removes a database whoever is connected to it. @param {string} adminUrl @param {string} name */
export async function dropDatabase(adminUrl, name) {
  await withClient(adminUrl, (client) =>
    client.query(`drop database if exists ${quoted(name)} with (force)`),
  );
}

/** Names of the databases that begin with a prefix. @param {string} adminUrl @param {string} prefix @returns {Promise<string[]>} */
export async function databasesNamed(adminUrl, prefix) {
  return withClient(adminUrl, async (client) => {
    const { rows } = await client.query('select datname from pg_database where starts_with(datname, $1)', [
      prefix,
    ]);
    return rows.map((row) => row.datname);
  });
}

/** The same server, another database. @param {string} url @param {string} name */
export function withDatabase(url, name) {
  const changed = new URL(url);
  changed.pathname = `/${name}`;
  return changed.href;
}

async function exists(client, name) {
  const { rowCount } = await client.query('select 1 from pg_database where datname = $1', [name]);
  return rowCount > 0;
}

async function withClient(url, work) {
  const client = await connect(url);
  try {
    return await work(client);
  } finally {
    await client.end();
  }
}

/** A server that recovers from a crash accepts the connection but asks for patience. */
async function connect(url) {
  // Loaded here and not above: this file is read before the packages are installed.
  const { default: pg } = await import('pg');
  const deadline = Date.now() + PATIENCE_MS;
  for (;;) {
    const client = new pg.Client({ connectionString: url });
    try {
      await client.connect();
      return client;
    } catch (error) {
      if (error.code !== STARTING_UP || Date.now() > deadline) throw error;
      await sleep(200);
    }
  }
}

function quoted(name) {
  return `"${name.replaceAll('"', '""')}"`;
}
