import { spawnSync } from 'node:child_process';
import { createHash } from 'node:crypto';
import { accessSync, chownSync, constants, mkdirSync, readFileSync, statSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { ROOT } from './paths.mjs';
import { Refusal } from './say.mjs';

/**
 * Where the cluster lives and as whom it runs. PostgreSQL refuses to run as root: root runs it as the
 * owner of the data at hand, else as Debian's user "postgres"; everybody else as oneself.
 * @typedef {{ folder: string, data: string, log: string, info: string, lock: string, holders: string,
 *   account: { uid: number, gid: number } | undefined, notice?: string }} ClusterHome
 * @returns {ClusterHome}
 */
export function clusterHome() {
  return process.getuid?.() === 0 ? homeForRoot() : homeForUser();
}

function homeForRoot() {
  const inCheckout = path.join(ROOT, '.postgres');
  const account = ownerOf(path.join(inCheckout, 'data')) ?? debianAccount();
  if (canEnter(ROOT, account)) return layOut(inCheckout, account);
  const elsewhere = path.join('/var/lib/tepidarium', checkoutKey());
  return {
    ...layOut(elsewhere, ownerOf(path.join(elsewhere, 'data')) ?? account),
    notice: `PostgreSQL may not enter this folder, so its data is kept in ${elsewhere}`,
  };
}

function homeForUser() {
  const inCheckout = path.join(ROOT, '.postgres');
  const owner = ownerOf(inCheckout);
  if (owner === undefined ? canWrite(ROOT) : owner.uid === process.getuid?.())
    return layOut(inCheckout, undefined);
  const state = process.env.XDG_STATE_HOME ?? path.join(os.homedir(), '.local/state');
  const elsewhere = path.join(state, 'tepidarium', checkoutKey());
  return {
    ...layOut(elsewhere, undefined),
    notice: `The database in .postgres belongs to another user, so yours is kept in ${elsewhere}`,
  };
}

function layOut(folder, account) {
  mkdirSync(folder, { recursive: true, mode: 0o755 });
  if (account !== undefined) {
    // The folder must let PostgreSQL make its data and its log in it.
    chownSync(folder, account.uid, account.gid);
  }
  const inside = (name) => path.join(folder, name);
  return {
    folder,
    data: inside('data'),
    log: inside('log'),
    info: inside('info.json'),
    lock: inside('lock'),
    holders: inside('holders'),
    account,
  };
}

/** One folder per checkout. */
function checkoutKey() {
  return createHash('sha256').update(ROOT).digest('hex').slice(0, 12);
}

function ownerOf(place) {
  const stat = statSync(place, { throwIfNoEntry: false });
  return stat === undefined ? undefined : { uid: stat.uid, gid: stat.gid };
}

function debianAccount() {
  const line = readFileSync('/etc/passwd', 'utf8')
    .split('\n')
    .find((entry) => entry.startsWith('postgres:'));
  if (line === undefined) {
    throw new Refusal(
      'PostgreSQL does not run as root, and there is no user "postgres" to run it: start as another user.',
    );
  }
  const [, , uid, gid] = line.split(':');
  return { uid: Number(uid), gid: Number(gid) };
}

function canEnter(folder, account) {
  return spawnSync('test', ['-x', folder], { ...account, cwd: '/' }).status === 0;
}

function canWrite(folder) {
  try {
    accessSync(folder, constants.W_OK);
    return true;
  } catch {
    return false;
  }
}
