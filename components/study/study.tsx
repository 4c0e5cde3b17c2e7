'use client';

import { useEffect, useMemo, useState } from 'react';
import type { ReactNode } from 'react';
import type { DesignRecord } from '@/lib/schemas/design';
import type { HouseRecord } from '@/lib/schemas/house';
import type { Prices } from '@/lib/schemas/prices';
import type { StudyAnswer } from '@/lib/study/study-question';
import { writeAddress } from './address';
import { ChecksList } from './checks-list';
import { BalanceSection, FractionsSection, ReceiptSection } from './figures-section';
import { LeversPanel } from './levers-panel';
import { MarginNote } from './margin-note';
import { sameDesign } from './same-design';
import { MonthsSection } from './months-section';
import { StudyPicture } from './study-picture';
import { winterInTheMiddle } from './study-context';
import type { StudyWeather } from './study-context';
import { useSettled } from './use-settled';
import { useYears } from './use-year';
import { Verdict } from './verdict';
import { YearFailure } from './year-failure';

export interface StudyProps {
  house: HouseRecord;
  prices: Prices;
  weather: StudyWeather;
  saved: DesignRecord;
  /** what the study is about: when it changes, the levers go to its saved design */
  subject: string;
  /** the design that the address asked for */
  initial: DesignRecord;
  /** parameters of the address that could not be read */
  broken?: readonly string[];
  /** parameters that stay in the address beside those of the levers */
  keptParams?: Readonly<Record<string, string>>;
  /** choices above the verdict */
  head?: ReactNode;
  /** what can be done with the design as it stands: save it, sign in */
  actions(design: DesignRecord, changed: boolean, setDesign: (design: DesignRecord) => void): ReactNode;
}

const ADDRESS_STILL_MS = 300;
const FIGURES_STILL_MS = 150;

/** The live study: verdict, mosaic, the hour, the levers, the checks and the figures behind them. */
export function Study(props: StudyProps) {
  const { house, prices, weather, saved, subject, initial, broken = [], keptParams, head, actions } = props;
  const [design, setDesign] = useState(initial);
  const [shown, setShown] = useState(subject);
  if (shown !== subject) {
    setShown(subject);
    setDesign(saved);
  }
  const [firstDay, setFirstDay] = useState(winterInTheMiddle(weather));
  // each question of its own, so that a lever that moves does not ask the saved design's year again
  const { source } = weather;
  const question = useMemo(
    () => ({ weather: source, house, design, prices }),
    [source, house, design, prices],
  );
  const savedQuestion = useMemo(
    () => ({ weather: source, house, design: saved, prices }),
    [source, house, saved, prices],
  );
  const questions = useMemo(() => [question, savedQuestion], [question, savedQuestion]);
  const [current, stored] = useYears(questions);
  const { answer, failure, feed, retry } = current!;
  const settled = useSettled(answer, FIGURES_STILL_MS);
  const changed = !sameDesign(design, saved);
  useAddress(design, saved, keptParams);

  return (
    <div className="pt-6">
      {head}
      {broken.length > 0 && (
        <p role="status" className="mb-3 text-hot-text">
          The address held values that could not be read ({broken.join(', ')}); the saved ones stand instead.
        </p>
      )}
      <div className="grid gap-x-7 gap-y-3 lg:grid-cols-[minmax(0,1fr)_204px]">
        <div>
          <Verdict answer={answer} house={house} prices={prices} />
          <YearFailure failure={failure} stale={answer !== undefined} onRetry={retry} />
        </div>
        <MarginNote
          weather={weather}
          design={design}
          answer={answer}
          saved={changed ? stored!.answer : undefined}
        />
      </div>
      <StudyPicture
        feed={feed}
        answer={answer}
        site={weather}
        firstDay={firstDay}
        onFirstDay={setFirstDay}
        months={settled && <MonthsSection result={settled.result} firstDay={firstDay} />}
        levers={
          <>
            <LeversPanel
              design={design}
              saved={saved}
              question={question}
              answer={answer}
              firstDay={firstDay}
              changed={changed}
              onChange={setDesign}
            >
              {actions(design, changed, setDesign)}
            </LeversPanel>
            <ChecksList answer={answer} />
          </>
        }
      />
      {settled && <StudyFigures answer={settled} prices={prices} />}
    </div>
  );
}

function StudyFigures({ answer, prices }: { answer: StudyAnswer; prices: Prices }) {
  return (
    <div className="mt-7 grid gap-7 pt-4 rule-ink md:grid-cols-2 lg:grid-cols-3">
      <BalanceSection answer={answer} />
      <FractionsSection answer={answer} />
      <ReceiptSection answer={answer} prices={prices} />
    </div>
  );
}

/** Keeps the address in step with the levers, so that it can be sent or reloaded. */
function useAddress(design: DesignRecord, saved: DesignRecord, kept: StudyProps['keptParams']) {
  useEffect(() => {
    const timer = setTimeout(() => {
      const params = writeAddress(design, saved);
      for (const [name, value] of Object.entries(kept ?? {})) params.set(name, value);
      const query = params.toString();
      const address = `${window.location.pathname}${query && `?${query}`}${window.location.hash}`;
      if (address !== `${window.location.pathname}${window.location.search}${window.location.hash}`) {
        window.history.replaceState(null, '', address);
      }
    }, ADDRESS_STILL_MS);
    return () => clearTimeout(timer);
  }, [design, saved, kept]);
}
