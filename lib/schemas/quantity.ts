import { z } from 'zod';

/** Where a value comes from; the words are those of the marks on every form. */
export const ORIGINS = [
  'measured',
  'certificate',
  'standard',
  'handbook',
  'common practice',
  'assumed',
  'typed',
] as const;
export type Origin = (typeof ORIGINS)[number];

export const UNITS = [
  '',
  '%',
  '°',
  '°C',
  'K',
  'm',
  'mm',
  'm²',
  'm³',
  'L',
  'L/d',
  'L/m²',
  'L/s',
  'W',
  'kW',
  'W/K',
  'W/(m K)',
  'W/(m²K)',
  'W/(m²K²)',
  'W/(m²K⁴)',
  'm²K/W',
  'J/(m K)',
  'J/(m²K)',
  'J/(m³K)',
  'kg/(s m²)',
  's',
  's/m',
  '1/h',
  'h',
  'years',
  'money',
  'money/kWh',
  'money/L',
  'money/m',
  'money/m²',
  'money/year',
  'money/h',
  'kWh',
  'kWh/year',
  'kWh/kg',
  'kg/kWh',
] as const;
export type Unit = (typeof UNITS)[number];

/** Everything that slider, form, API error, method page and table check know of one number. */
export interface QuantityMeta {
  label: string;
  /** '' for pure numbers; 'money' stands for the project's currency */
  unit: Unit;
  min: number;
  max: number;
  step: number;
  default: number;
  /** origin of the default */
  origin: Origin;
  /** standard, table or reason behind the default */
  source: string;
  help: string;
  /** only whole numbers */
  whole?: boolean;
}

/** The sentence that a form shows when a number does not fit: what to type instead. */
export function quantityHint(meta: QuantityMeta): string {
  const unit = meta.unit && !meta.unit.startsWith('money') ? ` ${meta.unit}` : '';
  const whole = meta.whole ? 'a whole number from ' : '';
  return `${meta.label}: type ${whole}${meta.min} to ${meta.max}${unit}.`;
}

/** A bounded number with its label, unit, default, origin and help. */
export function quantity(meta: QuantityMeta) {
  const error = quantityHint(meta);
  const number = meta.whole ? z.number({ error }).int({ error }) : z.number({ error });
  return number
    .min(meta.min, { error })
    .max(meta.max, { error })
    .default(meta.default)
    .meta({ ...meta });
}

/** A short name typed by people. */
export function shortName(label: string, fallback: string) {
  return z
    .string()
    .trim()
    .min(1, { error: `${label}: type at least one letter.` })
    .max(120, { error: `${label}: 120 letters at most.` })
    .default(fallback)
    .meta({ label });
}

/** Reads the metadata back from a schema made by `quantity`; undefined for other schemas. */
export function quantityMeta(schema: z.ZodType): QuantityMeta | undefined {
  const meta = z.globalRegistry.get(schema) as Partial<QuantityMeta> | undefined;
  return meta && typeof meta.min === 'number' && typeof meta.default === 'number'
    ? (meta as QuantityMeta)
    : undefined;
}
