'use client';

import type { ReactNode } from 'react';
import { pricesSchema, type Prices } from '@/lib/schemas/prices';
import type { ContentsEntry } from './contents';
import { Field } from './field';
import { FieldRow, FormSection } from './form-section';
import { SchemaForm } from './schema-form';
import type { SaveAnswer, Stored } from './use-saving';

const FUEL = ['fuelPerKwh', 'fuelKwhPerKg', 'fuelCo2KgPerKwh', 'electricityPerKwh'] as const;
const BUILD = [
  'storeFixed',
  'storePerL',
  'pumpAndControl',
  'pipeFixed',
  'pipePerM',
  'interfaceFixed',
  'upkeepPerYear',
] as const;
const HANDS = ['ownHours', 'hourlyRate'] as const;
const MONEY = ['currency', 'priceYear', 'realRate', 'years', 'grant'] as const;

const CONTENTS: readonly ContentsEntry[] = [
  { id: 'money', title: 'Money and time', fields: MONEY },
  { id: 'fuel', title: 'Fuel and electricity', fields: FUEL },
  { id: 'build', title: 'What it takes to build', fields: BUILD },
  { id: 'hands', title: 'Your own hours', fields: HANDS },
];

interface PricesFormProps {
  projectId: string;
  stored: Stored<Prices>;
  save(data: Prices, version: number): Promise<SaveAnswer<Prices>>;
  frieze?: ReactNode;
}

function Fields({ paths }: { paths: readonly string[] }) {
  return (
    <FieldRow>
      {paths.map((path) => (
        <Field key={path} path={path} />
      ))}
    </FieldRow>
  );
}

/** Prices, interest and own hours; the price of the collector stands with the collector. */
export function PricesForm({ projectId, stored, save, frieze }: PricesFormProps) {
  return (
    <SchemaForm
      schema={pricesSchema}
      stored={stored}
      draftKey={`${projectId} prices`}
      title="Prices"
      currency={stored.data.currency}
      contents={CONTENTS}
      save={save}
      frieze={frieze}
    >
      <FormSection id="money" title="Money and time">
        <Fields paths={MONEY} />
      </FormSection>
      <FormSection id="fuel" title="Fuel and electricity">
        <Fields paths={FUEL} />
      </FormSection>
      <FormSection id="build" title="What it takes to build">
        <p className="max-w-[70ch] text-muted">
          Price and replacements of the collector stand on its own page, because they belong to its build.
        </p>
        <Fields paths={BUILD} />
      </FormSection>
      <FormSection id="hands" title="Your own hours">
        <Fields paths={HANDS} />
      </FormSection>
    </SchemaForm>
  );
}
