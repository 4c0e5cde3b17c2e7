import type { MonthlyClimate } from '@/lib/weather/monthly-climate';

/** Invented: a mild, cloudy lowland by the sea at 52° N. Origin: README.md in this folder. */
export const lowlandL52: MonthlyClimate = {
  id: 'lowland-l52',
  name: 'Lowland L-52',
  latitudeDeg: 52,
  longitudeDeg: 5,
  timeZoneH: 1,
  elevationM: 10,
  globalKwhPerM2Day: [0.72, 1.36, 2.45, 3.85, 4.8, 5.15, 4.95, 4.2, 2.95, 1.65, 0.85, 0.56],
  dryBulbC: [4.1, 4.2, 6.2, 8.8, 12.3, 15.1, 17.1, 17.0, 14.6, 11.2, 7.3, 4.9],
  windMPerS: [5.4, 5.2, 5.0, 4.5, 4.3, 4.1, 4.0, 4.0, 4.2, 4.6, 5.0, 5.3],
  seed: 52,
};
