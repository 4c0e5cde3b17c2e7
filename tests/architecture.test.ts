import { execFile } from 'node:child_process';
import { cpSync, mkdirSync, mkdtempSync, readdirSync, rmSync, symlinkSync, writeFileSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { promisify } from 'node:util';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';

const ROOT = path.resolve(import.meta.dirname, '..');
const ROOMS = ['app', 'components', 'data', 'db', 'lib', 'migrations', 'workers'];
const PATIENCE_MS = 120_000;

/** A gate that sees nothing passes everything: a wrong compiler version does just that, in silence. */
const FEWEST_MODULES = 150;

interface Report {
  modules: { source: string; matchesDoNotFollow?: boolean; coreModule?: boolean }[];
  summary: { violations: { from: string; to: string; rule: { name: string } }[] };
}

/** Runs dependency-cruiser over the rooms of a checkout. */
async function cruise(folder: string): Promise<Report> {
  const program = path.join(ROOT, 'node_modules/dependency-cruiser/bin/dependency-cruise.mjs');
  const args = [program, '--config', '.dependency-cruiser.cjs', '--output-type', 'json', ...ROOMS];
  const options = { cwd: folder, maxBuffer: 256 * 1024 * 1024 };
  const { stdout } = await promisify(execFile)(process.execPath, args, options);
  return JSON.parse(stdout) as Report;
}

describe('the one-way streets', () => {
  let report: Report;

  beforeAll(async () => {
    report = await cruise(ROOT);
  }, PATIENCE_MS);

  it('are seen whole', () => {
    const own = report.modules.filter((module) => ROOMS.includes(module.source.split('/')[0] ?? ''));
    expect(own.length).toBeGreaterThanOrEqual(FEWEST_MODULES);
  });

  it('are kept', () => {
    const violations = report.summary.violations.map(({ rule, from, to }) => `${rule.name}: ${from} → ${to}`);
    expect(violations).toEqual([]);
  });
});

/** [planted file, what it says, the rule that must catch it] */
const PLANTED: [string, string, string][] = [
  ['lib/physics/planted-react.ts', "import 'react';", 'core-no-packages'],
  ['lib/physics/planted-display.ts', "import '@/lib/units/display';", 'physics-knows-only-constants'],
  ['lib/physics/planted-year.ts', "import '@/lib/simulation/year';", 'physics-one-way'],
  ['lib/units/planted-physics.ts', "import '@/lib/physics/water';", 'units-one-way'],
  ['lib/simulation/planted-node.ts', "import 'node:fs';", 'core-no-node'],
  ['lib/simulation/planted-zod.ts', "import { z } from 'zod';\nexport const a = z;", 'core-no-packages'],
  [
    'lib/simulation/planted-schema.ts',
    "import type { A } from '@/lib/schemas/planted-plain';\nexport type B = A;",
    'core-stands-alone',
  ],
  ['lib/simulation/planted-economics.ts', "import '@/lib/economics/planted-plain';", 'simulation-one-way'],
  ['lib/calibration/planted-weather.ts', "import '@/lib/weather/seeded-random';", 'calibration-one-way'],
  ['lib/sun/planted-mathjs.ts', "import 'mathjs';", 'sun-only-suncalc'],
  ['lib/testbench/planted-suncalc.ts', "import 'suncalc';", 'mathjs-only-where-said'],
  ['lib/weather/planted-server.ts', "import '@/lib/server/env';", 'core-stands-alone'],
  ['lib/reference/planted-schema.ts', "import '@/lib/schemas/planted-plain';", 'reference-only-core'],
  ['lib/reference/planted-node.ts', "import 'node:fs';", 'reference-in-browser'],
  ['lib/simulation/planted-row.ts', "import '@/lib/reference/reference-row';", 'core-stands-alone'],
  ['lib/method/planted-vitest.ts', "import 'vitest';", 'no-dev-packages'],
  ['lib/schemas/planted-core.ts', "import '@/lib/simulation/year';", 'schemas-types-of-core-only'],
  ['lib/schemas/planted-db.ts', "import '@/db/client';", 'schemas-low'],
  ['lib/study/planted-component.ts', "import '@/components/logo';", 'lib-below'],
  ['lib/study/planted-next.ts', "import 'next/link';", 'lib-no-framework'],
  ['lib/study/planted-db.ts', "import '@/db/client';", 'lib-no-database'],
  ['lib/study/planted-kysely.ts', "import 'kysely';", 'lib-no-database'],
  ['lib/server/planted-marker.ts', "import '@/app/fonts';", 'lib-below'],
  ['components/planted-server.ts', "import '@/lib/server/env';", 'components-below-app'],
  ['components/planted-app.ts', "import '@/app/fonts';", 'components-below-app'],
  ['app/planted-db.ts', "import '@/db/client';", 'app-not-db'],
  ['app/planted-test.ts', "import '@/tests/planted-test';", 'no-tests-in-product'],
  ['app/planted-vitest.ts', "import 'vitest';", 'no-dev-packages'],
  ['workers/planted-app.ts', "import '@/app/fonts';", 'workers-only-lib'],
  ['workers/planted-component.ts', "import '@/components/logo';", 'workers-only-lib'],
  ['db/planted-server.ts', "import '@/lib/server/env';", 'db-below-server'],
  ['data/planted-app.ts', "import '@/app/fonts';", 'data-low'],
  ['lib/study/planted-nowhere.ts', "import '@/lib/study/nowhere';", 'no-unresolved'],
  ['lib/physics/planted-circle-a.ts', "import './planted-circle-b';", 'no-circle'],
];

const PLANTED_NEIGHBOURS: Record<string, string> = {
  'lib/schemas/planted-plain.ts': 'export type A = 1;',
  'lib/economics/planted-plain.ts': 'export const a = 1;',
  'lib/physics/planted-circle-b.ts': "import './planted-circle-a';",
  'tests/planted-test.ts': 'export const a = 1;',
};

describe('the gate', () => {
  const copy = mkdtempSync(path.join(os.tmpdir(), 'tepidarium-gate-'));
  let caught: Set<string>;

  beforeAll(async () => {
    for (const name of ROOMS) cpSync(path.join(ROOT, name), path.join(copy, name), { recursive: true });
    for (const name of ['.dependency-cruiser.cjs', 'package.json', 'tsconfig.json']) {
      cpSync(path.join(ROOT, name), path.join(copy, name));
    }
    symlinkSync(path.join(ROOT, 'node_modules'), path.join(copy, 'node_modules'));
    const planted = PLANTED.map(([file, text]) => [file, text] as const);
    for (const [file, text] of [...planted, ...Object.entries(PLANTED_NEIGHBOURS)]) {
      mkdirSync(path.join(copy, path.dirname(file)), { recursive: true });
      writeFileSync(path.join(copy, file), `${text}\n`);
    }
    const { summary } = await cruise(copy);
    caught = new Set(summary.violations.map(({ rule, from }) => `${rule.name} in ${from}`));
  }, PATIENCE_MS);

  afterAll(() => rmSync(copy, { recursive: true, force: true }));

  it.each(PLANTED)('catches %s: %s (%s)', (file, _text, rule) => {
    expect(caught).toContain(`${rule} in ${file}`);
  });
});

describe('the top level', () => {
  const EXPECTED = [
    ...ROOMS,
    'public',
    'tests',
    'DEVELOPERS.md',
    'README.md',
    'eslint.config.mjs',
    'instrumentation.ts',
    'next-env.d.ts',
    'next.config.ts',
    'node_modules',
    'package-lock.json',
    'package.json',
    'playwright.config.ts',
    'postcss.config.mjs',
    'proxy.ts',
    'tailwind.config.ts',
    'test-results',
    'tsconfig.json',
    'tsconfig.tsbuildinfo',
    'vitest.config.ts',
  ];

  it('holds the rooms and what tools insist on, nothing else', () => {
    const found = readdirSync(ROOT).filter((name) => !name.startsWith('.'));
    expect(found.filter((name) => !EXPECTED.includes(name))).toEqual([]);
  });
});
