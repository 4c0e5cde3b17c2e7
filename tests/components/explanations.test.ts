import { describe, expect, it } from 'vitest';
import { explainBalance, explainCost, explainFraction } from '@/components/study/explain-figures';
import { explainFinding } from '@/components/study/explain-finding';
import { explainMonth } from '@/components/study/explain-month';
import type { Explanation } from '@/components/study/explanation';
import { explain } from '@/components/study/how-computed';
import { climateYear } from '@/data/climates/climates';
import { demonstration } from '@/data/demonstration/larkspur-house';
import { findings } from '@/lib/checks/findings';
import { RULES } from '@/lib/checks/rules';
import { designCost } from '@/lib/economics/design-cost';
import { methodPages } from '@/lib/method/method-page';
import { createSimulator } from '@/lib/simulation/simulate';
import type { StudyAnswer } from '@/lib/study/study-question';

const { house, prices } = demonstration;
const weather = climateYear(demonstration.climateId)!;
const simulator = createSimulator();

const answers: StudyAnswer[] = demonstration.designs.map((design) => {
  const outcome = simulator.run({ weather, house, design, numerics: { theta: 0.5, skyModel: 'hdkr' } });
  if (!outcome.ok) throw new Error(outcome.message);
  const { result } = outcome;
  return {
    design,
    result,
    cost: designCost(design, prices, result),
    findings: findings({ house, design, result }),
  };
});

/** Every number that a study of the answer can open. */
function explanationsOf(answer: StudyAnswer): Explanation[] {
  return [
    ...(['area', 'share', 'price', 'fuel', 'reference'] as const).map((name) =>
      explain(name, answer, house, prices),
    ),
    ...(['solar', 'savedThermal', 'savedExtended'] as const).map((name) => explainFraction(name, answer)),
    ...(
      ['arraySun', 'arrayLoss', 'pipeLoss', 'storeLoss', 'given', 'unused', 'pump', 'residual'] as const
    ).map((name) => explainBalance(name, answer, '1 kWh')),
    ...(['toBuild', 'backupHeat', 'perKwh', 'perSavedKwh'] as const).map((name) =>
      explainCost(name, answer, prices),
    ),
    ...Array.from({ length: 12 }, (_, month) => explainMonth(month, answer.result)),
    ...answer.findings.map((finding) => explainFinding(finding, answer)),
  ];
}

const explanations = answers.flatMap(explanationsOf);

/** Every address below /method that has something to show. */
const addresses = new Set([
  '/validation',
  '/method/choices',
  ...methodPages().flatMap(({ topic, files }) =>
    files.flatMap(({ entries }) => entries.map(({ name }) => `/method/${topic.id}#${name}`)),
  ),
  ...RULES.map(({ id }) => `/method/checks#rule-${id.replaceAll(' ', '-')}`),
]);

describe('how a number was computed', () => {
  it('leads to equations that stand on the method pages', () => {
    const hrefs = [...new Set(explanations.flatMap(({ method }) => method.map(({ href }) => href)))];
    expect(hrefs.length).toBeGreaterThan(12);
    expect(hrefs.filter((href) => !addresses.has(href))).toEqual([]);
  });

  it('names value, equation, inputs, source and at least one place to read on', () => {
    for (const { title, value, equation, inputs, source, method } of explanations) {
      expect(value, title).not.toMatch(/^$|NaN|undefined|–/);
      expect(equation.length, title).toBeGreaterThan(10);
      expect(inputs.length, title).toBeGreaterThan(0);
      expect(source.length, title).toBeGreaterThan(10);
      expect(method.length, title).toBeGreaterThan(0);
    }
  });

  it('gives each entered number its origin, and the default its source', () => {
    const entered = explanations.flatMap((one) => one.entered ?? []);
    expect(entered.length).toBeGreaterThan(50);
    expect(entered.filter(({ origin }) => origin === undefined)).toEqual([]);
    expect(entered.filter(({ origin, source }) => origin !== 'typed' && !source)).toEqual([]);
  });

  it('calls a number typed once it is not the default', () => {
    const [answer] = answers;
    const design = { ...answer!.design, store: { ...answer!.design.store, volumeL: 1234 } };
    const store = explain('share', { ...answer!, design }, house, prices).entered?.find(
      ({ name }) => name === 'Store volume',
    );
    expect(store).toMatchObject({ origin: 'typed', value: '1\u202f234\u00a0L' });
    expect(store?.source).toBeUndefined();
  });
});
