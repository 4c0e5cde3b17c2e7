import './node-version.mjs';
import { clusterStatus, holdCluster, stopCluster } from './cluster.mjs';
import { ensureDatabase } from './databases.mjs';
import { Refusal, say } from './say.mjs';
import { newPassword } from './schema.mjs';

const DATABASE = 'tepidarium';

/** What `npm run db -- <command>` can do with the project's own PostgreSQL. */
const COMMANDS = {
  /** Starts it and leaves it running. */
  async start() {
    const cluster = await holdCluster({ install: true });
    await ensureDatabase(cluster.url('postgres'), DATABASE);
    say(cluster.url(DATABASE));
  },
  async stop() {
    await stopCluster();
    say('PostgreSQL is stopped.');
  },
  async status() {
    const status = await clusterStatus();
    if (status === undefined) throw new Refusal('PostgreSQL does not run.', 1);
    say(
      `PostgreSQL answers on 127.0.0.1:${status.port}; data in ${status.folder}; used by ${status.holders.length} process(es).`,
    );
  },
  /** Gives the owner a new password, for whoever lost the one that the first start printed. */
  async password() {
    const cluster = process.env.DATABASE_URL ? undefined : await holdCluster({ install: false });
    try {
      await newPassword(process.env.DATABASE_URL ?? cluster.url(DATABASE));
    } finally {
      await cluster?.release();
    }
  },
  async url() {
    const status = await clusterStatus();
    if (status === undefined) throw new Refusal('PostgreSQL does not run: npm run db -- start', 1);
    say(status.url);
  },
};

const command = COMMANDS[process.argv[2] ?? ''];

(command?.() ?? Promise.reject(new Refusal(`Say one of: ${Object.keys(COMMANDS).join(', ')}`, 2))).catch(
  (error) => {
    process.stderr.write(`${error instanceof Refusal ? error.message : error.stack}\n`);
    process.exitCode = error.exitCode ?? 1;
  },
);
