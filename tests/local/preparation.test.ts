import { mkdirSync, mkdtempSync, utimesSync, writeFileSync } from 'node:fs';
import net from 'node:net';
import os from 'node:os';
import path from 'node:path';
import { describe, expect, it } from 'vitest';
import { hashOfSources } from '@/db/local/build.mjs';
import { sameVersions } from '@/db/local/packages.mjs';
import { answers, nextFreePort } from '@/db/local/ports.mjs';
import { inWords, counts, sum, vitestCounts } from '@/tests/counts.mjs';

describe('hashOfSources', () => {
  const folder = mkdtempSync(path.join(os.tmpdir(), 'tepidarium-hash-'));
  mkdirSync(path.join(folder, 'app'));
  const file = path.join(folder, 'app/page.tsx');
  const hash = () => hashOfSources(folder, ['app', 'missing.ts']);

  it('follows contents and names, not dates', () => {
    writeFileSync(file, 'one');
    const first = hash();
    utimesSync(file, 1, 1);
    expect(hash()).toBe(first);
    writeFileSync(file, 'two');
    const second = hash();
    expect(second).not.toBe(first);
    writeFileSync(path.join(folder, 'app/other.tsx'), '');
    expect(hash()).not.toBe(second);
  });
});

describe('sameVersions', () => {
  const lock = {
    packages: {
      '': {},
      'node_modules/a': { version: '1.0.0' },
      'node_modules/elsewhere': { version: '2.0.0', optional: true },
    },
  };

  it('accepts what is installed as asked, without packages for other machines', () => {
    expect(sameVersions(lock, { packages: { 'node_modules/a': { version: '1.0.0' } } })).toBe(true);
  });

  it('sees a missing and a different version', () => {
    expect(sameVersions(lock, { packages: {} })).toBe(false);
    expect(sameVersions(lock, { packages: { 'node_modules/a': { version: '1.0.1' } } })).toBe(false);
  });
});

describe('ports', () => {
  it('passes by a port that is taken', async () => {
    const server = net.createServer();
    await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
    const taken = (server.address() as net.AddressInfo).port;
    expect(await answers(taken)).toBe(true);
    expect(await nextFreePort(taken)).toBeGreaterThan(taken);
    await new Promise((resolve) => server.close(resolve));
    expect(await answers(taken)).toBe(false);
  });
});

describe('counts of tests', () => {
  it('are added up and said', () => {
    expect(inWords(sum([counts(3, 1), counts(2, 0)]))).toBe('5 passed, 1 failed');
    expect(inWords(counts(2, 0, 4))).toBe('2 passed, 0 failed, 4 skipped');
  });

  it('take a file that broke before its tests, a lost report and a silent failure for failures', () => {
    const file = path.join(mkdtempSync(path.join(os.tmpdir(), 'tepidarium-counts-')), 'report.json');
    expect(vitestCounts(file, 0)).toEqual(counts(0, 1));
    const numbers = { numPassedTests: 5, numFailedTests: 0, numPendingTests: 1, numTodoTests: 0 };
    writeFileSync(
      file,
      JSON.stringify({ ...numbers, testResults: [{ status: 'failed', assertionResults: [] }] }),
    );
    expect(vitestCounts(file, 1)).toEqual(counts(5, 1, 1));
    writeFileSync(file, JSON.stringify({ ...numbers, testResults: [] }));
    expect(vitestCounts(file, 1)).toEqual(counts(5, 1, 1));
    expect(vitestCounts(file, 0)).toEqual(counts(5, 0, 1));
  });
});
