'use client';

import type { ReactNode } from 'react';
import { houseSchema, type HouseRecord } from '@/lib/schemas/house';
import { CalibrationLine } from './calibration-line';
import { Caution } from './caution';
import type { ContentsEntry } from './contents';
import { Field } from './field';
import { FieldsWhen } from './fields-when';
import { FieldRow, FormSection } from './form-section';
import { RowTable } from './row-table';
import { SchemaForm } from './schema-form';
import { ShellSection } from './shell-section';
import type { SaveAnswer, Stored } from './use-saving';

const CONTENTS: readonly ContentsEntry[] = [
  {
    id: 'rooms',
    title: 'Place and rooms',
    fields: [
      'name',
      'floorAreaM2',
      'volumeM3',
      'capacityClass',
      'roomSetC',
      'setback',
      'designOutdoorC',
      'internalGainsW',
    ],
  },
  { id: 'air', title: 'Air change', fields: ['airChangePerH', 'windowOpening'] },
  { id: 'shell', title: 'The shell', fields: ['shell', 'calibration'] },
  { id: 'windows', title: 'Windows and gains', fields: ['windows'] },
  { id: 'horizon', title: 'Horizon', fields: ['horizon'] },
  { id: 'emitters', title: 'Emitters', fields: ['emitters'] },
  { id: 'hot-water', title: 'Hot water', fields: ['hotWater'] },
  { id: 'backup', title: 'Backup', fields: ['backup'] },
];

const WINDOW_COLUMNS = [
  { field: 'name', track: 'minmax(0,1.4fr)' },
  { field: 'areaM2', track: '4.5rem' },
  { field: 'azimuthDeg', track: '4.5rem' },
  { field: 'gValue', track: '4.5rem' },
  { field: 'shade', track: '4.5rem' },
  { field: 'frameFraction', track: '4.5rem' },
];

const HORIZON_COLUMNS = [
  { field: 'azimuthDeg', track: '6rem' },
  { field: 'altitudeDeg', track: '6rem' },
];

const EMITTERS = [
  'floor.areaM2',
  'floor.spacingMm',
  'floor.screedMm',
  'floor.screedConductivity',
  'floor.coveringM2KPerW',
  'floor.downwardLoss',
  'radiators.ratedW',
  'radiators.exponent',
  'zones.share',
].map((field) => `emitters.${field}`);

interface HouseFormProps {
  projectId: string;
  stored: Stored<HouseRecord>;
  currency: string;
  save(data: HouseRecord, version: number): Promise<SaveAnswer<HouseRecord>>;
  frieze?: ReactNode;
}

/** The house: rooms, air, shell, windows, emitters, hot water and backup. */
export function HouseForm({ projectId, stored, currency, save, frieze }: HouseFormProps) {
  return (
    <SchemaForm
      schema={houseSchema}
      stored={stored}
      draftKey={`${projectId} house`}
      title="House"
      currency={currency}
      contents={CONTENTS}
      save={save}
      frieze={frieze}
    >
      <FormSection id="rooms" title="Place and rooms">
        <FieldRow>
          <Field path="name" />
          <Field path="floorAreaM2" />
          <Field path="volumeM3" />
          <Field path="capacityClass" />
          <Field path="roomSetC" />
          <Field path="designOutdoorC" />
          <Field path="internalGainsW" />
          <Field path="setback.on" />
          <FieldsWhen
            choices={['setback.on']}
            matter={(on) => on === true}
            fields={['setback.nightC', 'setback.fromHour', 'setback.toHour']}
          />
        </FieldRow>
      </FormSection>
      <FormSection id="air" title="Air change">
        <FieldRow>
          <Field path="airChangePerH" />
          <Field path="windowOpening" />
        </FieldRow>
      </FormSection>
      <ShellSection>
        <CalibrationLine billsHref={`/projects/${projectId}/bills`} />
      </ShellSection>
      <FormSection id="windows" title="Windows toward the sun">
        <RowTable
          path="windows"
          caption="Windows by the way they face"
          columns={WINDOW_COLUMNS}
          addWord="Add windows"
          originField="gValue"
        />
      </FormSection>
      <FormSection id="horizon" title="Horizon">
        <p className="max-w-prose">
          The skyline as the array sees it: straight lines from point to point, all round. Trees count as they
          stand in January. Without points the sky is open.
        </p>
        <RowTable
          path="horizon"
          caption="Points of the skyline"
          columns={HORIZON_COLUMNS}
          addWord="Add a point"
          originField="altitudeDeg"
        />
      </FormSection>
      <FormSection id="emitters" title="Floor and radiators">
        <FieldRow>
          <Field path="emitters.kind" />
          <FieldsWhen
            choices={['emitters.kind']}
            matter={(kind) => kind !== 'ideal'}
            fields={EMITTERS}
            reason="Ideal heating has no floor and no radiators; their figures are kept for the way back to water."
          />
          <FieldsWhen
            choices={['emitters.kind', 'emitters.zones.share']}
            matter={(kind, share) => kind !== 'ideal' && share === 'by zone'}
            fields={['emitters.zones.floorShare']}
          />
        </FieldRow>
      </FormSection>
      <FormSection id="hot-water" title="Hot water">
        <FieldRow>
          <Field path="hotWater.litresPerDay" />
          <Field path="hotWater.setC" />
          <Field path="hotWater.profile" />
          <Field path="hotWater.exchanger" />
          <FieldsWhen
            choices={['hotWater.exchanger']}
            matter={(exchanger) => exchanger !== 'coil'}
            fields={['hotWater.exchangerEffectiveness']}
          />
          <FieldsWhen
            choices={['hotWater.exchanger']}
            matter={(exchanger) => exchanger === 'coil'}
            fields={['hotWater.coilWPerK']}
          />
          <Field path="hotWater.mainsMeanC" />
          <Field path="hotWater.mainsAmplitudeK" />
        </FieldRow>
        <Caution>
          Hot water scalds, and lukewarm stored water can breed legionella. A thermostatic mixing valve at the
          tap, the storage temperature and its upkeep follow your local code; let a licensed installer set
          them.
        </Caution>
      </FormSection>
      <FormSection id="backup" title="Backup">
        <FieldRow>
          <Field path="backup.fuel" />
          <Field path="backup.ratedW" />
          <FieldsWhen
            choices={['backup.fuel']}
            matter={(fuel) => fuel !== 'heat pump'}
            fields={['backup.seasonalEfficiency']}
          />
          <FieldsWhen
            choices={['backup.fuel']}
            matter={(fuel) => fuel === 'heat pump'}
            fields={['backup.heatPump.source', 'backup.heatPump.carnotShare']}
          />
          <FieldsWhen
            choices={['backup.fuel', 'backup.heatPump.source']}
            matter={(fuel, source) => fuel === 'heat pump' && source === 'ground'}
            fields={['backup.heatPump.groundC']}
          />
        </FieldRow>
      </FormSection>
    </SchemaForm>
  );
}
