import { checkedRow } from '@/lib/reference/check-row';
import type { CheckedRow } from '@/lib/reference/check-row';
import { referenceRows } from '@/lib/reference/reference-rows';
import { filesOf } from './parse-source';
import { readDocstrings } from './read-docstrings';
import type { MethodEntry, MethodFile } from './read-docstrings';
import { readRowCalls } from './read-row-calls';
import { TOPICS, WITHOUT_EQUATIONS } from './topics';
import type { Topic } from './topics';

/** An entry with the checks that call it. */
export interface CheckedEntry extends MethodEntry {
  /** checks printed here: those that no entry before it has printed */
  checks: CheckedRow[];
  /** numbers of checks printed at an entry before */
  alsoChecked: { id: string; at: string }[];
}

export interface MethodPage {
  topic: Topic;
  files: (Omit<MethodFile, 'entries'> & { entries: CheckedEntry[] })[];
  entryCount: number;
  checkCount: number;
}

/** The files that a page shows: those it names, then what no page names in the room it keeps. */
function filesOfTopic({ files, restOf }: Topic): string[] {
  const present = new Set(TOPICS.flatMap((topic) => (topic.restOf ? filesOf(topic.restOf) : [])));
  const named = new Set([...TOPICS.flatMap((topic) => topic.files), ...WITHOUT_EQUATIONS]);
  const rest = restOf === undefined ? [] : filesOf(restOf).filter((file) => !named.has(file));
  return [...files.filter((file) => present.has(file)), ...rest];
}

/** For each function ("lib/physics/radiator.ts#radiatorFactor") the checks that call it. */
function checksByCall(): Map<string, CheckedRow[]> {
  const calls = filesOf('lib/reference')
    .filter((file) => file.endsWith('-rows.ts'))
    .flatMap(readRowCalls);
  const found = new Map<string, CheckedRow[]>();
  for (const row of referenceRows) {
    const called = new Set(calls.filter(({ id }) => id.test(row.id)).flatMap((one) => one.calls));
    const checked = checkedRow(row);
    for (const call of called) found.set(call, [...(found.get(call) ?? []), checked]);
  }
  return found;
}

/** Quantities, and the steps of the loop over the year; a method without a docstring says nothing. */
function isShown({ purpose, numeric, sources, name, file }: MethodEntry): boolean {
  const isStep = name.includes('.') || file.startsWith('lib/simulation/');
  return purpose !== '' && (numeric || sources.length > 0 || isStep);
}

/**
 * All method pages, written from the docstrings and the checks as they stand.
 * @returns one page per topic with its functions, their sources and the present value of their checks
 */
export function methodPages(): MethodPage[] {
  const checks = checksByCall();
  return TOPICS.map((topic) => {
    const printed = new Map<string, string>();
    const files = filesOfTopic(topic)
      .map(readDocstrings)
      .map((file) => ({
        ...file,
        entries: file.entries.filter(isShown).map((entry) => {
          const own = checks.get(`${entry.file}#${entry.name}`) ?? [];
          const first = own.filter(({ id }) => !printed.has(id));
          const alsoChecked = own.flatMap(({ id }) => {
            const at = printed.get(id);
            return at === undefined ? [] : [{ id, at }];
          });
          for (const { id } of first) printed.set(id, entry.name);
          return { ...entry, checks: first, alsoChecked };
        }),
      }))
      .filter(({ entries, constants, intro }) => entries.length + constants.length > 0 || intro !== '');
    return {
      topic,
      files,
      entryCount: files.reduce((sum, file) => sum + file.entries.length, 0),
      checkCount: printed.size,
    };
  });
}
