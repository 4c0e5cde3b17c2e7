import { collectorByCover } from '@/data/collectors/generic';
import { designSchema, type DesignRecord } from '@/lib/schemas/design';
import { houseSchema } from '@/lib/schemas/house';
import { pricesSchema } from '@/lib/schemas/prices';

/*
 * The demonstration: an invented house in an invented village. larkspur-house.md beside this file says what it
 * is for. Nothing here is a measurement.
 */

const house = houseSchema.parse({
  name: 'Larkspur House',
  floorAreaM2: 140,
  volumeM3: 340,
  shell: [
    { name: 'Outer wall, south', kind: 'wall', areaM2: 38.8, uWPerM2K: 0.62 },
    { name: 'Outer wall, others', kind: 'wall', areaM2: 61.2, uWPerM2K: 0.62 },
    { name: 'Roof slope', kind: 'roof', areaM2: 96.9, uWPerM2K: 0.32 },
    { name: 'Windows, garden', kind: 'window', areaM2: 6, uWPerM2K: 1.4 },
    { name: 'Windows, others', kind: 'window', areaM2: 16, uWPerM2K: 1.6 },
    { name: 'Ground floor slab', kind: 'ground', areaM2: 70, uWPerM2K: 0.36, factor: 0.6 },
  ],
  airChangePerH: 0.24,
  windows: [
    { name: 'Garden', areaM2: 6, azimuthDeg: 192, gValue: 0.62, shade: 0.8 },
    { name: 'Street', areaM2: 5.1, azimuthDeg: 12, gValue: 0.7, shade: 0.6 },
    { name: 'Gables, together', areaM2: 10.9, azimuthDeg: 102, gValue: 0.7, shade: 0.45 },
  ],
  // the hill to the south-east
  horizon: [
    { azimuthDeg: 95, altitudeDeg: 0 },
    { azimuthDeg: 120, altitudeDeg: 9 },
    { azimuthDeg: 150, altitudeDeg: 9 },
    { azimuthDeg: 175, altitudeDeg: 0 },
  ],
  emitters: { floor: {}, radiators: {} },
  hotWater: {},
  backup: {},
});

const prices = pricesSchema.parse({});

const mats = collectorByCover.film;
const mineralWoolFace = 0.75;

function design(input: Parameters<typeof designSchema.parse>[0]): DesignRecord {
  return designSchema.parse(input);
}

/** Film over soft mats, steep, October to April, mineral wool before the foam: passes its checks. */
const filmRows = design({
  name: 'Film rows, winter',
  collector: {
    ...mats,
    name: 'Film over soft mat, wool-faced',
    origin: 'own build',
    faceLayerM2KPerW: mineralWoolFace,
    pricePerM2: 38,
  },
  array: { areaM2: 24, tiltDeg: 70, mountedMonths: months('10-04') },
  controller: {},
  store: {},
  supply: {},
});

/** The tempting one: more heat for little money, and too hot when it stands dry. */
const twinWallRows = design({
  name: 'Twin-wall rows, all year',
  collector: { ...collectorByCover['twin-wall'], origin: 'own build' },
  array: { areaM2: 24, tiltDeg: 65 },
  controller: {},
  store: {},
  supply: {},
});

/** Ten square metres of selective-coated plates from a factory. */
const factoryTen = design({
  name: 'Factory ten',
  collector: { ...collectorByCover['selective glass'], origin: 'certificate' },
  array: { areaM2: 10, tiltDeg: 65, flowKgPerSM2: 0.015 },
  controller: {},
  store: { volumeL: 1000 },
  supply: {},
});

function months(range: '10-04'): boolean[] {
  const [from, to] = range.split('-').map(Number) as [number, number];
  return Array.from({ length: 12 }, (_, i) => i + 1 >= from || i + 1 <= to);
}

export const demonstration = {
  climateId: 'upland-u46',
  house,
  prices,
  designs: [filmRows, twinWallRows, factoryTen],
} as const;
