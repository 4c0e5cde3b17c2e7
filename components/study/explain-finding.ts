import type { Finding } from '@/lib/checks/findings';
import { dryModelSchema } from '@/lib/schemas/collector';
import type { CollectorRecord } from '@/lib/schemas/collector';
import { OF_SECOND_FIELD } from '@/lib/simulation/built-fields';
import type { PartDryness } from '@/lib/simulation/results';
import type { StudyAnswer } from '@/lib/study/study-question';
import { formatFixed, withUnit } from '@/lib/units/display';
import { enteredInput, equationLink } from './explanation';
import type { ExplainedInput, Explanation } from './explanation';

const celsius = (value: number) => withUnit(formatFixed(value), '°C');
const hours = (value: number) => withUnit(formatFixed(value), 'h');

/** Opens a finding of the checks: for an empty collector its temperature, for others the rule and its source. */
export function explainFinding(finding: Finding, { design, result }: StudyAnswer): Explanation {
  const rule = {
    text: `Check ${finding.id}`,
    href: `/method/checks#rule-${finding.id.replaceAll(' ', '-')}`,
  };
  const part = result.dryParts.find(({ name, material }) => finding.text.includes(`${name} (${material})`));
  const second = part?.name.endsWith(OF_SECOND_FIELD) ? design.second : null;
  if (part) return explainDry(part, finding, (second ?? design).collector, rule);
  return {
    title: `Check ${finding.id}`,
    value: finding.severity,
    equation: 'a rule with its limit, read against this year',
    inputs: [{ name: 'to be mended at', value: finding.where }],
    source: `Source of the limit: ${finding.source}.`,
    method: [rule],
  };
}

function explainDry(
  part: PartDryness,
  finding: Finding,
  collector: CollectorRecord,
  rule: Explanation['method'][number],
): Explanation {
  const declared = collector.dry.kind === 'declared';
  return {
    title: `Empty: ${part.name}`,
    value: celsius(part.hottestC),
    equation: declared
      ? 'curve with its losses scaled to the declared stagnation temperature, solved for zero power at the sun and air of the hour'
      : 'steady balance of absorber and cover without water: sun absorbed = loss through cover, back and edges',
    inputs: [
      { name: 'bears for short times', value: celsius(part.shortTermLimitC) },
      { name: 'bears for years', value: celsius(part.longTermLimitC) },
      { name: 'hours above the short limit', value: hours(part.hoursAboveShort) },
      { name: 'hours above the lasting limit', value: hours(part.hoursAboveLong) },
    ],
    entered: dryInputs(collector),
    source: `Limit: ${finding.source}. Every mounted hour is judged, pump or no pump.`,
    method: [
      declared
        ? equationLink('From a declared stagnation', 'dry-temperature', 'dryYearFromDeclared')
        : equationLink('Balance of the empty collector', 'dry-temperature', 'dryYear'),
      equationLink('Hours above a limit', 'dry-temperature', 'countLimitHours'),
      rule,
    ],
  };
}

function dryInputs({ dry, origin }: CollectorRecord): ExplainedInput[] {
  const [balance, declared] = dryModelSchema.options;
  const known = (input: ExplainedInput): ExplainedInput =>
    input.origin === 'typed' && origin === 'certificate' ? { ...input, origin: 'certificate' } : input;
  if (dry.kind === 'declared') {
    return [known(enteredInput(declared.shape.stagnationC, dry.stagnationC))];
  }
  const { tauAlpha, absorberEmittance, coverLongwaveTransmittance, gapMm, backLossWPerM2K } = balance.shape;
  return [
    enteredInput(tauAlpha, dry.tauAlpha),
    enteredInput(absorberEmittance, dry.absorberEmittance),
    enteredInput(coverLongwaveTransmittance, dry.coverLongwaveTransmittance),
    enteredInput(gapMm, dry.gapMm),
    enteredInput(backLossWPerM2K, dry.backLossWPerM2K),
  ].map(known);
}
