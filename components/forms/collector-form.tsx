'use client';

import type { ReactNode } from 'react';
import { useFormContext, useWatch } from 'react-hook-form';
import { designSchema, type DesignRecord } from '@/lib/schemas/design';
import { Caution } from './caution';
import type { ContentsEntry } from './contents';
import { DryKindField } from './dry-kind-field';
import { Field } from './field';
import { FieldRow, FormSection } from './form-section';
import { GenericStart } from './generic-start';
import { ModifierFields } from './modifier-fields';
import { RowTable } from './row-table';
import { SchemaForm } from './schema-form';
import type { SaveAnswer, Stored } from './use-saving';

const partSchema = designSchema.pick({ collector: true });

const CURVE = [
  'areaBasis',
  'eta0Beam',
  'b0',
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
].map((field) => `collector.curve.${field}`);

const BALANCE = [
  'tauAlpha',
  'absorberEmittance',
  'coverEmittance',
  'coverLongwaveTransmittance',
  'gapMm',
  'backLossWPerM2K',
].map((field) => `collector.dry.${field}`);

const DECLARED = ['stagnationC', 'backLossWPerM2K'].map((field) => `collector.dry.${field}`);

const CONTENTS: readonly ContentsEntry[] = [
  {
    id: 'build',
    title: 'Build',
    fields: ['collector.name', 'collector.origin', 'collector.cover', 'collector.widthFactor'],
  },
  { id: 'curve', title: 'Efficiency curve', fields: ['collector.curve'] },
  { id: 'dry', title: 'Empty in the sun', fields: ['collector.dry', 'collector.faceLayerM2KPerW'] },
  { id: 'parts', title: 'Parts and limits', fields: ['collector.parts'] },
  { id: 'price', title: 'Price and life', fields: ['collector.pricePerM2', 'collector.replacements'] },
];

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

interface CollectorFormProps {
  designId: string;
  stored: Stored<DesignRecord>;
  currency: string;
  save(data: DesignRecord, version: number): Promise<SaveAnswer<DesignRecord>>;
  frieze?: ReactNode;
}

function DryFields() {
  const { control } = useFormContext();
  const kind: unknown = useWatch({ control, name: 'collector.dry.kind' });
  return (
    <FieldRow>
      <DryKindField path="collector.dry.kind" />
      {(kind === 'declared' ? DECLARED : BALANCE).map((path) => (
        <Field key={path} path={path} />
      ))}
      <Field path="collector.faceLayerM2KPerW" />
    </FieldRow>
  );
}

/** The collector of one design: build, curve, what it bears empty, and what it costs. */
export function CollectorForm({ designId, stored, currency, save, frieze }: CollectorFormProps) {
  return (
    <SchemaForm
      schema={partSchema}
      stored={stored}
      draftKey={`${designId} collector`}
      title="Collector"
      currency={currency}
      contents={CONTENTS}
      save={save}
      frieze={frieze}
    >
      <FormSection id="build" title="Build">
        <GenericStart />
        <FieldRow>
          <Field path="collector.name" />
          <Field path="collector.origin" />
          <Field path="collector.cover" />
          <Field path="collector.widthFactor" />
        </FieldRow>
      </FormSection>
      <FormSection id="curve" title="Efficiency curve">
        <FieldRow>
          {CURVE.map((path) => (
            <Field key={path} path={path} />
          ))}
        </FieldRow>
        <ModifierFields />
      </FormSection>
      <FormSection id="dry" title="Empty in the sun">
        <DryFields />
        <Caution>
          An empty collector in full sun gets hot enough to burn skin, to soften plastics and to set off steam
          when water reaches it. The limits below are screening values: the maker’s data sheet and local fire
          rules decide.
        </Caution>
      </FormSection>
      <FormSection id="parts" title="Parts and their limits">
        <RowTable
          path="collector.parts"
          caption="Parts with the temperatures they bear"
          columns={PART_COLUMNS}
          addWord="Add a part"
          originField="shortTermLimitC"
        />
      </FormSection>
      <FormSection id="price" title="Price and life">
        <FieldRow>
          <Field path="collector.pricePerM2" />
        </FieldRow>
        <RowTable
          path="collector.replacements"
          caption="What has to be replaced"
          columns={REPLACEMENT_COLUMNS}
          addWord="Add a replacement"
          originField="everyYears"
        />
      </FormSection>
    </SchemaForm>
  );
}
