'use client';

import { useActionState } from 'react';
import type { WeatherHeader } from '@/lib/weather/weather-header';
import { chooseWeatherAction, deleteWeatherAction } from '../actions';
import { placeWords, sourceWords } from './place-words';
import { WeatherNotes } from './weather-notes';

interface WeatherChoicesProps {
  projectId: string;
  years: WeatherHeader[];
  chosenId: string | null;
}

/** The project's uploads and the climates that ship with the application. */
export function WeatherChoices({ projectId, years, chosenId }: WeatherChoicesProps) {
  return (
    <ul className="rule-ink">
      {years.map((year) => (
        <li
          key={year.id}
          className="grid gap-x-6 gap-y-2 py-3 rule-hair sm:grid-cols-[minmax(0,1fr)_auto]"
          aria-current={year.id === chosenId || undefined}
        >
          <div>
            <h3>{year.name}</h3>
            <p className="text-note text-muted">
              {sourceWords(year)} · {placeWords(year)}
              {year.fileName && <span className="break-all"> · {year.fileName}, kept as it came</span>}
            </p>
            <WeatherNotes notes={year.notes} />
          </div>
          <ChoiceButtons projectId={projectId} year={year} chosen={year.id === chosenId} />
        </li>
      ))}
    </ul>
  );
}

interface ChoiceButtonsProps {
  projectId: string;
  year: WeatherHeader;
  chosen: boolean;
}

function ChoiceButtons({ projectId, year, chosen }: ChoiceButtonsProps) {
  const [choice, choose, choosing] = useActionState(chooseWeatherAction, {});
  const [removal, remove, removing] = useActionState(deleteWeatherAction, {});
  const hidden = (
    <>
      <input type="hidden" name="projectId" value={projectId} />
      <input type="hidden" name="weatherYearId" value={year.id} />
    </>
  );
  return (
    <div className="flex flex-wrap items-start gap-4 sm:justify-end">
      {chosen ? (
        <strong className="inline-flex min-h-7 items-center gap-2">
          <span aria-hidden className="inline-block size-2.5 bg-ink" /> in use
        </strong>
      ) : (
        <form action={choose}>
          {hidden}
          <button type="submit" className="framed" disabled={choosing}>
            Use this year<span className="sr-only"> of {year.name}</span>
          </button>
        </form>
      )}
      {!year.builtIn && !chosen && (
        <form action={remove}>
          {hidden}
          <button type="submit" className="word min-h-7" disabled={removing}>
            Remove<span className="sr-only"> {year.name}</span>
          </button>
        </form>
      )}
      <p role="alert" className="basis-full text-hot-text empty:hidden">
        {choice.message ?? removal.message}
      </p>
    </div>
  );
}
