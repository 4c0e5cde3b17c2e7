/**
 * The same engine from the command line:
 *
 *   npm run --silent simulate -- design.json weather.epw [--columns] [--repair]
 *   npm run --silent simulate -- design.json upland-u46    with a climate that ships with the application
 *   npm run --silent simulate -- --example        a design file to start from
 *   npm run --silent simulate -- --schema         the JSON Schema of design files
 *
 * Prints one JSON object; errors go to standard error with exit code 1.
 */
import { createHash } from 'node:crypto';
import { readFileSync } from 'node:fs';
import { z } from 'zod';
import { climateYear } from '@/data/climates/climates';
import { demonstration } from '@/data/demonstration/larkspur-house';
import { findings } from '@/lib/checks/findings';
import { designCost } from '@/lib/economics/design-cost';
import { designFileSchema, type DesignFile } from '@/lib/schemas/design-file';
import { planeSums } from '@/lib/simulation/plane-sums';
import { createSimulator } from '@/lib/simulation/simulate';
import { readWeather } from '@/lib/weather/read-weather';
import type { WeatherYear } from '@/lib/weather/weather-year';

const USAGE =
  'Usage: npm run simulate -- design.json weather-file|climate [--columns] [--repair] | --example | --schema';

function fail(message: string): never {
  process.stderr.write(`${message}\n`);
  process.exit(1);
}

function print(value: unknown): void {
  process.stdout.write(`${JSON.stringify(value, null, 2)}\n`);
}

function readFile(path: string): Buffer {
  try {
    return readFileSync(path);
  } catch {
    return fail(`${path} cannot be read. Check the name and the rights of the file.`);
  }
}

function readDesign(path: string): DesignFile {
  let value: unknown;
  try {
    value = JSON.parse(readFile(path).toString('utf8'));
  } catch {
    return fail(`${path} is not JSON. Start from: npm run --silent simulate -- --example`);
  }
  const parsed = designFileSchema.safeParse(value);
  if (parsed.success) return parsed.data;
  const lines = parsed.error.issues.map((issue) => `  ${issue.path.join('.') || 'file'}: ${issue.message}`);
  return fail(`${path} does not fit a design file:\n${lines.join('\n')}`);
}

function readYear(path: string, repair: boolean): WeatherYear {
  const bytes = readFile(path);
  const read = readWeather(bytes, { repair });
  if (!read.ok) {
    const rows = (read.rows ?? []).slice(0, 20).map(({ row, problem }) => `  row ${row}: ${problem}`);
    return fail([`${path}: ${read.message}`, ...rows].join('\n'));
  }
  return { ...read.year, sha256: createHash('sha256').update(bytes).digest('hex') };
}

const args = process.argv.slice(2);
const flags = new Set(args.filter((arg) => arg.startsWith('--')));
const [designPath, weatherPath] = args.filter((arg) => !arg.startsWith('--'));

if (flags.has('--schema')) print(z.toJSONSchema(designFileSchema, { io: 'input' }));
else if (flags.has('--example')) {
  const { house, prices, designs } = demonstration;
  print(designFileSchema.parse({ house, prices, design: designs[0] }));
} else {
  if (!designPath || !weatherPath) fail(USAGE);
  const file = readDesign(designPath);
  const weather = climateYear(weatherPath) ?? readYear(weatherPath, flags.has('--repair'));
  const outcome = createSimulator().run({ weather, ...file });
  if (!outcome.ok) fail(outcome.message);
  const { columns, ...result } = outcome.result;
  const asList = (column: ArrayLike<number>) =>
    Array.from(column, (value) => (Number.isFinite(value) ? value : null));
  print({
    design: file.design.name,
    weather: {
      name: weather.name,
      source: weather.source,
      sha256: weather.sha256,
      sunShiftH: weather.sunShiftH,
      notes: weather.notes,
    },
    planeSums: planeSums(weather, file.design.array, {
      horizon: file.house.horizon,
      rows: file.design.array,
    }),
    ...result,
    cost: designCost(file.design, file.prices, outcome.result),
    findings: findings({ house: file.house, design: file.design, result: outcome.result }),
    ...(flags.has('--columns') && {
      columns: Object.fromEntries(Object.entries(columns).map(([name, column]) => [name, asList(column)])),
    }),
  });
}
