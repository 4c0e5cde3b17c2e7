import type { Design, House } from '@/lib/simulation/design';
import type { YearResult } from '@/lib/simulation/results';
import { RULES, type Severity, type Where } from './rules';

/** What a check reads. */
export interface CheckSubject {
  house: House;
  design: Design;
  result: Pick<YearResult, 'year' | 'balance' | 'dryParts' | 'synthetic' | 'weatherName'>;
}

/** A check that has something to say. */
export interface Finding {
  id: string;
  severity: Severity;
  text: string;
  where: Where;
  source: string;
}

const ORDER: Record<Severity, number> = { stop: 0, caution: 1, note: 2 };

/**
 * Runs all engineering checks over one result.
 * @param subject house, design and result
 * @returns findings, the gravest first, each with the value, the limit and where to mend it
 * @see the rule table `rules.ts`, each rule with its source
 */
export function findings(subject: CheckSubject): Finding[] {
  const found: Finding[] = [];
  for (const rule of RULES) {
    for (const text of rule.judge(subject)) {
      found.push({ id: rule.id, severity: rule.severity, text, where: rule.where, source: rule.source });
    }
  }
  return found.sort((a, b) => ORDER[a.severity] - ORDER[b.severity]);
}
