import type { StudyWeather } from '@/components/study/study-context';
import { climates } from '@/data/climates/climates';
import { demonstration } from '@/data/demonstration/larkspur-house';

/** The weather of the demonstration as a study wants it; its hours are made in the worker. */
export function demonstrationWeather(): StudyWeather {
  const climate = climates.find(({ id }) => id === demonstration.climateId);
  if (!climate) throw new Error(`The climate ${demonstration.climateId} of the demonstration is missing.`);
  const { name, latitudeDeg, longitudeDeg, timeZoneH } = climate;
  return {
    source: { kind: 'climate', climateId: demonstration.climateId },
    name,
    synthetic: true,
    latitudeDeg,
    longitudeDeg,
    timeZoneH,
  };
}
