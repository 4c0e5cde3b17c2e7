'use client';

import { get, useFormContext, useFormState, useWatch } from 'react-hook-form';
import { Field } from './field';

interface FieldsWhenProps {
  /** paths of the choices on which the fields depend */
  choices: readonly string[];
  /** whether they matter, by what is chosen or typed there */
  matter(...chosen: readonly unknown[]): boolean;
  fields: readonly string[];
  /** said in their place where their absence could surprise */
  reason?: string;
}

/**
 * Fields that matter for one choice only. Hidden they keep what was typed; one that still has something to mend
 * stays in sight, because it keeps the form from being saved.
 */
export function FieldsWhen({ choices, matter, fields, reason }: FieldsWhenProps) {
  const { control } = useFormContext();
  const { errors } = useFormState({ control });
  const matters = matter(...useWatch({ control, name: choices }));
  const shown = matters ? fields : fields.filter((path) => get(errors, path) !== undefined);
  return (
    <>
      {shown.map((path) => (
        <Field key={path} path={path} />
      ))}
      {!matters && reason && <p className="col-span-full text-note text-muted">{reason}</p>}
    </>
  );
}
