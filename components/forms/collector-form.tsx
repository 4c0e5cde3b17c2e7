'use client';

import type { ReactNode } from 'react';
import { designSchema, type DesignRecord } from '@/lib/schemas/design';
import { Caution } from './caution';
import { BuildFields, CurveFields, DryFields, PartsTable, PriceFields } from './collector-sections';
import type { ContentsEntry } from './contents';
import { FormSection } from './form-section';
import { SchemaForm } from './schema-form';
import { SecondField } from './second-field';
import type { SaveAnswer, Stored } from './use-saving';

const partSchema = designSchema.pick({ collector: true, second: true });

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
  { id: 'second', title: 'Second field', fields: ['second'] },
];

interface CollectorFormProps {
  designId: string;
  stored: Stored<DesignRecord>;
  currency: string;
  save(data: DesignRecord, version: number): Promise<SaveAnswer<DesignRecord>>;
  frieze?: ReactNode;
}

/** The collectors of one design: build, curve, what they bear empty, and what they cost. */
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
        <BuildFields path="collector" />
      </FormSection>
      <FormSection id="curve" title="Efficiency curve">
        <CurveFields path="collector" />
      </FormSection>
      <FormSection id="dry" title="Empty in the sun">
        <DryFields path="collector" />
        <Caution>
          An empty collector in full sun gets hot enough to burn skin, to soften plastics and to set off steam
          when water reaches it. The limits below are screening values: the maker’s data sheet and local fire
          rules decide.
        </Caution>
      </FormSection>
      <FormSection id="parts" title="Parts and their limits">
        <PartsTable path="collector" caption="Parts with the temperatures they bear" />
      </FormSection>
      <FormSection id="price" title="Price and life">
        <PriceFields path="collector" caption="What has to be replaced" />
      </FormSection>
      <SecondField
        firstArray={stored.data.array}
        firstField="second.collector.name"
        elsewhere="Once it is saved, its area, tilt, months and pipes stand under Loop and store."
      >
        <SecondCollector />
      </SecondField>
    </SchemaForm>
  );
}

/** The collector of the second field, in the same figures as the first. */
function SecondCollector() {
  const path = 'second.collector';
  return (
    <>
      <BuildFields path={path} />
      <h3>Its efficiency curve</h3>
      <CurveFields path={path} />
      <h3>Empty in the sun</h3>
      <DryFields path={path} />
      <h3>Its parts and their limits</h3>
      <PartsTable path={path} caption="Parts of the second field with the temperatures they bear" />
      <h3>Its price and life</h3>
      <PriceFields path={path} caption="What has to be replaced in the second field" />
    </>
  );
}
