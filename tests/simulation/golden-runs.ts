import { climateYear } from '@/data/climates/climates';
import type { DesignFile } from '@/lib/schemas/design-file';
import type { YearResult } from '@/lib/simulation/results';
import { createSimulator } from '@/lib/simulation/simulate';

/** A year whose inputs are frozen beside its sums, so that neither new defaults nor a new demonstration move it. */
export interface GoldenRun {
  name: string;
  climateId: string;
  file: DesignFile;
  sums: Record<string, number>;
}

export interface Golden {
  engineVersion: string;
  runs: GoldenRun[];
}

/** Sums of the year that are booked in double precision [kWh, h, -]. */
export function goldenSums({ year, months, balance }: YearResult): Record<string, number> {
  const rowSums = (row: (typeof months)[number]) => ({
    heatingKwh: row.heatingKwh,
    tapKwh: row.tapKwh,
    solarHeatingKwh: row.solarHeatingKwh,
    solarTapKwh: row.solarTapKwh,
    backupHeatingKwh: row.backupHeatingKwh,
    backupTapKwh: row.backupTapKwh,
    unmetKwh: row.unmetKwh,
    collectedKwh: row.collectedKwh,
    planeKwh: row.planeKwh,
    storeLossKwh: row.storeLossKwh,
    pipeLossKwh: row.pipeLossKwh,
    pumpKwh: row.pumpKwh,
    unusedKwh: row.unusedKwh,
  });
  const groups: Record<string, object> = {
    year: rowSums(year),
    january: rowSums(months[0]!),
    july: rowSums(months[6]!),
    fractions: year.fractions,
    bought: { boughtKwh: year.boughtKwh, reference: year.referenceBoughtKwh, need: year.referenceNeedKwh },
    in: balance.inKwh,
    out: balance.outKwh,
    stored: balance.storedKwh,
  };
  return Object.fromEntries(
    Object.entries(groups).flatMap(([group, values]) =>
      Object.entries(values).map(([name, value]) => [`${group}.${name}`, Number(value)]),
    ),
  );
}

/** Works a frozen year with the present engine. */
export function workGolden({
  climateId,
  file,
}: Pick<GoldenRun, 'climateId' | 'file'>): Record<string, number> {
  const weather = climateYear(climateId);
  if (!weather) throw new Error(`There is no climate ${climateId}.`);
  const outcome = createSimulator().run({ weather, ...file });
  if (!outcome.ok) throw new Error(outcome.message);
  return goldenSums(outcome.result);
}
