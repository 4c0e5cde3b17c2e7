'use client';

import { useRef, useState, type CSSProperties, type KeyboardEvent, type ReactNode } from 'react';
import { useFieldArray, useFormContext, useWatch } from 'react-hook-form';
import { z } from 'zod';
import { quantityMeta } from '@/lib/schemas/quantity';
import { unitInCurrency } from '@/lib/units/display';
import { DayError } from './day-field';
import { Field } from './field';
import { isDay, metaOf } from './field-meta';
import { useFormKnowledge } from './form-context';
import { OriginMark, originOf } from './origin-mark';
import { QuantityError } from './quantity-field';
import { bare, schemaAt, toTyped, type Typed } from './typed-values';
import { useFieldError } from './use-field-error';

export interface RowColumn {
  field: string;
  /** share of the width, as a CSS grid track */
  track: string;
  /** word above the column where the field's own label does not say it */
  head?: string;
}

interface RowTableProps {
  path: string;
  caption: string;
  columns: readonly RowColumn[];
  /** word on the button, for example "Add an element" */
  addWord: string;
  /** column whose origin stands at the end of the row */
  originField?: string;
  /** a column that is worked out from the row, with its head */
  derived?: { head: ReactNode; cell(index: number): ReactNode };
  /** rows carry their number, so that what is said to them can name each other */
  numbered?: boolean;
  /** what is said to a row, below it */
  rowNote?(index: number): ReactNode;
  /** sums under the columns, with the words that say of what */
  totals?: { words: string; cells: Readonly<Record<string, string>>; derived: string };
}

function useRowSchema(path: string): z.ZodType {
  const { schema } = useFormKnowledge();
  const array = bare(schemaAt(schema, path));
  if (!(array instanceof z.ZodArray)) throw new Error(`"${path}" holds no rows.`);
  return array.element as z.ZodType;
}

function RowOrigin({ path }: { path: string }) {
  const { schema } = useFormKnowledge();
  const { control } = useFormContext();
  const typed: unknown = useWatch({ control, name: path });
  const meta = quantityMeta(schemaAt(schema, path));
  if (!meta) return null;
  const origin = originOf(meta, String(typed ?? ''));
  return <OriginMark origin={origin} word={origin === 'typed' ? 'typed by you' : meta.source} />;
}

/** What is wrong with a cell, in words below its row. */
export function CellError({ path }: { path: string }) {
  const { schema } = useFormKnowledge();
  const here = schemaAt(schema, path);
  const meta = quantityMeta(here);
  const message = useFieldError(path);
  if (!message) return null;
  if (isDay(here)) return <DayError path={path} id={`field-${path}-error`} />;
  return meta ? (
    <QuantityError path={path} meta={meta} id={`field-${path}-error`} />
  ) : (
    <p id={`field-${path}-error`} role="alert" className="text-note text-hot-text">
      {message}
    </p>
  );
}

/** Enter and the arrows walk down and up a column, as in a spreadsheet. */
function walkColumn(event: KeyboardEvent<HTMLElement>) {
  const step = { Enter: 1, ArrowDown: 1, ArrowUp: -1 }[event.key];
  const target = event.target;
  if (!step || !(target instanceof HTMLInputElement) || event.altKey || event.ctrlKey) return;
  event.preventDefault();
  const [, before, index, field] = /^(.*)\.(\d+)\.(\w+)$/.exec(target.name) ?? [];
  const next = document.getElementsByName(`${before}.${Number(index) + step}.${field}`)[0];
  if (!(next instanceof HTMLInputElement)) return;
  next.focus();
  next.select();
}

/** Rows of like things, typed as in a spreadsheet; on a phone each row stands by itself with its labels. */
export function RowTable(props: RowTableProps) {
  const { path, caption, columns, addWord, originField, derived, rowNote, numbered = false } = props;
  const { control, setFocus, getValues } = useFormContext();
  const { dropRow, currency } = useFormKnowledge();
  const rowSchema = useRowSchema(path);
  const { fields, append, remove, insert } = useFieldArray({ control, name: path });
  const [removed, setRemoved] = useState<{ index: number; row: Typed }>();
  const addButton = useRef<HTMLButtonElement>(null);
  const first = columns[0]!.field;
  const template = [
    ...(numbered ? ['1.5rem'] : []),
    ...columns.map(({ track }) => track),
    ...(derived ? ['4.5rem'] : []),
    ...(originField ? ['minmax(0,1.2fr)'] : []),
    '1.75rem',
  ].join(' ');

  function rowName(index: number): string {
    return String(getValues(`${path}.${index}.${first}`) ?? '') || `row ${index + 1}`;
  }

  function add() {
    append(toTyped(rowSchema, rowSchema.parse({})) as object, {
      focusName: `${path}.${fields.length}.${first}`,
    });
  }

  function takeOut(index: number) {
    setRemoved({ index, row: getValues(`${path}.${index}`) as Typed });
    dropRow(path, index);
    remove(index);
    addButton.current?.focus();
  }

  return (
    <div>
      <div
        role="table"
        aria-label={caption}
        className="row-table"
        style={{ '--tracks': template } as CSSProperties}
        onKeyDown={walkColumn}
      >
        <div role="rowgroup">
          <div
            role="row"
            className="hidden items-end gap-x-3 border-b border-ink pb-1 text-unit text-muted md:grid md:grid-cols-(--tracks)"
          >
            {numbered && (
              <span role="columnheader">
                <span className="sr-only">Row</span>
              </span>
            )}
            {columns.map(({ field, head }) => (
              <Head key={field} schema={schemaAt(rowSchema, field)} currency={currency} head={head} />
            ))}
            {derived && (
              <span role="columnheader" className="text-right">
                {derived.head}
              </span>
            )}
            {originField && <span role="columnheader">Where the value comes from</span>}
            <span role="columnheader">
              <span className="sr-only">Take out</span>
            </span>
          </div>
        </div>
        <div role="rowgroup">
          {fields.map((row, index) => (
            <div
              key={row.id}
              role="row"
              className="grid grid-cols-3 items-center gap-x-3 gap-y-1 py-1 rule-hair md:grid-cols-(--tracks)"
            >
              {numbered && (
                <div role="cell" className="text-right text-note text-muted max-md:hidden">
                  {index + 1}
                </div>
              )}
              {columns.map(({ field, head }, c) => (
                <div
                  role="cell"
                  key={field}
                  className={c === 0 ? 'max-md:col-span-2 max-md:col-start-1 max-md:row-start-1' : ''}
                >
                  <PhoneLabel
                    schema={schemaAt(rowSchema, field)}
                    currency={currency}
                    head={head}
                    row={numbered && c === 0 ? index + 1 : undefined}
                  />
                  <Field
                    path={`${path}.${index}.${field}`}
                    inTable
                    name={`${head ?? metaOf(schemaAt(rowSchema, field)).label}, row ${index + 1}`}
                  />
                </div>
              ))}
              {derived && (
                <div role="cell" className="text-right tabular-nums">
                  <span className="block text-left text-note text-muted md:hidden">{derived.head}</span>
                  {derived.cell(index)}
                </div>
              )}
              {originField && (
                <div role="cell" className="text-note text-muted">
                  <RowOrigin path={`${path}.${index}.${originField}`} />
                </div>
              )}
              <div role="cell" className="text-right max-md:col-start-3 max-md:row-start-1">
                <button
                  type="button"
                  aria-label={`Take out ${rowName(index)}`}
                  className="min-h-6 min-w-6 text-muted hover:text-ink pointer-coarse:min-h-11 pointer-coarse:min-w-11"
                  onClick={() => takeOut(index)}
                >
                  ×
                </button>
              </div>
              <div role="cell" className="col-span-full empty:hidden">
                {columns.map(({ field }) => (
                  <CellError key={field} path={`${path}.${index}.${field}`} />
                ))}
                {rowNote?.(index)}
              </div>
            </div>
          ))}
        </div>
        {props.totals && <Totals {...props.totals} columns={columns} />}
      </div>
      <p className="mt-2 flex flex-wrap items-center gap-x-4 gap-y-2">
        <button ref={addButton} type="button" className="framed" onClick={add}>
          {addWord}
        </button>
        {removed && (
          <button
            type="button"
            className="word"
            onClick={() => {
              insert(removed.index, removed.row as object);
              setFocus(`${path}.${removed.index}.${first}`);
              setRemoved(undefined);
            }}
          >
            Put back what was taken out
          </button>
        )}
      </p>
    </div>
  );
}

function Totals({
  words,
  cells,
  derived,
  columns,
}: NonNullable<RowTableProps['totals']> & { columns: readonly RowColumn[] }) {
  return (
    <div role="rowgroup" aria-live="polite">
      <div
        role="row"
        className="flex flex-wrap justify-between gap-x-3 py-2 font-strong tabular-nums md:grid md:grid-cols-(--tracks)"
      >
        {columns.map(({ field }, place) => (
          <span role="cell" key={field} className={place === 0 ? 'md:whitespace-nowrap' : 'text-right'}>
            {place === 0 ? words : cells[field]}
          </span>
        ))}
        <span role="cell" className="text-right">
          {derived}
        </span>
      </div>
    </div>
  );
}

function headWords(schema: z.ZodType, currency: string): { label: string; unit: string; number: boolean } {
  const meta = quantityMeta(schema);
  const unit = meta ? unitInCurrency(meta.unit, currency) : '';
  return { label: metaOf(schema).label, unit, number: meta !== undefined };
}

interface HeadProps {
  schema: z.ZodType;
  currency: string;
  head: string | undefined;
}

function Head({ schema, currency, head }: HeadProps) {
  const { label, unit, number } = headWords(schema, currency);
  return (
    <span role="columnheader" className={number ? 'text-right' : ''}>
      {head ?? label}
      {unit && <span className="block">{unit}</span>}
    </span>
  );
}

function PhoneLabel({ schema, currency, head, row }: HeadProps & { row: number | undefined }) {
  const { label, unit } = headWords(schema, currency);
  return (
    <span aria-hidden="true" className="block text-note text-muted md:hidden">
      {row !== undefined && `Row ${row}: `}
      {head ?? label} {unit}
    </span>
  );
}
