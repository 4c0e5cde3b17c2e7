'use client';

import type { ReactNode } from 'react';
import { designSchema, type DesignRecord } from '@/lib/schemas/design';
import { formatFixed, formatSignificant, withUnit } from '@/lib/units/display';
import { BigFigures } from './big-figures';
import { Caution } from './caution';
import type { ContentsEntry } from './contents';
import { Field } from './field';
import { useHeld } from './form-context';
import { FieldRow, FormSection } from './form-section';
import { MonthsField } from './months-field';
import { SchemaForm } from './schema-form';
import type { SaveAnswer, Stored } from './use-saving';

const partSchema = designSchema.pick({
  name: true,
  array: true,
  loop: true,
  controller: true,
  store: true,
  supply: true,
});
type LoopAndStore = Pick<DesignRecord, 'name' | 'array' | 'loop' | 'controller' | 'store' | 'supply'>;

const CONTENTS: readonly ContentsEntry[] = [
  {
    id: 'array',
    title: 'The array',
    fields: [
      'name',
      'array.areaM2',
      'array.tiltDeg',
      'array.azimuthDeg',
      'array.rows',
      'array.rowSpacingM',
      'array.rowHeightM',
      'array.mountedMonths',
      'array.windFactor',
    ],
  },
  {
    id: 'loop',
    title: 'Pipes and pump',
    fields: [
      'array.liftM',
      'array.flowKgPerSM2',
      'array.pipeLengthM',
      'array.pipeBoreMm',
      'array.pipeLossWPerMK',
      'array.pipeCapacityJPerMK',
      'array.pumpEfficiency',
      'loop.pump',
    ],
  },
  {
    id: 'layout',
    title: 'Layout',
    fields: [
      'loop.layout',
      'loop.exchangerEffectiveness',
      'loop.vesselReserveL',
      'loop.vesselLossWPerK',
      'loop.slabRoomLimitC',
    ],
  },
  { id: 'controller', title: 'Controller', fields: ['controller'] },
  { id: 'store', title: 'Store', fields: ['store'] },
  { id: 'supply', title: 'Supply to the rooms', fields: ['supply'] },
];

interface LoopAndStoreFormProps {
  designId: string;
  stored: Stored<DesignRecord>;
  currency: string;
  save(data: DesignRecord, version: number): Promise<SaveAnswer<DesignRecord>>;
  frieze?: ReactNode;
}

function Sums() {
  const { array, store } = useHeld<LoopAndStore>();
  const flowLPerMin = array.areaM2 * array.flowKgPerSM2 * 60;
  return (
    <BigFigures
      figures={[
        {
          value: withUnit(array.areaM2 > 0 ? formatFixed(store.volumeL / array.areaM2) : '–', 'L/m²'),
          words: 'store for each square metre of array',
        },
        {
          value: withUnit(formatSignificant(flowLPerMin, 2), 'L/min'),
          words: 'through the array while the pump runs',
        },
        {
          value: withUnit(formatSignificant(store.volumeL / 1000 / store.heightM, 2), 'm²'),
          words: 'footprint of the water, for its height',
        },
      ]}
    />
  );
}

/** Array, pipes, controller, store and supply of one design. */
export function LoopAndStoreForm({ designId, stored, currency, save, frieze }: LoopAndStoreFormProps) {
  return (
    <SchemaForm
      schema={partSchema}
      stored={stored}
      draftKey={`${designId} loop and store`}
      title="Loop and store"
      currency={currency}
      contents={CONTENTS}
      save={save}
      frieze={frieze}
    >
      <FormSection id="array" title="The array">
        <FieldRow>
          <Field path="name" />
          <Field path="array.areaM2" />
          <Field path="array.tiltDeg" />
          <Field path="array.azimuthDeg" />
          <Field path="array.rows" />
          <Field path="array.rowSpacingM" />
          <Field path="array.rowHeightM" />
          <Field path="array.windFactor" />
        </FieldRow>
        <MonthsField path="array.mountedMonths" />
        <Caution>
          Wind and snow load the array and what carries it: local code and a licensed engineer decide on
          fixings and roof.
        </Caution>
      </FormSection>
      <FormSection id="loop" title="Pipes and pump">
        <FieldRow>
          <Field path="array.liftM" />
          <Field path="array.pipeLengthM" />
          <Field path="array.pipeBoreMm" />
          <Field path="array.pipeLossWPerMK" />
          <Field path="array.pipeCapacityJPerMK" />
          <Field path="array.flowKgPerSM2" />
          <Field path="array.pumpEfficiency" />
          <Field path="loop.pump.kind" />
          <Field path="loop.pump.shutOffHeadM" />
          <Field path="loop.pump.greatestFlowLPerS" />
          <Field path="loop.pump.returnPipe" />
        </FieldRow>
        <Caution>
          Pumps and controllers near water belong on a protected circuit: electrical work follows your local
          code and a licensed electrician.
        </Caution>
      </FormSection>
      <FormSection id="layout" title="Layout">
        <FieldRow>
          <Field path="loop.layout" />
          <Field path="loop.exchangerEffectiveness" />
          <Field path="loop.vesselReserveL" />
          <Field path="loop.vesselLossWPerK" />
          <Field path="loop.slabRoomLimitC" />
        </FieldRow>
      </FormSection>
      <FormSection id="controller" title="Controller">
        <FieldRow>
          <Field path="controller.startK" />
          <Field path="controller.stopK" />
          <Field path="controller.storeLimitC" />
          <Field path="controller.inhibitC" />
          <Field path="controller.minimumRunS" />
        </FieldRow>
        <Caution>
          Water let into a hot, empty array can flash to steam. Keep the array vented and the start inhibited
          while it is hot.
        </Caution>
      </FormSection>
      <FormSection id="store" title="Store">
        <FieldRow>
          <Field path="store.volumeL" />
          <Field path="store.heightM" />
          <Field path="store.layers" />
          <Field path="store.insulationMm" />
          <Field path="store.insulationConductivity" />
          <Field path="store.roomC" />
          <Field path="store.insideHouse" />
        </FieldRow>
        <Sums />
      </FormSection>
      <FormSection id="supply" title="Supply to the rooms">
        <FieldRow>
          <Field path="supply.designSupplyC" />
          <Field path="supply.designSpreadK" />
          <Field path="supply.limitC" />
        </FieldRow>
      </FormSection>
    </SchemaForm>
  );
}
