'use client';

import Link from 'next/link';
import { useMemo } from 'react';
import { comparedDesign } from '@/components/compare/compared-design';
import { Comparison } from '@/components/compare/comparison';
import type { DesignRecord } from '@/lib/schemas/design';
import type { HouseRecord } from '@/lib/schemas/house';
import type { Prices } from '@/lib/schemas/prices';
import type { StudyWeather } from './study-context';
import { useYears } from './use-year';
import { YearFailure } from './year-failure';

interface DemonstrationComparisonProps {
  house: HouseRecord;
  prices: Prices;
  weather: StudyWeather;
  designs: readonly { word: string; design: DesignRecord }[];
}

/** The demonstration's designs side by side, worked in the browser: same house, same year. */
export function DemonstrationComparison({ house, prices, weather, designs }: DemonstrationComparisonProps) {
  const questions = useMemo(
    () => designs.map(({ design }) => ({ weather: weather.source, house, design, prices })),
    [designs, weather.source, house, prices],
  );
  const years = useYears(questions);
  const compared = useMemo(
    () =>
      years.flatMap(({ answer }, place) =>
        answer ? [comparedDesign(designs[place]!.word, answer.design, house, prices, answer.result)] : [],
      ),
    [years, designs, house, prices],
  );
  const failed = years.find(({ failure }) => failure !== undefined);
  if (compared.length < designs.length) {
    return (
      <>
        <h1 className="my-5 text-verdict font-verdict" role="status">
          The years are being worked: {compared.length} of {designs.length} done.
        </h1>
        {failed && <YearFailure failure={failed.failure} stale={false} onRetry={failed.retry} />}
      </>
    );
  }
  return (
    <Comparison
      designs={compared}
      terms={prices}
      fuel={house.backup.fuel}
      latitudeDeg={weather.latitudeDeg}
      links={designs.map(({ word, design }) => (
        <Link key={word} href={`/demonstration?design=${word}`}>
          Open<span className="sr-only"> {design.name}</span>
        </Link>
      ))}
    />
  );
}
