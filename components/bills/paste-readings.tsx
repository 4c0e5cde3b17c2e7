'use client';

import { useState } from 'react';
import { useFormContext } from 'react-hook-form';
import { toTyped, type Typed } from '@/components/forms/typed-values';
import type { BillRow } from '@/lib/calibration/bill-row';
import { dayNumber, dayWords } from '@/lib/calibration/day-number';
import {
  readPaste,
  type PasteAnswers,
  type PasteQuestion,
  type ReadPaste,
} from '@/lib/calibration/read-paste';
import { billsSchema } from '@/lib/schemas/bills';
import { formatTyped } from '@/lib/units/display';

const inWords = (iso: string) => dayWords(dayNumber(iso)!);
const readings = (count: number) => (count === 1 ? 'one reading' : `${count} readings`);

function Question({ question, answer }: { question: PasteQuestion; answer(given: PasteAnswers): void }) {
  const [first, second]: { words: string; given: PasteAnswers }[] =
    question.kind === 'order'
      ? [
          { words: inWords(question.dayFirst), given: { order: 'day first' } },
          { words: inWords(question.monthFirst), given: { order: 'month first' } },
        ]
      : [
          { words: formatTyped(question.point), given: { decimal: 'point' } },
          { words: formatTyped(question.comma), given: { decimal: 'comma' } },
        ];
  return (
    <p role="status" className="flex flex-wrap items-baseline gap-x-4 gap-y-2">
      <span>
        Row {question.row}: “{question.text}” can be read in two ways. Is it
      </span>
      {[first!, second!].map(({ words, given }) => (
        <button key={words} type="button" className="framed" onClick={() => answer(given)}>
          {words}
        </button>
      ))}
      <span>The answer goes for all rows.</span>
    </p>
  );
}

interface FoundProps {
  found: Extract<ReadPaste, { kind: 'rows' }>;
  already: number;
  take(rows: readonly BillRow[], replace: boolean): void;
}

function Found({ found: { rows, problems }, already, take }: FoundProps) {
  return (
    <div className="space-y-2">
      <p role="status">
        {rows.length > 0 ? `${readings(rows.length)} found` : 'No reading found'}
        {rows.length > 0 && `, the last of ${inWords(rows.at(-1)!.to)}`}.
      </p>
      <ul className="text-note text-hot-text empty:hidden">
        {problems.slice(0, 12).map(({ row, text }) => (
          <li key={row}>
            Row {row}: {text}
          </li>
        ))}
        {problems.length > 12 && <li>and {problems.length - 12} more rows.</li>}
      </ul>
      {rows.length > 0 && (
        <p className="flex flex-wrap gap-x-4 gap-y-2">
          <button type="button" className="framed" onClick={() => take(rows, false)}>
            {already > 0 ? 'Add them below' : 'Take them'}
          </button>
          {already > 0 && (
            <button type="button" className="framed" onClick={() => take(rows, true)}>
              Put them in place of the {already} that are there
            </button>
          )}
        </p>
      )}
    </div>
  );
}

/** Takes rows from a spreadsheet: what is ambiguous is asked, what cannot be read is named by its row. */
export function PasteReadings({ meter }: { meter: boolean }) {
  const { getValues, setValue, trigger } = useFormContext();
  const [text, setText] = useState('');
  const [answers, setAnswers] = useState<PasteAnswers>({});
  const [taken, setTaken] = useState<{ count: number; before: Typed[] }>();
  const found = text.trim() === '' ? undefined : readPaste(text, meter, answers);
  const already = (getValues('rows') as Typed[]).length;

  function lay(rows: Typed[]) {
    setValue('rows', rows, { shouldDirty: true });
    void trigger('rows');
  }

  function take(rows: readonly BillRow[], replace: boolean) {
    const before = getValues('rows') as Typed[];
    const typed = rows.map((row) => toTyped(billsSchema.shape.rows.unwrap().element, row));
    lay(replace ? typed : [...before, ...typed]);
    setTaken({ count: rows.length, before });
    setText('');
    setAnswers({});
  }

  return (
    <details>
      <summary className="inline-flex min-h-7 items-center underline underline-offset-4 pointer-coarse:min-h-11">
        Paste from a spreadsheet
      </summary>
      <div className="mt-2 space-y-2 bg-band p-3">
        <label htmlFor="paste-readings" className="block">
          {meter
            ? 'Rows with a day and the standing of the meter'
            : 'Rows with first day, last day and quantity'}
          ; a word such as “est” after them marks an estimate
        </label>
        <textarea
          id="paste-readings"
          rows={4}
          className="field w-full"
          value={text}
          placeholder={meter ? '1 Mar 2024;10500' : '1 Feb 2024;1 Mar 2024;540;est'}
          onChange={(event) => {
            setText(event.target.value);
            setAnswers({});
            setTaken(undefined);
          }}
        />
        {found?.kind === 'nothing' && <p role="status">{found.message}</p>}
        {found?.kind === 'question' && (
          <Question
            question={found.question}
            answer={(given) => setAnswers((before) => ({ ...before, ...given }))}
          />
        )}
        {found?.kind === 'rows' && <Found found={found} already={already} take={take} />}
        {taken && (
          <p role="status">
            {readings(taken.count)} taken.{' '}
            <button
              type="button"
              className="word"
              onClick={() => {
                lay(taken.before);
                setTaken(undefined);
              }}
            >
              Put back what was there
            </button>
          </p>
        )}
      </div>
    </details>
  );
}
