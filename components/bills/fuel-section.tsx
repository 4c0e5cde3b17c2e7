'use client';

import { useFormContext } from 'react-hook-form';
import { Field } from '@/components/forms/field';
import { useHeld } from '@/components/forms/form-context';
import { FieldRow, FormSection } from '@/components/forms/form-section';
import { typedNumber } from '@/components/forms/typed-values';
import { usualEnergyKwh } from '@/data/fuels/calorific-values';
import type { BillsRecord } from '@/lib/schemas/bills';
import { formatTyped, withUnit } from '@/lib/units/display';

/** The usual energy of the fuel, offered where another stands in the field. */
function UsualEnergy() {
  const { fuel, unit, basis, kwhPerUnit } = useHeld<BillsRecord>();
  const { setValue } = useFormContext();
  const usual = usualEnergyKwh(fuel, unit, basis);
  if (usual === undefined || usual === kwhPerUnit) return null;
  const value = withUnit(formatTyped(usual), 'kWh');
  const words =
    unit === 'kWh'
      ? `A bill in kWh counts ${value} a unit.`
      : `One ${unit} of ${fuel} usually holds ${value}, ${basis}; a bill may print another.`;
  return (
    <p role="status">
      {words}{' '}
      <button
        type="button"
        className="word"
        onClick={() =>
          setValue('kwhPerUnit', typedNumber(usual), { shouldDirty: true, shouldValidate: true })
        }
      >
        Take {formatTyped(usual)}
      </button>
    </p>
  );
}

/** What turns the quantity of a bill into heat in the house. */
export function FuelSection() {
  return (
    <FormSection id="fuel" title="Fuel and heater">
      <FieldRow>
        <Field path="fuel" />
        <Field path="basis" />
        <Field path="kwhPerUnit" />
        <Field path="efficiency" />
      </FieldRow>
      <UsualEnergy />
      <FieldRow>
        <Field path="otherKwhPerYear" />
        <Field path="stoveKwhPerYear" />
        <Field path="stoveBandShare" />
      </FieldRow>
    </FormSection>
  );
}
