import { existsSync, readFileSync } from 'node:fs';

/** Real typical years beside the checkout; optional. */
const FOLDER = new URL('../../../shared/weather/', import.meta.url);

/** What was computed for a file independently of the product. */
export interface ExpectedWeather {
  file: string;
  set: string;
  lat: number;
  lon: number;
  tz_h: number;
  elev_m: number;
  ghi_kwh: number;
  dhi_kwh: number;
  dni_kwh: number;
  t_mean: number;
  t_min: number;
  t_max: number;
  hdh15_Kh: number;
  closure: { rms: number; bias: number; n: number };
  poa60_kwh: { isotropic: number; hay_davies: number; perez1990: number; surface_azimuth_from_north: number };
  monthly: { ghi_kwh: number; t_mean: number }[];
}

export const sharedWeather = {
  present: existsSync(new URL('expected.json', FOLDER)),
  absentLine: 'skipped: the optional folder ../shared/weather is not beside this checkout',
  bytes: (file: string): Uint8Array => readFileSync(new URL(file, FOLDER)),
  expected: (file: string): ExpectedWeather => {
    const all = JSON.parse(readFileSync(new URL('expected.json', FOLDER), 'utf8')) as ExpectedWeather[];
    const found = all.find((entry) => entry.file === file && entry.set === 'shared');
    if (!found) throw new Error(`no expected figures for ${file}`);
    return found;
  },
};
