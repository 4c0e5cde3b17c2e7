import type { Metadata } from 'next';
import { DemonstrationStudy } from '@/components/study/demonstration-study';
import { demonstration } from '@/data/demonstration/larkspur-house';
import { demonstrationWeather } from '../_components/demonstration-weather';

export const metadata: Metadata = { title: `${demonstration.house.name}, demonstration` };

interface DemonstrationPageProps {
  searchParams: Promise<Record<string, string | string[] | undefined>>;
}

/** The whole study of the invented house, without an account; nothing is kept. */
export default async function DemonstrationPage({ searchParams }: DemonstrationPageProps) {
  const params = Object.entries(await searchParams).flatMap(([name, value]) =>
    typeof value === 'string' ? [[name, value] as [string, string]] : [],
  );
  return (
    <DemonstrationStudy
      house={demonstration.house}
      prices={demonstration.prices}
      designs={demonstration.designs}
      weather={demonstrationWeather()}
      params={params}
    />
  );
}
