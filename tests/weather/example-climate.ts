import type { MonthlyClimate } from '@/lib/weather/monthly-climate';

/** The climate of a real typical year, by the monthly means computed from it; see ../shared/weather/formats.md. */
export const chicagoMeans: MonthlyClimate = {
  id: 'test',
  name: 'Means of a typical year at 41.98° N',
  latitudeDeg: 41.98,
  longitudeDeg: -87.92,
  timeZoneH: -6,
  elevationM: 201,
  globalKwhPerM2Day: [1.76, 2.49, 3.44, 4.39, 5.98, 6.29, 6.18, 5.16, 4.19, 2.94, 1.82, 1.5],
  dryBulbC: [-4.7, -2.5, 3.8, 9.9, 15.3, 21.1, 24.1, 21.8, 18.1, 11.0, 4.7, -3.7],
  windMPerS: [4.6, 4.5, 4.8, 4.9, 4.4, 3.9, 3.6, 3.4, 3.7, 4.2, 4.6, 4.4],
  seed: 1,
};
