import { z } from 'zod';
import type { Bills } from '@/lib/calibration/calibrate-house';
import { quantity } from './quantity';

/** A calendar day as 2024-03-01, or nothing yet. */
function day(label: string) {
  return z
    .string()
    .regex(/^(\d{4}-\d{2}-\d{2})?$/, {
      error: `${label}: type a day, for example 2024-03-01 or 1 March 2024.`,
    })
    .default('')
    .meta({ label, kind: 'day' });
}

export const billRowSchema = z.object({
  from: day('First day'),
  to: day('Last day'),
  quantity: quantity({
    label: 'Quantity',
    unit: '',
    min: -1e7,
    max: 1e9,
    step: 1,
    default: 0,
    origin: 'measured',
    source: 'bill or meter',
    help: 'What was used between the two days, or what the meter shows, in the unit of the bills.',
  }),
  estimated: z
    .boolean()
    .default(false)
    .meta({ label: 'Estimated', help: 'The supplier’s estimate; it is joined with the next real reading.' }),
});

export const realMonthSchema = z.object({
  month: z
    .string()
    .regex(/^\d{4}-(0[1-9]|1[0-2])$/, { error: 'Month: type it as 2024-03.' })
    .default('2024-01')
    .meta({ label: 'Month' }),
  meanC: quantity({
    label: 'Mean outdoors',
    unit: '°C',
    min: -45,
    max: 40,
    step: 0.1,
    default: 0,
    origin: 'measured',
    source: 'a weather station near by',
    help: 'Mean air temperature of this one month as it really was.',
  }),
});

export const billsSchema = z.object({
  way: z.enum(['between two dates', 'meter readings']).default('between two dates').meta({
    label: 'A reading says',
    help: 'What was used between two dates, or what the meter showed on one day.',
  }),
  fuel: z.enum(['pellets', 'wood', 'gas', 'oil', 'liquid gas', 'electricity']).default('pellets').meta({
    label: 'Fuel of the bills',
    help: 'It offers the usual energy of a unit; nothing else depends on it.',
  }),
  unit: z.enum(['kg', 'L', 'm³', 'kWh']).default('kg').meta({
    label: 'Unit of the bills',
    help: 'Of the quantity in each row.',
  }),
  basis: z.enum(['net', 'gross', 'none']).default('net').meta({
    label: 'Calorific value',
    help: 'Net leaves out the heat of the water vapour in the flue gas, gross holds it. Efficiency and energy must be on the same one; electricity has none.',
  }),
  kwhPerUnit: quantity({
    label: 'Energy in one unit',
    unit: 'kWh',
    min: 0.1,
    max: 20,
    step: 0.01,
    default: 4.8,
    origin: 'handbook',
    source: 'wood pellets, net calorific value, per kg',
    help: 'Gas bills print it; for other fuels see the delivery note.',
  }),
  efficiency: quantity({
    label: 'Efficiency over the year',
    unit: '',
    min: 0.3,
    max: 6,
    step: 0.01,
    default: 0.84,
    origin: 'common practice',
    source: 'pellet 0.75 to 0.90, condensing gas 0.85 to 0.95 gross; no source',
    help: 'Useful heat over energy bought, of the heater that these bills fed; of a heat pump 2 to 5.',
  }),
  otherKwhPerYear: quantity({
    label: 'Cooking and other use',
    unit: 'kWh/year',
    min: 0,
    max: 30000,
    step: 50,
    default: 0,
    origin: 'assumed',
    source: 'nothing else on this meter',
    help: 'Energy on the same bills that does not heat: cooking with gas takes 500 to 1 000 kWh a year.',
  }),
  stoveKwhPerYear: quantity({
    label: 'Heat of a stove',
    unit: 'kWh/year',
    min: 0,
    max: 30000,
    step: 50,
    default: 0,
    origin: 'assumed',
    source: 'no stove',
    help: 'Heat given to the rooms by a stove that is on no bill; a stacked cubic metre of split beech gives about 1 300 kWh.',
  }),
  stoveBandShare: quantity({
    label: 'Stove known within ±',
    unit: '',
    min: 0,
    max: 1,
    step: 0.05,
    default: 0.3,
    origin: 'common practice',
    source: 'logs are seldom weighed; no source',
    help: 'Share of the stove’s heat by which it may be wrong; it widens the band of the heat loss.',
  }),
  meterDigits: quantity({
    label: 'Digits of the meter',
    unit: '',
    min: 3,
    max: 9,
    step: 1,
    default: 6,
    origin: 'typed',
    source: 'black digits, before the decimal point',
    help: 'Where the meter runs over to zero; for meter readings only.',
  }),
  rows: z.array(billRowSchema).max(400, { error: 'At most 400 readings.' }).default([]),
  months: z.array(realMonthSchema).max(400, { error: 'At most 400 months.' }).default([]),
}) satisfies z.ZodType<Bills>;

export type BillsRecord = z.infer<typeof billsSchema>;
