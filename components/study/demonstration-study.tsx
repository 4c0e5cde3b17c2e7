'use client';

import Link from 'next/link';
import { useMemo, useState } from 'react';
import { Segmented } from '@/components/ui/segmented';
import type { DesignRecord } from '@/lib/schemas/design';
import { readAddress } from './address';
import { designWord } from './design-word';
import { Study } from './study';
import type { StudyProps } from './study';

interface DemonstrationStudyProps extends Pick<StudyProps, 'house' | 'prices' | 'weather'> {
  designs: readonly DesignRecord[];
  /** search parameters of the address */
  params: readonly (readonly [string, string])[];
}

/** The study as a sandbox: any of the demonstration's designs, every lever, nothing saved. */
export function DemonstrationStudy({ house, prices, weather, designs, params }: DemonstrationStudyProps) {
  const [asked] = useState(() => {
    const search = new URLSearchParams(params.map(([name, value]) => [name, value]));
    const found = designs.findIndex((design) => designWord(design) === search.get('design'));
    const place = Math.max(0, found);
    return { place, ...readAddress(search, designs[place]!) };
  });
  const [place, setPlace] = useState(asked.place);
  const saved = designs[place]!;
  const keptParams = useMemo(() => ({ design: designWord(saved) }), [saved]);
  return (
    <Study
      house={house}
      prices={prices}
      weather={weather}
      subject={designWord(saved)}
      saved={saved}
      initial={asked.design}
      broken={asked.broken}
      keptParams={keptParams}
      head={
        <div className="mb-4 flex flex-wrap items-baseline justify-between gap-x-7 gap-y-1">
          <p>
            <strong>{house.name}</strong>, <span className="text-muted">an invented house</span>
          </p>
          <Segmented
            label="Design"
            options={designs.map((design, index) => ({ value: String(index), label: design.name }))}
            value={String(place)}
            onChange={(index) => setPlace(Number(index))}
          />
          <Link href="/demonstration/compare" className="sm:ml-auto">
            Compare the designs
          </Link>
        </div>
      }
      actions={() => (
        <Link href="/sign-in" className="framed">
          Sign in to save
        </Link>
      )}
    />
  );
}
