/** What a simulated year returns: hourly columns, twelve months, the year and its energy balance. */

/** Source that carried an hour; stored as a byte in `HourColumns.carrier`. */
export const CARRIERS = [
  'nothing needed',
  'sun, straight in',
  'sun from the store',
  'sun and backup',
  'store and backup',
  'backup',
  'not met',
] as const;
export type Carrier = (typeof CARRIERS)[number];

/** Hourly columns of one year, 8,760 values each; mean power in W, temperatures at the end of the hour in °C. */
export interface HourColumns {
  outdoorC: Float32Array;
  /** irradiance on the array's plane, mounted or not [W/m²] */
  planeWm2: Float32Array;
  /** heat put into the store by the array */
  arrayW: Float32Array;
  /** share of the hour in which the pump ran [0..1] */
  pumpShare: Float32Array;
  /** mean water temperature of the full array, plate temperature of the empty one */
  arrayC: Float32Array;
  solarHeatingW: Float32Array;
  solarTapW: Float32Array;
  backupHeatingW: Float32Array;
  backupTapW: Float32Array;
  unmetW: Float32Array;
  storeTopC: Float32Array;
  storeBottomC: Float32Array;
  /** hour by hour: layer i of hour h at [h * layers + i]; layer 0 = top */
  storeLayersC: Float32Array;
  roomC: Float32Array;
  /** mean surface temperature of the heated floor (room temperature without one) */
  floorSurfaceC: Float32Array;
  /** set supply of the emitter loop; NaN while nothing runs */
  supplyC: Float32Array;
  returnC: Float32Array;
  /** steady temperature of the empty plate, cover and back insulation face in this hour's sun; NaN when not mounted or G < 50 W/m² */
  dryPlateC: Float32Array;
  dryCoverC: Float32Array;
  dryBackC: Float32Array;
  /** index into CARRIERS */
  carrier: Uint8Array;
  /** bit p set: part p of the collector above its short-term limit when dry */
  overLimit: Uint8Array;
}

/** Energies of one month or one year [kWh] and counts. */
export interface EnergyRow {
  /** space heat given to the house */
  heatingKwh: number;
  /** hot-water load at the tap */
  tapKwh: number;
  solarHeatingKwh: number;
  solarTapKwh: number;
  backupHeatingKwh: number;
  backupTapKwh: number;
  unmetKwh: number;
  /** heat from the array into the store */
  collectedKwh: number;
  /** irradiation on the array plane while mounted, whole array */
  planeKwh: number;
  storeLossKwh: number;
  pipeLossKwh: number;
  pumpKwh: number;
  /** irradiation that could have been collected with the pump locked by the store limit (steady curve at the bottom temperature) */
  unusedKwh: number;
  starts: number;
  pumpHours: number;
  meanOutdoorC: number;
}

export interface EnergyBalance {
  inKwh: { arraySun: number; backup: number; windowSun: number; internal: number };
  outKwh: {
    arrayLoss: number;
    pipeLoss: number;
    storeLoss: number;
    houseTransmission: number;
    houseVentilation: number;
    windowReloss: number;
    floorDownward: number;
    tap: number;
    dismounted: number;
  };
  storedKwh: { array: number; pipes: number; store: number; house: number };
  residualKwh: number;
  /** |residual| / sum of inputs [-] */
  residualShare: number;
}

/** Three solar fractions side by side, see `lib/simulation/fractions.ts`. */
export interface SolarFractions {
  solar: number;
  savedThermal: number;
  savedExtended: number;
}

/** Hours and degree-hours of a part above its limits while dry in the mounted months. */
export interface PartDryness {
  name: string;
  place: 'absorber' | 'cover' | 'back';
  material: string;
  longTermLimitC: number;
  shortTermLimitC: number;
  hottestC: number;
  hottestHour: number;
  hoursAboveLong: number;
  hoursAboveShort: number;
  degreeHoursAboveLong: number;
  monthHoursAboveShort: number[];
}

export interface YearTotals extends EnergyRow {
  fractions: SolarFractions;
  /** reference house without sun and store [kWh] */
  referenceNeedKwh: number;
  /** bought final energy with and without the sun [kWh] */
  boughtKwh: number;
  referenceBoughtKwh: number;
  roomMinC: number;
  roomMaxC: number;
  floorMaxC: number;
  /** hottest floor surface in hours in which the emitters ran; −Infinity if they never did */
  floorHeatedMaxC: number;
  /** weather year of the southern half of the Earth */
  southern: boolean;
  /** of the weather year, north positive [°] */
  latitudeDeg: number;
  storeMaxC: number;
  /** highest plate temperature that the run itself reached (not the dry temperature) */
  plateMaxC: number;
  /** hours with the pump on and the full array colder than outdoor air: the curve is extrapolated [h] */
  colderThanAirHours: number;
  /** coldest water that left the store for the array [°C]; Infinity if none did */
  coldestInletC: number;
  carrierHours: number[];
  overLimitHours: number;
  designLoadW: number;
}

export interface YearResult {
  engineVersion: string;
  layers: number;
  theta: number;
  subSteps: number;
  weatherName: string;
  synthetic: boolean;
  columns: HourColumns;
  months: EnergyRow[];
  year: YearTotals;
  balance: EnergyBalance;
  dryParts: PartDryness[];
}
