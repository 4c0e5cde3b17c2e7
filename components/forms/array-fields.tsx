'use client';

import type { ReactNode } from 'react';
import { readNumber } from '@/lib/units/display';
import { Field } from './field';
import { FieldsWhen } from './fields-when';
import { FieldRow } from './form-section';
import { MonthsField } from './months-field';

/** How one collector field stands: area, tilt, rows and months. */
export function ArrayFields({ path, children }: { path: string; children?: ReactNode }) {
  return (
    <>
      <FieldRow>
        {children}
        <Field path={`${path}.areaM2`} />
        <Field path={`${path}.tiltDeg`} />
        <Field path={`${path}.azimuthDeg`} />
        <Field path={`${path}.windFactor`} />
        <Field path={`${path}.rows`} />
        <FieldsWhen
          choices={[`${path}.rows`]}
          matter={(rows) => (readNumber(String(rows)) ?? 1) > 1}
          fields={[`${path}.rowSpacingM`, `${path}.rowHeightM`]}
        />
      </FieldRow>
      <MonthsField path={`${path}.mountedMonths`} />
    </>
  );
}

/** Pipes of one collector field, and the flow through it where no pump curve gives it. */
export function PipeFields({ path }: { path: string }) {
  return (
    <>
      <Field path={`${path}.liftM`} />
      <Field path={`${path}.pipeLengthM`} />
      <Field path={`${path}.pipeBoreMm`} />
      <Field path={`${path}.pipeLossWPerMK`} />
      <Field path={`${path}.pipeCapacityJPerMK`} />
      <Field path={`${path}.pumpEfficiency`} />
      <FieldsWhen
        choices={['loop.pump.kind']}
        matter={(kind) => kind !== 'curve'}
        fields={[`${path}.flowKgPerSM2`]}
      />
    </>
  );
}
