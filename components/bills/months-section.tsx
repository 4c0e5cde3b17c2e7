'use client';

import { FormSection } from '@/components/forms/form-section';
import { RowTable } from '@/components/forms/row-table';

const COLUMNS = [
  { field: 'month', track: '7rem' },
  { field: 'meanC', track: '7rem' },
];

/** Real months, where their mean temperature is known. */
export function MonthsSection() {
  return (
    <FormSection id="months" title="The months as they were">
      <p className="max-w-[70ch] text-muted">
        Weather services publish the mean temperature of each month. Typed here, it moves the days of the
        typical year to the real month, and a cold winter is no longer taken for a leaky house.
      </p>
      <RowTable
        path="months"
        caption="Mean outdoor temperature of real months"
        columns={COLUMNS}
        addWord="Add a month"
      />
    </FormSection>
  );
}
