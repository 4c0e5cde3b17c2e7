'use client';

import { quantityMeta } from '@/lib/schemas/quantity';
import { bare, schemaAt } from './typed-values';
import { ChoiceField } from './choice-field';
import { DayField } from './day-field';
import { choicesOf, isDay } from './field-meta';
import { useFormKnowledge } from './form-context';
import { QuantityField } from './quantity-field';
import { TextField } from './text-field';
import { ToggleField } from './toggle-field';

export interface FieldProps {
  /** path in the form's record, for example 'hotWater.setC' */
  path: string;
  /** inside a table: the column's head is the label, the row says what is wrong */
  inTable?: boolean;
  /** name for a screen reader where the label alone does not tell the row */
  name?: string;
}

/** The field that fits the schema at a path: number, choice, switch or words. */
export function Field(props: FieldProps) {
  const { schema } = useFormKnowledge();
  const here = schemaAt(schema, props.path);
  const meta = quantityMeta(here);
  if (meta) return <QuantityField {...props} meta={meta} />;
  if (isDay(here)) return <DayField {...props} schema={here} />;
  const choices = choicesOf(here);
  if (choices) return <ChoiceField {...props} schema={here} choices={choices} />;
  return bare(here).type === 'boolean' ? (
    <ToggleField {...props} schema={here} />
  ) : (
    <TextField {...props} schema={here} />
  );
}
