import { lowlandL52 } from '@/data/climates/lowland-l52';
import { uplandU46 } from '@/data/climates/upland-u46';
import type { MonthlyClimate } from '@/lib/weather/monthly-climate';
import { syntheticYear } from '@/lib/weather/synthetic-year';
import type { WeatherYear } from '@/lib/weather/weather-year';

/** A climate that ships with the application; its year is made when it is asked for. */
export interface Climate extends MonthlyClimate {
  weatherYear: () => WeatherYear;
}

/** The reference climates, all invented and marked synthetic. The first is that of the demonstration. */
export const climates: readonly Climate[] = [uplandU46, lowlandL52].map((means) => ({
  ...means,
  weatherYear: () => {
    const made = syntheticYear(means);
    if (!made.ok) throw new Error(made.message);
    return made.year;
  },
}));

/** The year of a shipped climate, undefined when there is none of that id. */
export function climateYear(id: string): WeatherYear | undefined {
  return climates.find((climate) => climate.id === id)?.weatherYear();
}
