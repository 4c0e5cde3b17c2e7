'use client';

import { useMemo, useState } from 'react';
import { LegendLine } from '@/components/mosaic/legend';
import { Mosaic } from '@/components/mosaic/mosaic';
import { NumberField } from '@/components/ui/number-field';
import { Slider } from '@/components/ui/slider';
import type { DesignRecord } from '@/lib/schemas/design';
import type { HouseRecord } from '@/lib/schemas/house';
import type { Prices } from '@/lib/schemas/prices';
import { quantityHint } from '@/lib/schemas/quantity';
import type { StudyAnswer } from '@/lib/study/study-question';
import { formatShare, formatTyped, withUnit } from '@/lib/units/display';
import { leverOf } from './levers';
import type { LeverId } from './levers';
import { winterInTheMiddle } from './study-context';
import type { StudyWeather } from './study-context';
import { useSettled } from './use-settled';
import { useYear } from './use-year';
import { pricePerKwh } from './verdict-words';
import { YearFailure } from './year-failure';

const ROW_PX = 12.5;
const START_LEVERS: readonly LeverId[] = ['area', 'supply'];

interface LiveDemonstrationProps {
  house: HouseRecord;
  prices: Prices;
  design: DesignRecord;
  weather: StudyWeather;
}

/** The mosaic of the demonstration house with two levers and one sentence. */
export function LiveDemonstration({ house, prices, design: first, weather }: LiveDemonstrationProps) {
  const [design, setDesign] = useState(first);
  const question = useMemo(
    () => ({ weather: weather.source, house, design, prices }),
    [weather.source, house, design, prices],
  );
  const { answer, failure, feed, retry } = useYear(question);
  return (
    <section aria-label="Live demonstration" className="mt-6">
      <Mosaic
        feed={feed}
        reading="carrier"
        firstDay={winterInTheMiddle(weather)}
        site={weather}
        rowPx={ROW_PX}
        label="Mosaic of the year, one stone per hour"
      />
      <div className="mt-3 flex flex-wrap justify-between gap-x-6 gap-y-1 pb-4 sm:pl-8">
        <LegendLine />
        <p className="text-muted">{house.name}, an invented house in an invented village</p>
      </div>
      <YearFailure failure={failure} stale={answer !== undefined} onRetry={retry} />
      <div className="grid gap-x-14 gap-y-4 pt-3 rule-ink md:grid-cols-2 lg:grid-cols-3">
        {START_LEVERS.map((id) => (
          <StartLever key={id} id={id} design={design} saved={first} onChange={setDesign} />
        ))}
        <StartSentence answer={answer} prices={prices} />
      </div>
    </section>
  );
}

function StartLever(props: {
  id: LeverId;
  design: DesignRecord;
  saved: DesignRecord;
  onChange(design: DesignRecord): void;
}) {
  const lever = leverOf(props.id);
  const { meta } = lever;
  const value = lever.read(props.design);
  const onChange = (next: number) => props.onChange(lever.write(props.design, next));
  return (
    <div>
      <div className="mb-1 flex items-center justify-between gap-4">
        <span>{meta.label}</span>
        <NumberField
          label={`${meta.label}, typed`}
          labelHidden
          value={value}
          unit={meta.unit}
          min={meta.min}
          max={meta.max}
          hint={quantityHint(meta)}
          help={meta.help}
          className="w-27"
          onChange={onChange}
        />
      </div>
      <Slider
        label={meta.label}
        value={value}
        min={lever.from}
        max={lever.to}
        step={meta.step}
        logarithmic={lever.logarithmic}
        ticks={lever.ticks.map((tick) => ({ value: tick, label: formatTyped(tick) }))}
        spoken={withUnit(formatTyped(value), meta.unit)}
        saved={lever.read(props.saved)}
        onChange={onChange}
      />
    </div>
  );
}

function StartSentence({ answer, prices }: { answer: StudyAnswer | undefined; prices: Prices }) {
  const solar = answer?.result.year.fractions.solar ?? 0;
  const spoken = useSettled(answer ? `The sun carries ${formatShare(solar)}.` : '', 700);
  return (
    <div>
      <p
        data-testid="start-sentence"
        className="min-h-[4rem] font-display text-[1.5rem] leading-8 text-pretty"
      >
        {answer ? (
          <>
            Of this house’s heat the sun carries{' '}
            <span className="course-sun whitespace-nowrap">{formatShare(solar)}</span>
            {solar > 0 && (
              <>
                , at{' '}
                <span className="course-ink whitespace-nowrap">
                  {pricePerKwh(answer.cost.heat.perKwh, prices.currency)}
                </span>
              </>
            )}
            .
          </>
        ) : (
          'The first year is being worked.'
        )}
      </p>
      <p className="sr-only" aria-live="polite">
        {spoken}
      </p>
    </div>
  );
}
