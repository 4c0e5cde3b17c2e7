import fc from 'fast-check';
import { climates } from '@/data/climates/climates';
import { designFileSchema } from '@/lib/schemas/design-file';
import { designSchema, type DesignRecord } from '@/lib/schemas/design';
import { houseSchema, type HouseRecord } from '@/lib/schemas/house';
import { createSimulator, type SimulationInput } from '@/lib/simulation/simulate';
import type { YearResult } from '@/lib/simulation/results';
import { schemaArbitrary } from './schema-arbitrary';

/** `PROPERTY_RUNS=2000` looks deeper, `PROPERTY_SEED` elsewhere; both are printed with a counter-example. */
export const RUNS = Number(process.env.PROPERTY_RUNS ?? 200);
const SEED = Number(process.env.PROPERTY_SEED ?? 20_261_201);
/** Simplifying means running a year for each idea: this long and no longer. */
const SIMPLIFY_MS = 30_000;
/** Whole years are run: the suite may take as long as it is asked to. */
export const PATIENCE_MS = 60_000 + RUNS * 3000;

const years = new Map(climates.map((climate) => [climate.id, climate.weatherYear()]));
const simulator = createSimulator();

/** A house, a design for it and a shipped climate. */
export interface AnyDesign {
  climateId: string;
  house: HouseRecord;
  design: DesignRecord;
}

/** Any house and any design that their schemas allow. */
export const anyDesign: fc.Arbitrary<AnyDesign> = fc.record({
  climateId: fc.constantFrom(...years.keys()),
  house: schemaArbitrary(houseSchema) as fc.Arbitrary<HouseRecord>,
  design: schemaArbitrary(designSchema) as fc.Arbitrary<DesignRecord>,
});

export function inputOf({ climateId, house, design }: AnyDesign): SimulationInput {
  return { weather: years.get(climateId)!, house, design, numerics: { theta: 0.5, skyModel: 'hdkr' } };
}

/** The year of a design; undefined where the engine refuses it in words. */
export function yearOf(drawn: AnyDesign): YearResult | undefined {
  const outcome = simulator.run(inputOf(drawn));
  if (outcome.ok) return outcome.result;
  // a house that loses next to nothing may overheat beyond all bounds; what is no number at all is a fault of the engine
  if (outcome.message.includes('no number °C')) throw new Error(outcome.message);
  return undefined;
}

/** Puts the file that repeats a counter-example into the words of the failure. */
function reproduction(drawn: AnyDesign): string {
  const { climateId, house, design } = drawn;
  const file = designFileSchema.parse({ house, design, prices: {} });
  return [
    `Save the next line as design.json and run: npm run --silent simulate -- design.json ${climateId}`,
    JSON.stringify(file),
  ].join('\n');
}

/**
 * Runs a check over random designs with a fixed seed; a counter-example is then simplified for a while.
 * @param runs number of designs
 * @param designs how they are drawn
 * @param check throws where the design breaks the rule
 * @throws words of the failure, seed and the simplified design file
 */
export function forDesigns(
  runs: number,
  designs: fc.Arbitrary<AnyDesign>,
  check: (drawn: AnyDesign) => void,
) {
  const property = fc.property(designs, check);
  const numRuns = Math.max(1, Math.round(runs));
  const first = fc.check(property, { numRuns, seed: SEED, endOnFailure: true });
  if (!first.failed) return;
  const details = fc.check(property, {
    numRuns: 1,
    seed: SEED,
    path: first.counterexamplePath ?? '',
    interruptAfterTimeLimit: SIMPLIFY_MS,
  });
  const { counterexample, errorInstance, numShrinks } = details.counterexample ? details : first;
  const cause = errorInstance instanceof Error ? errorInstance.message : 'no error';
  throw new Error(
    [
      cause,
      `seed ${SEED}, design ${first.numRuns}, ${numShrinks} simplifications`,
      reproduction(counterexample![0]),
    ].join('\n'),
  );
}
