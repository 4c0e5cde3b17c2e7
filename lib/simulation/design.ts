import type { CapacityClass } from '@/lib/physics/house-network';
import type { IncidenceModifier } from '@/lib/physics/incidence-angle';
import type { HorizonPoint } from '@/lib/sun/horizon';

/**
 * The engine's own view of its inputs: plain objects in SI-based trade units. The zod schemas of
 * `lib/schemas` produce values assignable to these types; the engine itself knows no schema.
 */

/** Area that the coefficients of a collector curve refer to (ISO 9488, ISO 9806). */
export type AreaBasis = 'gross' | 'aperture' | 'absorber';

/** Efficiency curve in the form of ISO 9806:2017, per square metre of its area basis. */
export interface CollectorCurve {
  areaBasis: AreaBasis;
  /** η0,b [-] */
  eta0Beam: number;
  /** b0 of the beam incidence-angle modifier [-] */
  b0: number;
  /** whether the beam's modifier follows b0, a table, or two tables along and across ribs */
  modifier: IncidenceModifier;
  /** Kd [-] */
  diffuseModifier: number;
  /** a1 [W/(m²K)] at 3 m/s */
  a1: number;
  /** a2 [W/(m²K²)] */
  a2: number;
  /** a3 [J/(m³K)] */
  a3: number;
  /** a4 [-] */
  a4: number;
  /** a6 [s/m] */
  a6: number;
  /** a7 [s/m] */
  a7: number;
  /** a8 [W/(m²K⁴)] */
  a8: number;
  /** capacity of the empty collector [J/(m²K)] */
  dryCapacityJPerM2K: number;
  /** water held when full [L/m²] */
  waterContentLPerM2: number;
}

/** How the temperature of the empty collector in the sun is found. */
export type DryModel =
  | {
      kind: 'balance';
      /** (τα) at normal incidence [-] */
      tauAlpha: number;
      absorberEmittance: number;
      coverEmittance: number;
      coverLongwaveTransmittance: number;
      /** resistance between the faces of the cover: twin-wall sheet, 0 for film and glass [m²K/W] */
      coverResistanceM2KPerW: number;
      gapMm: number;
      /** loss through back and edges [W/(m²K)] */
      backLossWPerM2K: number;
    }
  | {
      kind: 'declared';
      /** declared standard stagnation temperature at 1000 W/m² and 30 °C [°C] */
      stagnationC: number;
      /** loss through back and edges [W/(m²K)] */
      backLossWPerM2K: number;
    };

/** A part of the collector whose plastics soften or age. */
export interface CollectorPart {
  name: string;
  place: 'absorber' | 'cover' | 'back';
  material: string;
  longTermLimitC: number;
  shortTermLimitC: number;
}

export interface Collector {
  name: string;
  cover: 'none' | 'film' | 'glass' | 'twin-wall' | 'selective glass';
  curve: CollectorCurve;
  /** real area of a filled soft absorber / nominal area [-] */
  widthFactor: number;
  dry: DryModel;
  /** resistance of a heat-proof layer between absorber and the back insulation proper [m²K/W] */
  faceLayerM2KPerW: number;
  parts: readonly CollectorPart[];
}

export interface CollectorArray {
  areaM2: number;
  tiltDeg: number;
  /** clockwise from north [°]; 180 = south */
  azimuthDeg: number;
  /** equal rows behind one another on level ground; 1 = none shades another */
  rows: number;
  /** from front edge to front edge [m] */
  rowSpacingM: number;
  /** of one row along the slope [m] */
  rowHeightM: number;
  /** January first, twelve entries */
  mountedMonths: readonly boolean[];
  /** from the water level of the store to the top of the array [m] */
  liftM: number;
  /** specific mass flow [kg/(s m²)] */
  flowKgPerSM2: number;
  /** outdoor pipe, each way [m] */
  pipeLengthM: number;
  pipeBoreMm: number;
  /** loss of the insulated pipe [W/(m K)] */
  pipeLossWPerMK: number;
  /** heat capacity of pipe metal or plastic, both ways together [J/(m K)] */
  pipeCapacityJPerMK: number;
  /** wind at the collector / wind of the weather year [-] */
  windFactor: number;
  /** hydraulic power / electric power [-] */
  pumpEfficiency: number;
}

export interface Controller {
  startK: number;
  stopK: number;
  /** top of the store at which charging is locked; unlocked 2 K lower [°C] */
  storeLimitC: number;
  /** no start above this plate temperature [°C] */
  inhibitC: number;
  minimumRunS: number;
}

/** How array, store and floor hang together. */
export type Layout = 'through the store' | 'vessel with exchanger' | 'straight to the slab';

export interface Loop {
  layout: Layout;
  /** exchanger between the loop's vessel and the store, at balanced flow [-] */
  exchangerEffectiveness: number;
  /** water of the vessel beyond that of array and pipes [L] */
  vesselReserveL: number;
  vesselLossWPerK: number;
  /** room air above which the array no longer heats the slab [°C] */
  slabRoomLimitC: number;
  pump: {
    /** 'flow' = the specific flow is given; 'curve' = it follows from the pump's curve and the pipes */
    kind: 'flow' | 'curve';
    shutOffHeadM: number;
    greatestFlowLPerS: number;
    /** vented: the lift is paid all the time; siphon: only while filling */
    returnPipe: 'vented' | 'siphon';
  };
}

export interface Store {
  volumeL: number;
  heightM: number;
  shape: 'box' | 'cylinder';
  layers: number;
  insulationMm: number;
  /** [W/(m K)] */
  insulationConductivity: number;
  roomC: number;
  insideHouse: boolean;
}

export interface SupplyControl {
  /** supply to the emitters at the design outdoor temperature [°C] */
  designSupplyC: number;
  /** supply − return on the design day [K] */
  designSpreadK: number;
  /** limiter [°C] */
  limitC: number;
}

export interface Design {
  collector: Collector;
  array: CollectorArray;
  /** a second field of another kind on the same store, with the same layout and controller */
  second: { collector: Collector; array: CollectorArray } | null;
  loop: Loop;
  controller: Controller;
  store: Store;
  supply: SupplyControl;
}

export interface ShellElement {
  name: string;
  kind: 'wall' | 'roof' | 'window' | 'door' | 'ground' | 'bridge';
  areaM2: number;
  uWPerM2K: number;
  /** temperature correction factor, 1 to outdoor air [-] (EN 12831-1) */
  factor: number;
}

export interface WindowGain {
  name: string;
  areaM2: number;
  /** clockwise from north [°] */
  azimuthDeg: number;
  /** total solar energy transmittance at normal incidence [-] */
  gValue: number;
  /** share left by shading [-] */
  shade: number;
  frameFraction: number;
}

export interface Floor {
  areaM2: number;
  spacingMm: number;
  screedMm: number;
  /** [W/(m K)] */
  screedConductivity: number;
  /** R_λ,B [m²K/W] */
  coveringM2KPerW: number;
  /** heat lost downwards / heat given to the floor [-] */
  downwardLoss: number;
}

export interface Radiators {
  /** at 75/65/20 °C [W] (EN 442) */
  ratedW: number;
  exponent: number;
}

export interface Emitters {
  /** 'water' = floor and radiators on one supply; 'ideal' = heat straight to the room air, as in the hourly method of ISO 13790 */
  kind: 'water' | 'ideal';
  floor: Floor;
  radiators: Radiators;
  /** how the loop's flow is shared between floor and radiators */
  zones: {
    share: 'by output' | 'by zone';
    /** share of the design load in the zone of the floor [-]; only by zone */
    floorShare: number;
  };
}

export interface HotWater {
  litresPerDay: number;
  setC: number;
  profile: 'S' | 'M' | 'L' | 'XL';
  mainsMeanC: number;
  mainsAmplitudeK: number;
  exchanger: 'plate' | 'coil';
  /** of the coil, from the store's bottom to its top [W/K] */
  coilWPerK: number;
  /** effectiveness of the plate exchanger at balanced flow [-] */
  exchangerEffectiveness: number;
}

export type Fuel = 'pellets' | 'wood' | 'gas' | 'oil' | 'electric' | 'heat pump';

export interface Backup {
  fuel: Fuel;
  ratedW: number;
  /** useful heat / bought energy over a year; not used by a heat pump [-] */
  seasonalEfficiency: number;
  heatPump: {
    source: 'outdoor air' | 'ground';
    /** temperature of a ground source [°C] */
    groundC: number;
    /** share of Carnot's coefficient of performance [-] */
    carnotShare: number;
  };
}

/** Lower set point at night. */
export interface Setback {
  on: boolean;
  nightC: number;
  /** hours of the day, local standard time; the night may pass midnight */
  fromHour: number;
  toHour: number;
}

export interface House {
  floorAreaM2: number;
  volumeM3: number;
  shell: readonly ShellElement[];
  /** loss by fuel bills / loss by shell and air change; absent = 1 */
  calibration?: { factor: number };
  airChangePerH: number;
  windows: readonly WindowGain[];
  /** skyline of the site for array and windows alike; level where empty */
  horizon: readonly HorizonPoint[];
  capacityClass: CapacityClass;
  roomSetC: number;
  setback: Setback;
  designOutdoorC: number;
  internalGainsW: number;
  /** ventilate four-fold above 25 °C */
  windowOpening: boolean;
  emitters: Emitters;
  hotWater: HotWater;
  backup: Backup;
}

export type SkyModel = 'isotropic' | 'hay-davies' | 'hdkr' | 'perez';

export interface Numerics {
  /** θ: sub-step / (layer mass / largest flow) [-] */
  theta: number;
  skyModel: SkyModel;
}
