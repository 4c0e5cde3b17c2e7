import { demonstration } from '@/data/demonstration/larkspur-house';
import { designCost } from '@/lib/economics/design-cost';
import type { DesignRecord } from '@/lib/schemas/design';
import { CARRIERS } from '@/lib/simulation/results';
import type { EnergyRow } from '@/lib/simulation/results';
import { createColumns } from '@/lib/simulation/tally';
import type { StudyAnswer } from '@/lib/study/study-question';

interface InventedFigures {
  solarKwh: number;
  backupKwh: number;
  /** need without the sun */
  referenceKwh: number;
  perKwh: number;
}

const NO_ENERGY: EnergyRow = {
  heatingKwh: 0,
  tapKwh: 0,
  solarHeatingKwh: 0,
  solarTapKwh: 0,
  backupHeatingKwh: 0,
  backupTapKwh: 0,
  unmetKwh: 0,
  collectedKwh: 0,
  planeKwh: 0,
  storeLossKwh: 0,
  pipeLossKwh: 0,
  pumpKwh: 0,
  unusedKwh: 0,
  starts: 0,
  pumpHours: 0,
  meanOutdoorC: 0,
};

/** An answer with chosen figures and still hours, for tests of words and pictures: nothing of it is computed. */
export function inventedAnswer(design: DesignRecord, figures: InventedFigures): StudyAnswer {
  const { house, prices } = demonstration;
  const { solarKwh, backupKwh, referenceKwh, perKwh } = figures;
  const efficiency = house.backup.seasonalEfficiency;
  const year: StudyAnswer['result']['year'] = {
    ...NO_ENERGY,
    solarHeatingKwh: solarKwh,
    backupHeatingKwh: backupKwh,
    heatingKwh: solarKwh + backupKwh,
    fractions: { solar: solarKwh / (solarKwh + backupKwh), savedThermal: 0, savedExtended: 0 },
    referenceNeedKwh: referenceKwh,
    boughtKwh: backupKwh / efficiency,
    referenceBoughtKwh: referenceKwh / efficiency,
    roomMinC: 20,
    roomMaxC: 24,
    floorMaxC: 26,
    floorHeatedMaxC: 26,
    southern: false,
    latitudeDeg: 46,
    coldestInletC: 15,
    storeMaxC: 60,
    plateMaxC: 80,
    colderThanAirHours: 0,
    carrierHours: Array<number>(CARRIERS.length).fill(0),
    overLimitHours: 0,
    designLoadW: 5700,
  };
  const result: StudyAnswer['result'] = {
    engineVersion: 'invented',
    layers: 1,
    theta: 0.5,
    subSteps: 0,
    weatherName: 'invented',
    synthetic: true,
    columns: createColumns(1),
    months: Array.from({ length: 12 }, (_, month) => ({
      ...NO_ENERGY,
      solarHeatingKwh: 100 + 10 * month,
      backupHeatingKwh: 1200 - 100 * month,
      collectedKwh: 130 + 10 * month,
    })),
    year,
    balance: {
      inKwh: { arraySun: 0, backup: 0, windowSun: 0, internal: 0 },
      outKwh: {
        arrayLoss: 0,
        pipeLoss: 0,
        storeLoss: 0,
        houseTransmission: 0,
        houseVentilation: 0,
        windowReloss: 0,
        floorDownward: 0,
        tap: 0,
        dismounted: 0,
      },
      storedKwh: { array: 0, pipes: 0, store: 0, house: 0 },
      residualKwh: 0,
      residualShare: 0,
    },
    dryParts: [],
  };
  const cost = designCost(design, prices, result);
  return { design, result, cost: { ...cost, heat: { ...cost.heat, perKwh } }, findings: [] };
}
