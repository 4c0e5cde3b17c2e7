'use client';

import type { ReactNode } from 'react';
import { designSchema, type DesignRecord } from '@/lib/schemas/design';
import { formatFixed, formatSignificant, withUnit } from '@/lib/units/display';
import { ArrayFields, PipeFields } from './array-fields';
import { BigFigures } from './big-figures';
import { Caution } from './caution';
import type { ContentsEntry } from './contents';
import { Field } from './field';
import { FieldsWhen } from './fields-when';
import { useHeld } from './form-context';
import { FieldRow, FormSection } from './form-section';
import { SchemaForm } from './schema-form';
import { SecondField } from './second-field';
import type { SaveAnswer, Stored } from './use-saving';

const partSchema = designSchema.omit({ collector: true });
type LoopAndStore = Omit<DesignRecord, 'collector'>;

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
  { id: 'second', title: 'Second field', fields: ['second'] },
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

const VESSEL = ['loop.vesselReserveL', 'loop.vesselLossWPerK'];
const STORE = [
  'store.volumeL',
  'store.heightM',
  'store.shape',
  'store.layers',
  'store.insulationMm',
  'store.insulationConductivity',
  'store.insideHouse',
];

function Sums() {
  const { array, second, store, loop } = useHeld<LoopAndStore>();
  if (loop.layout === 'straight to the slab') return null;
  const areaM2 = array.areaM2 + (second?.array.areaM2 ?? 0);
  const flowLPerMin = array.areaM2 * array.flowKgPerSM2 * 60;
  const figures = [
    {
      value: withUnit(areaM2 > 0 ? formatFixed(store.volumeL / areaM2) : '–', 'L/m²'),
      words: 'store for each square metre of array',
    },
    {
      value: withUnit(formatSignificant(store.volumeL / 1000 / store.heightM, 2), 'm²'),
      words: 'footprint of the water, for its height',
    },
  ];
  if (loop.pump.kind === 'flow')
    figures.push({
      value: withUnit(formatSignificant(flowLPerMin, 2), 'L/min'),
      words: `through the ${second ? 'first ' : ''}array while the pump runs`,
    });
  return <BigFigures figures={figures} />;
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
        <ArrayFields path="array">
          <Field path="name" />
        </ArrayFields>
        <Caution>
          Wind and snow load the array and what carries it: local code and a licensed engineer decide on
          fixings and roof.
        </Caution>
      </FormSection>
      <FormSection id="loop" title="Pipes and pump">
        <FieldRow>
          <PipeFields path="array" />
          <Field path="loop.pump.kind" />
          <FieldsWhen
            choices={['loop.pump.kind']}
            matter={(kind) => kind === 'curve'}
            fields={['loop.pump.shutOffHeadM', 'loop.pump.greatestFlowLPerS']}
          />
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
          <FieldsWhen
            choices={['loop.layout']}
            matter={(layout) => layout === 'vessel with exchanger'}
            fields={['loop.exchangerEffectiveness']}
          />
          <FieldsWhen
            choices={['loop.layout']}
            matter={(layout) => layout !== 'through the store'}
            fields={VESSEL}
          />
          <FieldsWhen
            choices={['loop.layout']}
            matter={(layout) => layout === 'straight to the slab'}
            fields={['loop.slabRoomLimitC']}
          />
        </FieldRow>
      </FormSection>
      <SecondField
        firstArray={stored.data.array}
        firstField="second.array.areaM2"
        elsewhere="Once it is saved, its collectors stand under Collector."
      >
        <ArrayFields path="second.array" />
        <FieldRow>
          <PipeFields path="second.array" />
        </FieldRow>
      </SecondField>
      <FormSection id="controller" title="Controller">
        <FieldRow>
          <Field path="controller.startK" />
          <Field path="controller.stopK" />
          <Field path="controller.inhibitC" />
          <Field path="controller.minimumRunS" />
          <FieldsWhen
            choices={['loop.layout']}
            matter={(layout) => layout !== 'straight to the slab'}
            fields={['controller.storeLimitC']}
          />
        </FieldRow>
        <Caution>
          Water let into a hot, empty array can flash to steam. Keep the array vented and the start inhibited
          while it is hot.
        </Caution>
      </FormSection>
      <FormSection id="store" title="Store">
        <FieldRow>
          <Field path="store.roomC" />
          <FieldsWhen
            choices={['loop.layout']}
            matter={(layout) => layout !== 'straight to the slab'}
            fields={STORE}
            reason="Straight to the slab there is no store; its figures are kept. The room is that of the vessel."
          />
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
