import { spawn } from 'node:child_process';
import { closeSync, openSync, readFileSync } from 'node:fs';
import { Refusal } from './say.mjs';

/**
 * Runs a command to its end.
 * @param {string} command
 * @param {string[]} args
 * @param {import('node:child_process').SpawnOptions & { signal?: AbortSignal }} [options]
 * @returns {Promise<number>} its exit code; 128 when a signal ended it
 */
export function run(command, args, options = {}) {
  return new Promise((resolve, reject) => {
    const child = spawn(command, args, { stdio: 'inherit', ...options });
    child.once('error', reject);
    child.once('exit', (code) => resolve(code ?? 128));
  });
}

/**
 * Runs a command whose output is of interest only if it fails: kept in a file, the end of it shown then.
 * @param {string} what named in the message, such as "Building the application"
 * @param {string} logFile
 * @param {string} command
 * @param {string[]} args
 * @param {import('node:child_process').SpawnOptions & { signal?: AbortSignal }} [options]
 */
export async function runQuietly(what, logFile, command, args, options = {}) {
  const log = openSync(logFile, 'w', 0o600);
  let code;
  try {
    code = await run(command, args, { ...options, stdio: ['ignore', log, log] });
  } finally {
    closeSync(log);
  }
  if (code !== 0)
    throw new Refusal(`${endOf(logFile)}\n${what} failed (exit code ${code}). Full output: ${logFile}`, 1);
}

/** The last lines of a file. @param {string} file @param {number} [lines] */
export function endOf(file, lines = 40) {
  try {
    return readFileSync(file, 'utf8').trimEnd().split('\n').slice(-lines).join('\n');
  } catch {
    return '';
  }
}
