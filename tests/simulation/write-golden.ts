/**
 * `node --import tsx tests/simulation/write-golden.ts`: works the golden years again and keeps their sums, once the
 * engine has a new version. Inputs stay as they are in golden.json; without that file they are made anew.
 */
import { existsSync, readFileSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { collectorByCover } from '@/data/collectors/generic';
import { demonstration } from '@/data/demonstration/larkspur-house';
import { designFileSchema, type DesignFile } from '@/lib/schemas/design-file';
import { ENGINE_VERSION } from '@/lib/simulation/engine-version';
import { workGolden, type Golden } from './golden-runs';

const FILE = path.join(import.meta.dirname, 'golden.json');

type Inputs = Omit<Golden['runs'][number], 'sums'>;

/** Four designs that differ in climate, cover, layout, exchanger, backup and hours of comfort. */
function newInputs(): Inputs[] {
  const { house, prices, designs } = demonstration;
  const [film, twinWall, factory] = designs;
  const make = (name: string, climateId: string, changes: Partial<DesignFile>): Inputs => ({
    name,
    climateId,
    file: designFileSchema.parse({ house, prices, design: film, ...changes }),
  });
  const cold = { ...house, setback: { ...house.setback, on: true } };
  return [
    make('film rows in winter, upland', 'upland-u46', {}),
    make('twin-wall rows all year, lowland', 'lowland-l52', { design: twinWall }),
    make('factory plates through a vessel, upland', 'upland-u46', {
      design: { ...factory, loop: { ...factory.loop, layout: 'vessel with exchanger' } },
      house: { ...cold, hotWater: { ...house.hotWater, exchanger: 'coil' } },
    }),
    make('glass straight to the slab beside a heat pump, lowland', 'lowland-l52', {
      design: {
        ...film,
        collector: collectorByCover.glass,
        loop: { ...film.loop, layout: 'straight to the slab' },
      },
      house: { ...house, backup: { ...house.backup, fuel: 'heat pump' } },
    }),
  ];
}

const kept = existsSync(FILE) ? (JSON.parse(readFileSync(FILE, 'utf8')) as Golden) : undefined;

if (kept?.engineVersion === ENGINE_VERSION) {
  process.stderr.write(
    `The golden years are those of engine ${ENGINE_VERSION}. Results that move need a new version and its line in lib/method/changes.ts first.\n`,
  );
  process.exitCode = 1;
} else {
  const runs = (kept?.runs ?? newInputs()).map(({ name, climateId, file }) => ({
    name,
    climateId,
    file,
    sums: workGolden({ climateId, file: designFileSchema.parse(file) }),
  }));
  const golden: Golden = { engineVersion: ENGINE_VERSION, runs };
  writeFileSync(FILE, `${JSON.stringify(golden, null, 2)}\n`);
  process.stdout.write(`Wrote ${runs.length} golden years of engine ${ENGINE_VERSION}.\n`);
}
