'use client';

import { transmissionWPerK } from '@/lib/physics/design-heat-load';
import type { HouseRecord } from '@/lib/schemas/house';
import { formatFixed, formatSignificant, withUnit } from '@/lib/units/display';
import type { ReactNode } from 'react';
import { get, useFormContext, useFormState } from 'react-hook-form';
import { BigFigures } from './big-figures';
import { FormSection } from './form-section';
import { useHeld } from './form-context';
import { houseLoss } from './house-loss';
import { LossStones } from './loss-stones';
import { RowTable } from './row-table';

const COLUMNS = [
  { field: 'name', track: 'minmax(0,1.4fr)' },
  { field: 'kind', track: '6rem' },
  { field: 'areaM2', track: '5rem' },
  { field: 'uWPerM2K', track: '5rem' },
  { field: 'factor', track: '5rem' },
];

function useRowsInError(): (index: number) => boolean {
  const { control } = useFormContext();
  const { errors } = useFormState({ control });
  const rows: unknown = get(errors, 'shell');
  return (index) => Array.isArray(rows) && rows[index] !== undefined;
}

/** The shell element by element, its sum, and where the heat goes. */
export function ShellSection({ children }: { children?: ReactNode }) {
  const house = useHeld<HouseRecord>();
  const inError = useRowsInError();
  const loss = houseLoss(house);
  const sound = house.shell.filter((_, index) => !inError(index));
  const held = house.shell.length - sound.length;
  const sumWPerK = transmissionWPerK(sound);
  return (
    <FormSection id="shell" title="Heat through the shell">
      <RowTable
        path="shell"
        caption="Elements of the shell"
        columns={COLUMNS}
        addWord="Add an element"
        originField="uWPerM2K"
        derived={{
          head: (
            <>
              Loss <span className="md:block">W/K</span>
            </>
          ),
          cell: (index) => {
            const element = house.shell[index];
            if (inError(index) || !element) return <span className="text-muted">held</span>;
            return formatFixed(transmissionWPerK([element]), 1);
          },
        }}
        totals={{
          words: held
            ? `Sum without ${held === 1 ? 'the held row' : `${held} held rows`}`
            : 'Sum of the shell',
          cells: { areaM2: formatFixed(loss.shellAreaM2, 1) },
          derived: formatFixed(sumWPerK, 1),
        }}
      />
      {children}
      <LossStones loss={loss} />
      <BigFigures
        figures={[
          {
            value: withUnit(formatFixed(loss.wholeWPerK), 'W/K'),
            words: held
              ? 'whole loss, with air and the last good values of what is held'
              : 'whole loss, with air',
          },
          {
            value: withUnit(formatSignificant(loss.designW / 1000, 2), 'kW'),
            words: `on the design day, ${withUnit(formatFixed(loss.designW / house.floorAreaM2), 'W/m²')}`,
          },
        ]}
      />
    </FormSection>
  );
}
