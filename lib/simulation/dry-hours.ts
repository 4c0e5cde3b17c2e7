import {
  backFaceC,
  backLossWithFaceLayer,
  dryYear,
  dryYearFromDeclared,
  DRY_IRRADIANCE_WM2,
} from '@/lib/physics/dry-temperature';
import { hemisphericalEfficiency } from '@/lib/physics/collector';
import { countLimitHours } from '@/lib/physics/material-limits';
import { HOURS_PER_YEAR, MM_PER_M } from '@/lib/units/constants';
import type { Collector, CollectorArray } from './design';
import type { HourColumns, PartDryness } from './results';

/** Temperatures of the empty collector in every hour, mounted or not [°C]. */
export interface DryColumns {
  plateC: Float64Array;
  coverC: Float64Array;
  backC: Float64Array;
}

/** Hours that the balance reads, all of 8,760 values. */
export interface DryWeather {
  planeWm2: Float64Array;
  /** Kb Gb + Kd Gd [W/m²] */
  acceptedWm2: Float64Array;
  outdoorC: Float64Array;
  windMPerS: Float64Array;
  skyLongwaveWm2: Float64Array;
}

/**
 * Temperature of the empty collector in each hour of the year: by the two-node balance of a build, or from the
 * declared stagnation temperature of a certificate.
 * @param collector how the dry temperature is known, face layer [m²K/W]
 * @param array tilt [°] and wind factor [-]
 * @param weather the hours [W/m²], [°C], [m/s]
 * @returns plate, inner cover face and hot face of the back insulation [°C]
 * @see lib/physics/dry-temperature.ts
 */
export function dryColumns(
  collector: Collector,
  array: Pick<CollectorArray, 'tiltDeg' | 'windFactor'>,
  weather: DryWeather,
): DryColumns {
  const { dry } = collector;
  const plateC = new Float64Array(HOURS_PER_YEAR);
  const coverC = new Float64Array(HOURS_PER_YEAR);
  const backC = new Float64Array(HOURS_PER_YEAR);
  const gain = new Float64Array(HOURS_PER_YEAR);
  const share = dry.kind === 'balance' ? dry.tauAlpha : collector.curve.eta0Beam;
  for (let h = 0; h < HOURS_PER_YEAR; h++) gain[h] = share * weather.acceptedWm2[h]!;
  if (dry.kind === 'balance') {
    dryYear(
      {
        absorberEmittance: dry.absorberEmittance,
        coverEmittance: dry.coverEmittance,
        coverLongwaveTransmittance: dry.coverLongwaveTransmittance,
        coverResistanceM2KPerW: dry.coverResistanceM2KPerW,
        gapM: dry.gapMm / MM_PER_M,
        backLossWPerM2K: backLossWithFaceLayer(dry.backLossWPerM2K, collector.faceLayerM2KPerW),
        tiltDeg: array.tiltDeg,
      },
      {
        planeWm2: weather.planeWm2,
        absorbedWm2: gain,
        dryBulbC: weather.outdoorC,
        windMPerS: weather.windMPerS,
        windFactor: array.windFactor,
        skyLongwaveWm2: weather.skyLongwaveWm2,
      },
      { plateC, coverC },
    );
  } else {
    const { eta0Beam, diffuseModifier, a1, a2 } = collector.curve;
    dryYearFromDeclared(
      {
        eta0Hemispherical: hemisphericalEfficiency(eta0Beam, diffuseModifier),
        a1,
        a2,
        stagnationC: dry.stagnationC,
      },
      { planeWm2: weather.planeWm2, opticalGainWm2: gain, dryBulbC: weather.outdoorC },
      plateC,
    );
    coverC.fill(NaN);
  }
  for (let h = 0; h < HOURS_PER_YEAR; h++) {
    backC[h] = backFaceC(plateC[h]!, weather.outdoorC[h]!, dry.backLossWPerM2K, collector.faceLayerM2KPerW);
  }
  return { plateC, coverC, backC };
}

/**
 * Writes the dry temperatures of the mounted hours into the result's columns, marks the hours in which a part is
 * above its short-term limit and counts them.
 * @param dry temperatures of every hour [°C]
 * @param mounted 1 where the array hangs outside
 * @param planeWm2 irradiance on the plane [W/m²]
 * @param collector parts with their limits [°C]
 * @param columns columns of the result, filled; marks are added to `overLimit`
 * @param firstBit bit of the first part in `overLimit` [-]; bits beyond the eighth share it
 * @returns dryness of each part [°C], [h], [K h]
 * @see lib/physics/material-limits.ts
 */
export function judgeDryHours(
  dry: DryColumns,
  mounted: Uint8Array,
  planeWm2: Float64Array,
  collector: Collector,
  columns: Pick<HourColumns, 'dryPlateC' | 'dryCoverC' | 'dryBackC' | 'overLimit'>,
  firstBit = 0,
): PartDryness[] {
  const { dryPlateC, dryCoverC, dryBackC, overLimit } = columns;
  for (let h = 0; h < HOURS_PER_YEAR; h++) {
    const counts = mounted[h] === 1 && planeWm2[h]! >= DRY_IRRADIANCE_WM2;
    dryPlateC[h] = counts ? dry.plateC[h]! : NaN;
    dryCoverC[h] = counts ? dry.coverC[h]! : NaN;
    dryBackC[h] = counts ? dry.backC[h]! : NaN;
  }
  const places = { absorber: dryPlateC, cover: dryCoverC, back: dryBackC };
  return collector.parts.map((part, index) => {
    const temperatures = places[part.place];
    const bit = 1 << Math.min(7, firstBit + index);
    const hours = countLimitHours(temperatures, part.longTermLimitC, part.shortTermLimitC);
    for (let h = 0; h < HOURS_PER_YEAR; h++) {
      if (temperatures[h]! > part.shortTermLimitC) overLimit[h]! |= bit;
    }
    return {
      ...part,
      hottestC: hours.hottestC,
      hottestHour: hours.hottestHour,
      hoursAboveLong: hours.hoursAboveLong,
      hoursAboveShort: hours.hoursAboveShort,
      degreeHoursAboveLong: hours.degreeHoursAboveLong,
      monthHoursAboveShort: hours.monthHoursAboveShort,
    };
  });
}
