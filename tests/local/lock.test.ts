import { spawnSync } from 'node:child_process';
import { mkdtempSync, readFileSync, existsSync, writeFileSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { describe, expect, it } from 'vitest';
import { enterHolder, leaveHolder, livingHolders } from '@/db/local/holders.mjs';
import { withLock } from '@/db/local/lock.mjs';
import { identityOf, isAlive } from '@/db/local/process-identity.mjs';

const folder = () => mkdtempSync(path.join(os.tmpdir(), 'tepidarium-lock-'));

/** The number of a process that has just ended. */
function deadPid(): number {
  return spawnSync(process.execPath, ['-e', '']).pid;
}

describe('identityOf', () => {
  it('knows this process and no dead one', () => {
    expect(isAlive(identityOf(process.pid)!)).toBe(true);
    expect(identityOf(deadPid())).toBeUndefined();
  });

  it('does not take a process for an older one of the same number', () => {
    expect(isAlive(`${process.pid}-1`)).toBe(false);
  });
});

describe('withLock', () => {
  it('lets one in at a time', async () => {
    const file = path.join(folder(), 'lock');
    let inside = 0;
    let most = 0;
    const work = async () => {
      inside += 1;
      most = Math.max(most, inside);
      await new Promise((resolve) => setTimeout(resolve, 20));
      inside -= 1;
    };
    await Promise.all([1, 2, 3, 4].map(() => withLock(file, work)));
    expect(most).toBe(1);
    expect(existsSync(file)).toBe(false);
  });

  it('takes over the lock of a dead process', async () => {
    const file = path.join(folder(), 'lock');
    writeFileSync(file, `${deadPid()}-123`);
    const holder = await withLock(file, () => Promise.resolve(readFileSync(file, 'utf8')), {
      timeoutMs: 2000,
    });
    expect(holder).toBe(identityOf(process.pid));
  });

  it('refuses in words when a living process keeps it', async () => {
    const file = path.join(folder(), 'lock');
    writeFileSync(file, identityOf(process.pid)!);
    const work = () => Promise.resolve();
    await expect(withLock(file, work, { timeoutMs: 200 })).rejects.toThrow('End it, then try again');
  });

  it('opens again after a failure inside', async () => {
    const file = path.join(folder(), 'lock');
    await expect(withLock(file, () => Promise.reject(new Error('broken')))).rejects.toThrow('broken');
    await expect(withLock(file, () => Promise.resolve(1))).resolves.toBe(1);
  });
});

describe('holders', () => {
  it('forgets the dead and counts the living', () => {
    const holders = path.join(folder(), 'holders');
    expect(livingHolders(holders)).toEqual([]);
    enterHolder(holders);
    writeFileSync(path.join(holders, `${deadPid()}-5`), '');
    expect(livingHolders(holders)).toEqual([identityOf(process.pid)]);
    leaveHolder(holders);
    expect(livingHolders(holders)).toEqual([]);
  });
});
