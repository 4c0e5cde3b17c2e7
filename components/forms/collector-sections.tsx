'use client';

import { useFormContext, useWatch } from 'react-hook-form';
import { Field } from './field';
import { FieldsWhen } from './fields-when';
import { FieldRow } from './form-section';
import { DryKindField } from './dry-kind-field';
import { GenericStart } from './generic-start';
import { ModifierFields } from './modifier-fields';
import { RowTable } from './row-table';

const CURVE = [
  'diffuseModifier',
  'a1',
  'a2',
  'a3',
  'a4',
  'a6',
  'a7',
  'a8',
  'dryCapacityJPerM2K',
  'waterContentLPerM2',
];

const BALANCE = [
  'tauAlpha',
  'absorberEmittance',
  'coverEmittance',
  'coverLongwaveTransmittance',
  'coverResistanceM2KPerW',
  'gapMm',
  'backLossWPerM2K',
];

const DECLARED = ['stagnationC', 'backLossWPerM2K'];

const PART_COLUMNS = [
  { field: 'name', track: 'minmax(0,1.4fr)' },
  { field: 'place', track: '6.5rem' },
  { field: 'material', track: 'minmax(0,1fr)' },
  { field: 'longTermLimitC', track: '5rem' },
  { field: 'shortTermLimitC', track: '5rem' },
];

const REPLACEMENT_COLUMNS = [
  { field: 'label', track: 'minmax(0,1.4fr)' },
  { field: 'pricePerM2', track: '6rem' },
  { field: 'everyYears', track: '6rem' },
];

interface CollectorPartProps {
  /** where the collector stands in the form: 'collector' or 'second.collector' */
  path: string;
}

/** What the collector is and how it is known. */
export function BuildFields({ path }: CollectorPartProps) {
  return (
    <>
      <GenericStart path={path} />
      <FieldRow>
        <Field path={`${path}.name`} />
        <Field path={`${path}.origin`} />
        <Field path={`${path}.cover`} />
        <Field path={`${path}.widthFactor`} />
      </FieldRow>
    </>
  );
}

/** The efficiency curve with its incidence angles. */
export function CurveFields({ path }: CollectorPartProps) {
  return (
    <>
      <FieldRow>
        <Field path={`${path}.curve.areaBasis`} />
        <Field path={`${path}.curve.eta0Beam`} />
        <FieldsWhen
          choices={[`${path}.curve.modifier.kind`]}
          matter={(kind) => kind === 'b0'}
          fields={[`${path}.curve.b0`]}
        />
        {CURVE.map((field) => (
          <Field key={field} path={`${path}.curve.${field}`} />
        ))}
      </FieldRow>
      <ModifierFields path={`${path}.curve.modifier`} />
    </>
  );
}

/** How the temperature of the empty collector is found. */
export function DryFields({ path }: CollectorPartProps) {
  const { control } = useFormContext();
  const kind: unknown = useWatch({ control, name: `${path}.dry.kind` });
  return (
    <FieldRow>
      <DryKindField path={`${path}.dry.kind`} />
      {(kind === 'declared' ? DECLARED : BALANCE).map((field) => (
        <Field key={field} path={`${path}.dry.${field}`} />
      ))}
      <Field path={`${path}.faceLayerM2KPerW`} />
    </FieldRow>
  );
}

/** Parts of the collector with the temperatures that they bear. */
export function PartsTable({ path, caption }: CollectorPartProps & { caption: string }) {
  return (
    <RowTable
      path={`${path}.parts`}
      caption={caption}
      columns={PART_COLUMNS}
      addWord="Add a part"
      originField="shortTermLimitC"
    />
  );
}

/** What the collector costs, and what of it has to be bought again. */
export function PriceFields({ path, caption }: CollectorPartProps & { caption: string }) {
  return (
    <>
      <FieldRow>
        <Field path={`${path}.pricePerM2`} />
      </FieldRow>
      <RowTable
        path={`${path}.replacements`}
        caption={caption}
        columns={REPLACEMENT_COLUMNS}
        addWord="Add a replacement"
        originField="everyYears"
      />
    </>
  );
}
