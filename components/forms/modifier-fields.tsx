'use client';

import { get, useFormContext, useWatch } from 'react-hook-form';
import {
  diffuseModifierFromPair,
  diffuseModifierFromTable,
  type IncidenceModifier,
} from '@/lib/physics/incidence-angle';
import { formatFixed } from '@/lib/units/display';
import { Field } from './field';
import { useHeld } from './form-context';
import { CellError } from './row-table';

const ANGLES_DEG = Array.from({ length: 10 }, (_, i) => i * 10);

const KINDS = [
  { value: 'b0', label: 'b0 above' },
  { value: 'table', label: 'table by angle' },
  { value: 'pair', label: 'two tables, along and across ribs' },
];

/** Ten modifiers from 0 to 90°, as a certificate prints them. */
function AngleTable({ path, caption }: { path: string; caption: string }) {
  return (
    <fieldset>
      <legend className="mb-1">{caption}</legend>
      <div className="grid grid-cols-5 gap-x-3 gap-y-2 md:grid-cols-10">
        {ANGLES_DEG.map((angleDeg, i) => (
          <div key={angleDeg}>
            <span aria-hidden="true" className="block text-right text-note text-muted">
              {angleDeg}°
            </span>
            <Field path={`${path}.${i}`} inTable name={`${caption}, ${angleDeg}°`} />
          </div>
        ))}
      </div>
      {ANGLES_DEG.map((angleDeg, i) => (
        <CellError key={angleDeg} path={`${path}.${i}`} />
      ))}
    </fieldset>
  );
}

/** What the tables say of diffuse sun, beside the Kd that the curve goes by. */
function DiffuseNote({ path }: { path: string }) {
  const modifier = get(useHeld(), path) as IncidenceModifier | undefined;
  const fromTables = modifier && hemisphere(modifier);
  if (fromTables === undefined) return null;
  return (
    <p className="text-note text-muted" aria-live="polite">
      A sky of equal brightness on these tables gives Kd = {formatFixed(fromTables, 2)}; the curve goes by the
      diffuse modifier above.
    </p>
  );
}

function hemisphere(modifier: IncidenceModifier): number | undefined {
  if (modifier.kind === 'table') return diffuseModifierFromTable(modifier.values);
  if (modifier.kind === 'pair') return diffuseModifierFromPair(modifier.longitudinal, modifier.transversal);
  return undefined;
}

/** How the beam's modifier is known: b0, one table, or two for ribbed sheet and tubes. */
export function ModifierFields({ path }: { path: string }) {
  const { control, register } = useFormContext();
  const kind: unknown = useWatch({ control, name: `${path}.kind` });
  const id = `field-${path}.kind`;
  return (
    <div className="space-y-4">
      <div className="max-w-sm">
        <label htmlFor={id} className="mb-1 block">
          Incidence angle by
        </label>
        <select id={id} {...register(`${path}.kind`)} className="field w-full">
          {KINDS.map(({ value, label }) => (
            <option key={value} value={value}>
              {label}
            </option>
          ))}
        </select>
      </div>
      {kind === 'table' && <AngleTable path={`${path}.values`} caption="Modifier K" />}
      {kind === 'pair' && (
        <>
          <AngleTable path={`${path}.longitudinal`} caption="K along the ribs" />
          <AngleTable path={`${path}.transversal`} caption="K across the ribs" />
          <div className="max-w-sm">
            <Field path={`${path}.ribs`} />
          </div>
        </>
      )}
      <DiffuseNote path={path} />
    </div>
  );
}
