import { collectorByCover } from '@/data/collectors/generic';
import type { CollectorRecord } from '@/lib/schemas/collector';
import { arraySchema, storeSchema, supplySchema } from '@/lib/schemas/design';
import type { DesignRecord } from '@/lib/schemas/design';
import { quantityMeta } from '@/lib/schemas/quantity';
import type { QuantityMeta } from '@/lib/schemas/quantity';

export type LeverId = 'area' | 'store' | 'supply' | 'tilt';

/** A number of the design that a slider moves; limits, unit and help stand in its schema. */
export interface Lever {
  id: LeverId;
  meta: QuantityMeta;
  /** the stretch that the slider covers; more can be typed */
  from: number;
  to: number;
  logarithmic: boolean;
  ticks: readonly number[];
  /** a stretch on which the answer hardly changes is worth showing */
  hasOptimum: boolean;
  read(design: DesignRecord): number;
  write(design: DesignRecord, value: number): DesignRecord;
}

function metaOf(schema: Parameters<typeof quantityMeta>[0]): QuantityMeta {
  const meta = quantityMeta(schema);
  if (!meta) throw new Error('A lever needs a quantity.');
  return meta;
}

export const LEVERS: readonly Lever[] = [
  {
    id: 'area',
    meta: metaOf(arraySchema.shape.areaM2),
    from: 0,
    to: 48,
    logarithmic: false,
    ticks: [0, 12, 24, 36, 48],
    hasOptimum: false,
    read: (design) => design.array.areaM2,
    write: (design, areaM2) => ({ ...design, array: { ...design.array, areaM2 } }),
  },
  {
    id: 'store',
    meta: metaOf(storeSchema.shape.volumeL),
    from: 250,
    to: 8000,
    logarithmic: true,
    ticks: [250, 500, 1000, 2000, 4000, 8000],
    hasOptimum: true,
    read: (design) => design.store.volumeL,
    write: (design, volumeL) => ({ ...design, store: { ...design.store, volumeL } }),
  },
  {
    id: 'supply',
    meta: metaOf(supplySchema.shape.designSupplyC),
    from: 28,
    to: 55,
    logarithmic: false,
    ticks: [28, 35, 45, 55],
    hasOptimum: false,
    read: (design) => design.supply.designSupplyC,
    write: (design, designSupplyC) => ({ ...design, supply: { ...design.supply, designSupplyC } }),
  },
  {
    id: 'tilt',
    meta: metaOf(arraySchema.shape.tiltDeg),
    from: 25,
    to: 90,
    logarithmic: false,
    ticks: [25, 45, 60, 75, 90],
    hasOptimum: true,
    read: (design) => design.array.tiltDeg,
    write: (design, tiltDeg) => ({ ...design, array: { ...design.array, tiltDeg } }),
  },
];

export function leverOf(id: LeverId): Lever {
  return LEVERS.find((lever) => lever.id === id)!;
}

/** Covers of the lever from the lightest build to the factory's. */
const COVER_ORDER: readonly CollectorRecord['cover'][] = ['film', 'glass', 'twin-wall', 'selective glass'];

export const COVER_LABELS: Record<CollectorRecord['cover'], { short: string; long: string }> = {
  none: { short: 'bare', long: 'no cover' },
  film: { short: 'film', long: 'film' },
  glass: { short: 'glass', long: 'glass' },
  'twin-wall': { short: 'twin-wall', long: 'twin-wall sheet' },
  'selective glass': { short: 'factory', long: 'factory plate' },
};

/** Collectors that the cover lever offers: a generic class each, the saved design's own where it has that cover. */
export function coverChoices(saved: DesignRecord): readonly CollectorRecord[] {
  const covers = saved.collector.cover === 'none' ? (['none', ...COVER_ORDER] as const) : COVER_ORDER;
  return covers.map((cover) => (cover === saved.collector.cover ? saved.collector : collectorByCover[cover]));
}

export function withCollector(design: DesignRecord, collector: CollectorRecord): DesignRecord {
  return { ...design, collector };
}

export function withMonths(design: DesignRecord, mountedMonths: boolean[]): DesignRecord {
  return { ...design, array: { ...design.array, mountedMonths } };
}
