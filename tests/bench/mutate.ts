/**
 * `npm run mutate`: plants faults in a copy of the tree, one at a time, and runs the tests that have to notice. The
 * working tree is never touched. Exits non-zero when a fault survives, when its place is no longer found, or when the
 * tests fail without any fault.
 */
import { spawnSync } from 'node:child_process';
import { cpSync, existsSync, mkdtempSync, readFileSync, rmSync, symlinkSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { fileURLToPath } from 'node:url';
import { plantedFaults, type PlantedFault } from './planted-faults';

const ROOT = fileURLToPath(new URL('../../', import.meta.url));
/** What the tests of the engine need. */
const COPIED = ['lib', 'data', 'tests', 'package.json', 'tsconfig.json', 'vitest.config.ts'];

interface Report {
  numPassedTests: number;
  testResults: { assertionResults: { status: string; fullName: string }[] }[];
}

type Verdict = { passed: number; firstFailed?: string };

/** Runs test files in the copy; a run that breaks before its tests has neither passed nor failed any. */
function runTests(copy: string, { tests, only }: Pick<PlantedFault, 'tests' | 'only'>): Verdict {
  const report = path.join(copy, 'report.json');
  rmSync(report, { force: true });
  const name = only === undefined ? [] : ['-t', only];
  const run = spawnSync(
    path.join(ROOT, 'node_modules/.bin/vitest'),
    ['run', ...tests, ...name, '--reporter=json', `--outputFile=${report}`],
    { cwd: copy, encoding: 'utf8' },
  );
  try {
    const { numPassedTests, testResults } = JSON.parse(readFileSync(report, 'utf8')) as Report;
    const all = testResults.flatMap(({ assertionResults }) => assertionResults);
    const failed = all.find(({ status }) => status === 'failed');
    return { passed: numPassedTests, firstFailed: failed?.fullName };
  } catch {
    throw new Error(`the tests did not run: ${run.stderr}`);
  }
}

/** Plants one fault, runs its tests, takes it out again; says how it went. */
function judge(copy: string, fault: PlantedFault): { caught: boolean; words: string } {
  const file = path.join(copy, fault.file);
  const sound = existsSync(file) ? readFileSync(file, 'utf8') : '';
  const places = sound.split(fault.search).length - 1;
  if (places !== 1) return { caught: false, words: `its text stands ${places} times in ${fault.file}` };
  writeFileSync(
    file,
    sound.replace(fault.search, () => fault.replace),
  );
  try {
    const { firstFailed } = runTests(copy, fault);
    return firstFailed === undefined
      ? { caught: false, words: `survived ${fault.tests.join(', ')}` }
      : { caught: true, words: firstFailed };
  } finally {
    writeFileSync(file, sound);
  }
}

/** Every set of tests that a fault names, without the fault. */
function soundTests(copy: string): string[] {
  const sets = new Map(
    plantedFaults.map(({ tests, only }) => [JSON.stringify([tests, only]), { tests, only }]),
  );
  return [...sets.values()].flatMap((set) => {
    const { passed, firstFailed } = runTests(copy, set);
    if (firstFailed === undefined && passed > 0) return [];
    return [`${set.tests.join(', ')} ${set.only ?? ''}: ${firstFailed ?? 'no test of that name'}`];
  });
}

const copy = mkdtempSync(path.join(tmpdir(), 'planted-faults-'));
process.on('exit', () => rmSync(copy, { recursive: true, force: true }));
for (const signal of ['SIGINT', 'SIGTERM'] as const) process.once(signal, () => process.exit(1));
for (const name of COPIED) cpSync(path.join(ROOT, name), path.join(copy, name), { recursive: true });
symlinkSync(path.join(ROOT, 'node_modules'), path.join(copy, 'node_modules'));

const broken = soundTests(copy);
for (const words of broken) console.info(`fails without any fault: ${words}`);
let survived = 0;
if (broken.length === 0) {
  for (const fault of plantedFaults) {
    const { caught, words } = judge(copy, fault);
    if (!caught) survived++;
    console.info(
      `${caught ? 'caught  ' : 'SURVIVED'}  ${fault.name}\n          ${fault.file}\n          ${words}`,
    );
  }
  console.info(`\n${plantedFaults.length} faults planted, ${survived} survived`);
}
process.exitCode = broken.length > 0 || survived > 0 ? 1 : 0;
