import { existsSync } from 'node:fs';
import { runQuietly } from './child.mjs';
import { localPath } from './paths.mjs';
import { Refusal, say } from './say.mjs';

/**
 * Installs Debian packages, as root only, announced one line before.
 * @param {string} name what the packages are, in a word: "PostgreSQL"
 * @param {string[]} packages
 * @param {{ allowed: boolean, otherwise?: string, signal?: AbortSignal }} options
 *   `otherwise`: another way out for who may not install, added to the refusal
 */
export async function installDebianPackages(name, packages, { allowed, otherwise = '', signal }) {
  const root = process.getuid?.() === 0;
  if (!allowed || !root || !existsSync('/usr/bin/apt-get')) {
    const why = !allowed ? ' and --no-install forbids installing it' : '';
    throw new Refusal(
      `${name} is not installed${why}. Install it with: ${root ? '' : 'sudo '}apt-get install ${packages.join(' ')}${otherwise}`,
    );
  }
  say(
    `${name} is not installed: installing it from Debian's packages (apt-get install ${packages.join(' ')}) …`,
  );
  const options = { signal, env: { ...process.env, DEBIAN_FRONTEND: 'noninteractive', LC_ALL: 'C.UTF-8' } };
  const patience = ['-o', 'DPkg::Lock::Timeout=300'];
  const log = localPath('apt.log');
  await runQuietly('apt-get update', log, 'apt-get', [...patience, 'update'], options);
  const install = [...patience, 'install', '-y', '--no-install-recommends', ...packages];
  await runQuietly(`Installing ${name}`, log, 'apt-get', install, options);
}
