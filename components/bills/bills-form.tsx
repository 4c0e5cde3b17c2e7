'use client';

import { Suspense, use, useDeferredValue, useMemo, type ReactNode } from 'react';
import type { ContentsEntry } from '@/components/forms/contents';
import { useHeld } from '@/components/forms/form-context';
import { SchemaForm } from '@/components/forms/schema-form';
import type { SaveAnswer, Stored } from '@/components/forms/use-saving';
import type { Answer } from '@/lib/schemas/answer';
import { billsSchema, type BillsRecord } from '@/lib/schemas/bills';
import { houseByBills } from '@/lib/study/house-by-bills';
import { BillsContext, StudyContext, useBillsSurroundings, type BillsSurroundings } from './bills-context';
import { BillsSay } from './bills-say';
import { FuelSection } from './fuel-section';
import { MonthsSection } from './months-section';
import { ReadingsSection } from './readings-section';

const CONTENTS: readonly ContentsEntry[] = [
  { id: 'say', title: 'What they say', fields: [] },
  { id: 'readings', title: 'Readings', fields: ['way', 'rows', 'meterDigits'] },
  {
    id: 'fuel',
    title: 'Fuel and heater',
    fields: [
      'fuel',
      'unit',
      'basis',
      'kwhPerUnit',
      'efficiency',
      'otherKwhPerYear',
      'stoveKwhPerYear',
      'stoveBandShare',
    ],
  },
  { id: 'months', title: 'Months as they were', fields: ['months'] },
];

type ModelHeat = Answer<{ dayKwh: number[] }>;

export interface BillsFormProps extends BillsSurroundings {
  projectId: string;
  stored: Stored<BillsRecord>;
  typicalDayC: readonly number[] | null;
  /** heat of the simulated house by day; the page does not wait for it */
  modelHeat: Promise<ModelHeat>;
  save(data: BillsRecord, version: number): Promise<SaveAnswer<BillsRecord>>;
}

/** Works out what the readings say, as typed just now. */
function Study({
  typicalDayC,
  dayKwh,
  children,
}: Pick<BillsFormProps, 'typicalDayC'> & { dayKwh?: readonly number[] | undefined; children: ReactNode }) {
  const bills = useDeferredValue(useHeld<BillsRecord>());
  const { house } = useBillsSurroundings();
  const study = useMemo(
    () => houseByBills(bills, house, typicalDayC, dayKwh),
    [bills, house, typicalDayC, dayKwh],
  );
  return <StudyContext value={study}>{children}</StudyContext>;
}

function StudyWithModel({ modelHeat, typicalDayC }: Pick<BillsFormProps, 'modelHeat' | 'typicalDayC'>) {
  const answer = use(modelHeat);
  return (
    <Study typicalDayC={typicalDayC} dayKwh={answer.ok ? answer.dayKwh : undefined}>
      <BillsSay model={answer.ok ? 'worked' : answer.message} />
    </Study>
  );
}

/** The bills of a house: readings, fuel, the months as they were, and what follows from them. */
export function BillsForm(props: BillsFormProps) {
  const {
    projectId,
    stored,
    typicalDayC,
    modelHeat,
    save,
    house,
    houseVersion,
    weatherName,
    scale,
    release,
  } = props;
  const surroundings = useMemo(
    () => ({ house, houseVersion, weatherName, scale, release }),
    [house, houseVersion, weatherName, scale, release],
  );
  return (
    <BillsContext value={surroundings}>
      <SchemaForm
        schema={billsSchema}
        stored={stored}
        draftKey={`${projectId} bills`}
        title="Bills"
        currency="EUR"
        contents={CONTENTS}
        save={save}
      >
        <Suspense
          fallback={
            <Study typicalDayC={typicalDayC}>
              <BillsSay model="working" />
            </Study>
          }
        >
          <StudyWithModel modelHeat={modelHeat} typicalDayC={typicalDayC} />
        </Suspense>
        <Study typicalDayC={typicalDayC}>
          <ReadingsSection />
        </Study>
        <FuelSection />
        <MonthsSection />
      </SchemaForm>
    </BillsContext>
  );
}
