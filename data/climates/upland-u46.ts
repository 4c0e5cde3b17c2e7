import type { MonthlyClimate } from '@/lib/weather/monthly-climate';

/** Invented: a cold, sunny upland at 46° N, 800 m. Origin: README.md in this folder. */
export const uplandU46: MonthlyClimate = {
  id: 'upland-u46',
  name: 'Upland U-46',
  latitudeDeg: 46,
  longitudeDeg: 11,
  timeZoneH: 1,
  elevationM: 800,
  globalKwhPerM2Day: [1.32, 2.03, 3.08, 4.02, 4.67, 5.04, 5.05, 4.38, 3.37, 2.24, 1.36, 1.05],
  dryBulbC: [-3.5, -2.2, 2.0, 6.1, 10.9, 14.5, 16.9, 16.4, 12.2, 7.0, 1.2, -2.9],
  windMPerS: [2.2, 2.3, 2.7, 2.9, 2.7, 2.6, 2.5, 2.4, 2.3, 2.2, 2.2, 2.1],
  seed: 85,
};
