import { collectorSchema, type CollectorRecord } from '@/lib/schemas/collector';

/*
 * Five generic classes to start from: a class is no product. generic.md beside this file says where each
 * figure comes from and which are assumed.
 */

type Part = CollectorRecord['parts'][number];
type Replacement = CollectorRecord['replacements'][number];

const epdmMat: Part = {
  name: 'absorber mat',
  place: 'absorber',
  material: 'EPDM',
  longTermLimitC: 110,
  shortTermLimitC: 140,
};
const ppMat: Part = {
  name: 'absorber mat',
  place: 'absorber',
  material: 'PP',
  longTermLimitC: 85,
  shortTermLimitC: 110,
};
const foam: Part = {
  name: 'back insulation',
  place: 'back',
  material: 'EPS',
  longTermLimitC: 75,
  shortTermLimitC: 85,
};

const newMat: Replacement = { label: 'new mat', pricePerM2: 9, everyYears: 8 };

const film = collectorSchema.parse({
  name: 'Film over soft mat',
  origin: 'generic class',
  cover: 'film',
  curve: {
    areaBasis: 'gross',
    eta0Beam: 0.757,
    b0: 0.12,
    diffuseModifier: 0.89,
    a1: 7.74,
    a2: 0.014,
    a3: 0.25,
    a4: 0,
    a6: 0,
    dryCapacityJPerM2K: 6000,
    waterContentLPerM2: 7,
  },
  widthFactor: 0.93,
  dry: {
    kind: 'balance',
    tauAlpha: 0.83,
    absorberEmittance: 0.92,
    coverEmittance: 0.15,
    coverLongwaveTransmittance: 0.8,
    gapMm: 30,
    backLossWPerM2K: 0.9,
  },
  faceLayerM2KPerW: 0,
  parts: [
    epdmMat,
    { name: 'film', place: 'cover', material: 'PE film', longTermLimitC: 55, shortTermLimitC: 75 },
    foam,
  ],
  pricePerM2: 34,
  replacements: [{ label: 'new film', pricePerM2: 4, everyYears: 3 }, newMat],
});

const glass = collectorSchema.parse({
  name: 'Single glass over black mat',
  origin: 'generic class',
  cover: 'glass',
  curve: {
    areaBasis: 'gross',
    eta0Beam: 0.757,
    b0: 0.11,
    diffuseModifier: 0.9,
    a1: 6.53,
    a2: 0.013,
    a3: 0.2,
    a4: 0,
    a6: 0,
    dryCapacityJPerM2K: 10000,
    waterContentLPerM2: 7,
  },
  widthFactor: 0.93,
  dry: {
    kind: 'balance',
    tauAlpha: 0.81,
    absorberEmittance: 0.92,
    coverEmittance: 0.88,
    coverLongwaveTransmittance: 0.02,
    gapMm: 25,
    backLossWPerM2K: 0.9,
  },
  faceLayerM2KPerW: 0,
  parts: [epdmMat, foam],
  pricePerM2: 62,
  replacements: [newMat],
});

const twinWall = collectorSchema.parse({
  name: '10 mm twin-wall sheet over black mat',
  origin: 'generic class',
  cover: 'twin-wall',
  curve: {
    areaBasis: 'gross',
    eta0Beam: 0.69,
    b0: 0.14,
    diffuseModifier: 0.88,
    a1: 4.01,
    a2: 0.011,
    a3: 0.1,
    a4: 0,
    a6: 0,
    dryCapacityJPerM2K: 7000,
    waterContentLPerM2: 7,
  },
  widthFactor: 0.93,
  dry: {
    kind: 'balance',
    tauAlpha: 0.72,
    absorberEmittance: 0.92,
    coverEmittance: 0.9,
    coverLongwaveTransmittance: 0.02,
    coverResistanceM2KPerW: 0.14,
    gapMm: 25,
    backLossWPerM2K: 0.9,
  },
  faceLayerM2KPerW: 0,
  parts: [
    epdmMat,
    { name: 'sheet', place: 'cover', material: 'PC sheet', longTermLimitC: 115, shortTermLimitC: 125 },
    foam,
  ],
  pricePerM2: 58,
  replacements: [{ label: 'new sheets', pricePerM2: 22, everyYears: 12 }, newMat],
});

const selective = collectorSchema.parse({
  name: 'Selective-coated flat plate',
  origin: 'generic class',
  cover: 'selective glass',
  curve: {
    areaBasis: 'gross',
    eta0Beam: 0.739,
    b0: 0.11,
    diffuseModifier: 0.91,
    a1: 3.51,
    a2: 0.017,
    a3: 0,
    a4: 0,
    a6: 0,
    dryCapacityJPerM2K: 6400,
    waterContentLPerM2: 1,
  },
  widthFactor: 1,
  dry: { kind: 'declared', stagnationC: 189, backLossWPerM2K: 0.7 },
  faceLayerM2KPerW: 0,
  parts: [
    {
      name: 'back insulation',
      place: 'back',
      material: 'mineral wool',
      longTermLimitC: 200,
      shortTermLimitC: 250,
    },
  ],
  pricePerM2: 340,
  replacements: [],
});

const unglazed = collectorSchema.parse({
  name: 'Unglazed mat',
  origin: 'generic class',
  cover: 'none',
  curve: {
    areaBasis: 'gross',
    eta0Beam: 0.85,
    b0: 0,
    diffuseModifier: 1,
    a1: 19,
    a2: 0,
    a3: 3,
    a4: 0.83,
    a6: 0.018,
    dryCapacityJPerM2K: 5000,
    waterContentLPerM2: 7,
  },
  widthFactor: 0.93,
  dry: {
    kind: 'balance',
    tauAlpha: 0.94,
    absorberEmittance: 0.92,
    coverEmittance: 0.92,
    coverLongwaveTransmittance: 0,
    gapMm: 5,
    backLossWPerM2K: 0.9,
  },
  faceLayerM2KPerW: 0,
  parts: [ppMat],
  pricePerM2: 20,
  replacements: [newMat],
});

/** Generic classes from the cheapest to build to the dearest. */
export const genericCollectors: readonly CollectorRecord[] = [unglazed, film, twinWall, glass, selective];

/** The generic class behind each cover. */
export const collectorByCover: Readonly<Record<CollectorRecord['cover'], CollectorRecord>> = {
  none: unglazed,
  film,
  glass,
  'twin-wall': twinWall,
  'selective glass': selective,
};
