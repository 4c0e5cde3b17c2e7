import { formatFixed, withUnit } from '@/lib/units/display';
import type { WeatherFacts } from '@/lib/weather/weather-header';

const SOURCES: Record<WeatherFacts['source'], string> = {
  epw: 'EPW file',
  tmy3: 'TMY3 file',
  synthetic: 'synthetic: made from monthly means',
};

/** Where a year comes from, in words. */
export function sourceWords(facts: Pick<WeatherFacts, 'source'>): string {
  return SOURCES[facts.source];
}

/** For example "41.98° N, 87.92° W, 201 m above the sea, UTC −6". */
export function placeWords(
  facts: Pick<WeatherFacts, 'latitudeDeg' | 'longitudeDeg' | 'elevationM' | 'timeZoneH'>,
): string {
  const { latitudeDeg, longitudeDeg, elevationM, timeZoneH } = facts;
  const latitude = `${formatFixed(Math.abs(latitudeDeg), 2)}° ${latitudeDeg < 0 ? 'S' : 'N'}`;
  const longitude = `${formatFixed(Math.abs(longitudeDeg), 2)}° ${longitudeDeg < 0 ? 'W' : 'E'}`;
  const zone = `${timeZoneH < 0 ? '−' : '+'}${Math.abs(timeZoneH)}`;
  return `${latitude}, ${longitude}, ${withUnit(formatFixed(elevationM), 'm')} above the sea, UTC ${zone}`;
}
