'use client';

import type { ReactNode } from 'react';
import { houseSchema, type HouseRecord } from '@/lib/schemas/house';
import { CalibrationLine } from './calibration-line';
import { Caution } from './caution';
import type { ContentsEntry } from './contents';
import { Field } from './field';
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
          <Field path="setback.on" />
          <Field path="setback.nightC" />
          <Field path="setback.fromHour" />
          <Field path="setback.toHour" />
          <Field path="designOutdoorC" />
          <Field path="internalGainsW" />
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
          <Field path="emitters.floor.areaM2" />
          <Field path="emitters.floor.spacingMm" />
          <Field path="emitters.floor.screedMm" />
          <Field path="emitters.floor.screedConductivity" />
          <Field path="emitters.floor.coveringM2KPerW" />
          <Field path="emitters.floor.downwardLoss" />
          <Field path="emitters.radiators.ratedW" />
          <Field path="emitters.radiators.exponent" />
          <Field path="emitters.zones.share" />
          <Field path="emitters.zones.floorShare" />
        </FieldRow>
      </FormSection>
      <FormSection id="hot-water" title="Hot water">
        <FieldRow>
          <Field path="hotWater.litresPerDay" />
          <Field path="hotWater.setC" />
          <Field path="hotWater.profile" />
          <Field path="hotWater.exchanger" />
          <Field path="hotWater.exchangerEffectiveness" />
          <Field path="hotWater.coilWPerK" />
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
          <Field path="backup.seasonalEfficiency" />
          <Field path="backup.heatPump.source" />
          <Field path="backup.heatPump.groundC" />
          <Field path="backup.heatPump.carnotShare" />
        </FieldRow>
      </FormSection>
    </SchemaForm>
  );
}
