/** One repair or assumption made while a year was read, in words, with the rows of the user's own file. */
export interface WeatherNote {
  kind: 'repair' | 'assumption' | 'caution';
  message: string;
  /** row numbers in the file as an editor shows them, first line = 1 */
  rows?: number[];
}

/**
 * 8,760 hours of a typical year. Row h = [h, h+1) in local standard time; 29 February is left out. The years of
 * the months may differ: the order is that of the calendar, never that of the dates. All columns have 8,760 values.
 */
export interface WeatherYear {
  name: string;
  source: 'epw' | 'tmy3' | 'synthetic';
  synthetic: boolean;
  /** north positive [°] */
  latitudeDeg: number;
  /** east positive [°] */
  longitudeDeg: number;
  /** local standard time − UTC [h] */
  timeZoneH: number;
  elevationM: number;
  /**
   * From the end of row h (h + 1, the stamp of hour-ending files) to the middle of the interval that the
   * irradiance stands for [h]; nominal −0.5: the middle of row h.
   */
  sunShiftH: number;
  /** 'stamp': air temperature and wind stand at the end of the hour; 'interval': they are means of the hour */
  pointValues: 'stamp' | 'interval';
  dryBulbC: Float64Array;
  globalWm2: Float64Array;
  beamNormalWm2: Float64Array;
  diffuseWm2: Float64Array;
  windMPerS: Float64Array;
  dewPointC: Float64Array;
  /** long-wave irradiance of the sky on the horizontal [W/m²] */
  skyLongwaveWm2: Float64Array;
  pressurePa: Float64Array;
  /** reflectance of the ground [-] */
  albedo: Float64Array;
  /** hex digest of the file's bytes, filled by whoever holds the bytes */
  sha256?: string;
  notes: WeatherNote[];
}
