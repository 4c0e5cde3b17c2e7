'use client';

import { Field } from '@/components/forms/field';
import { useHeld } from '@/components/forms/form-context';
import { FieldRow, FormSection } from '@/components/forms/form-section';
import { RowTable, type RowColumn } from '@/components/forms/row-table';
import type { RowAnswer } from '@/lib/calibration/bill-row';
import type { BillsRecord } from '@/lib/schemas/bills';
import { useBillsStudy } from './bills-context';
import { PasteReadings } from './paste-readings';

const METER: readonly RowColumn[] = [
  { field: 'to', track: '8rem', head: 'Read on' },
  { field: 'quantity', track: '8rem', head: 'Standing' },
  { field: 'estimated', track: '5rem' },
];

const DATES: readonly RowColumn[] = [
  { field: 'from', track: '8rem' },
  { field: 'to', track: '8rem' },
  { field: 'quantity', track: '7rem' },
  { field: 'estimated', track: '5rem' },
];

const KIND_WORDS: Record<RowAnswer['kind'], string> = {
  'left out': 'Not used.',
  joined: 'Joined.',
  remark: 'Remark.',
};

function Answers({ answers }: { answers: readonly RowAnswer[] }) {
  return answers.map(({ kind, text }) => (
    <p
      key={text}
      className={`text-note ${kind === 'left out' ? 'text-hot-text' : 'text-muted'}`}
      data-answer={kind}
    >
      <strong>{KIND_WORDS[kind]}</strong> {text}
    </p>
  ));
}

function summary({ rows }: BillsRecord, answers: readonly RowAnswer[]): string {
  const used =
    rows.length - new Set(answers.filter(({ kind }) => kind === 'left out').map(({ row }) => row)).size;
  const estimated = rows.filter((row) => row.estimated).length;
  if (rows.length === 0)
    return 'Type the readings of a year or two, monthly if you can, or paste them from a spreadsheet.';
  return `${rows.length} readings, ${used} of them used, ${estimated || 'none'} estimated.`;
}

/** The rows, what is said to each of them, and the way in from a spreadsheet. */
export function ReadingsSection() {
  const bills = useHeld<BillsRecord>();
  const { byBills } = useBillsStudy();
  const meter = bills.way === 'meter readings';
  return (
    <FormSection id="readings" title="Readings">
      <FieldRow>
        <Field path="way" />
        <Field path="unit" />
        {meter && <Field path="meterDigits" />}
      </FieldRow>
      <PasteReadings meter={meter} />
      <p aria-live="polite">{summary(bills, byBills.answers)}</p>
      <RowTable
        key={bills.way}
        path="rows"
        caption={meter ? 'Standings of the meter' : `Bills, in ${bills.unit}`}
        columns={meter ? METER : DATES}
        addWord="Add a reading"
        numbered
        rowNote={(index) => <Answers answers={byBills.answers.filter(({ row }) => row === index)} />}
      />
    </FormSection>
  );
}
