import { collectorByCover } from '@/data/collectors/generic';
import { demonstration } from '@/data/demonstration/larkspur-house';
import { designSchema, type DesignRecord } from '@/lib/schemas/design';
import { houseSchema, type HouseRecord } from '@/lib/schemas/house';
import { seededRandom } from '@/lib/weather/seeded-random';

const LAYOUTS = [
  'through the store',
  'through the store',
  'vessel with exchanger',
  'straight to the slab',
] as const;

export interface RandomDesign {
  label: string;
  house: HouseRecord;
  design: DesignRecord;
}

/**
 * Very different designs drawn from fixed ranges with a fixed seed: 20 to 150 L/m², 0.011 and 0.02 kg/(s m²), floor
 *, radiators and slab, all covers and layouts, plate and coil, 8 to 40 m². None is left out of a judgement.
 */
export function randomDesigns(count: number, seed: number): RandomDesign[] {
  const random = seededRandom(seed);
  const between = (low: number, high: number) => low + (high - low) * random();
  const covers = ['film', 'glass', 'twin-wall', 'selective glass'] as const;
  return Array.from({ length: count }, (_, i) => {
    const cover = covers[i % covers.length]!;
    const flowKgPerSM2 = i % 2 === 0 ? 0.011 : 0.02;
    const onFloor = Math.floor(i / 2) % 2 === 0;
    const areaM2 = Math.round(between(8, 40));
    const litresPerM2 = 20 * (150 / 20) ** random();
    const house = houseSchema.parse({
      ...demonstration.house,
      airChangePerH: between(0.2, 0.6),
      hotWater: { ...demonstration.house.hotWater, exchanger: i % 5 === 4 ? 'coil' : 'plate' },
      capacityClass: (['light', 'medium', 'heavy'] as const)[Math.floor(random() * 3)],
      emitters: onFloor
        ? { kind: 'water', floor: { areaM2: 130 }, radiators: { ratedW: 0 } }
        : { kind: 'water', floor: { areaM2: 0 }, radiators: { ratedW: Math.round(between(14_000, 24_000)) } },
    });
    const layout = LAYOUTS[Math.floor(i / 4) % LAYOUTS.length]!;
    const loop = { layout: layout === 'straight to the slab' && !onFloor ? 'through the store' : layout };
    const design = designSchema.parse({
      name: `random ${i + 1}`,
      collector: collectorByCover[cover],
      loop,
      array: {
        areaM2,
        tiltDeg: Math.round(between(40, 80)),
        flowKgPerSM2,
        mountedMonths: Array.from({ length: 12 }, (_month, m) => i % 3 !== 0 || m < 4 || m > 8),
      },
      controller: {},
      store: { volumeL: Math.max(200, Math.round((areaM2 * litresPerM2) / 10) * 10) },
      supply: onFloor
        ? { designSupplyC: Math.round(between(33, 42)), designSpreadK: 7, limitC: 45 }
        : { designSupplyC: Math.round(between(45, 60)), designSpreadK: 12, limitC: 65 },
    });
    const label = `${cover}, ${areaM2} m², ${design.store.volumeL} L, ${flowKgPerSM2} kg/(s m²), ${onFloor ? 'floor' : 'radiators'}, ${loop.layout}`;
    return { label, house, design };
  });
}
