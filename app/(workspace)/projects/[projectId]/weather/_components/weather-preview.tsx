import { formatFixed, formatSignificant } from '@/lib/units/display';
import type { WeatherYear } from '@/lib/weather/weather-year';
import { yearSums } from '@/lib/weather/year-sums';
import { placeWords, sourceWords } from './place-words';
import { WeatherNotes } from './weather-notes';

interface WeatherPreviewProps {
  year: WeatherYear;
  sending: boolean;
  onKeep: () => void;
}

/** What was found in a file, before it is kept. */
export function WeatherPreview({ year, sending, onKeep }: WeatherPreviewProps) {
  const sums = yearSums(year);
  const figures = [
    { label: 'sun on the level ground', value: formatSignificant(sums.globalKwhPerM2), unit: 'kWh/m²' },
    { label: 'mean outdoor air', value: formatFixed(sums.meanOutdoorC, 1), unit: '°C' },
    { label: 'coldest hour', value: formatFixed(sums.coldestC, 1), unit: '°C' },
    { label: 'hottest hour', value: formatFixed(sums.hottestC, 1), unit: '°C' },
    { label: 'mean wind', value: formatFixed(sums.meanWindMPerS, 1), unit: 'm/s' },
  ];
  return (
    <section aria-label="What was found" className="pt-3 rule-ink">
      <h3>{year.name}</h3>
      <p className="mb-4 text-note text-muted">
        {sourceWords(year)} · {placeWords(year)}
      </p>
      <dl className="mb-4 grid grid-cols-2 gap-4 sm:grid-cols-5">
        {figures.map(({ label, value, unit }) => (
          <div key={label} className="flex flex-col-reverse">
            <dt className="text-note text-muted">{label}</dt>
            <dd className="font-display text-h2">
              {value} <span className="unit">{unit}</span>
            </dd>
          </div>
        ))}
      </dl>
      <WeatherNotes notes={year.notes} />
      <button type="button" className="mt-4 framed filled" disabled={sending} onClick={onKeep}>
        {sending ? 'Sending …' : 'Keep and use this year'}
      </button>
    </section>
  );
}
