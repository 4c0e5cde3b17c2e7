'use client';

import Link from 'next/link';
import { usePathname } from 'next/navigation';
import { BigFigures } from '@/components/forms/big-figures';
import { useHeld } from '@/components/forms/form-context';
import { FormSection } from '@/components/forms/form-section';
import { houseLoss } from '@/components/forms/house-loss';
import { CheckMark } from '@/components/study/checks-list';
import type { Banded } from '@/lib/calibration/energy-signature';
import type { BillsRecord } from '@/lib/schemas/bills';
import { billsFindings } from '@/lib/study/bills-findings';
import type { BillsStudy } from '@/lib/study/house-by-bills';
import { formatFixed, formatShare, formatSignificant, withUnit } from '@/lib/units/display';
import { useBillsStudy, useBillsSurroundings } from './bills-context';
import { HingePicture } from './hinge-picture';
import { TakeLoss } from './take-loss';

const WORDS = { stop: 'Stop.', caution: 'Caution.', note: 'Note.' } as const;

const banded = ({ value, band }: Banded, unit: string, decimals = 0) =>
  withUnit(`${formatFixed(value, decimals)} ± ${formatFixed(band, decimals)}`, unit);

/** One sentence that says what to see. */
function sentence({ byBills, model }: BillsStudy, enteredWPerK: number): string {
  if (byBills.intervals.length === 0) return 'There are no readings to go by yet.';
  const { lossRange, lossWPerK, intervals } = byBills;
  if (model)
    return `${intervals.length} intervals between real readings put the loss of this house at ${banded(model.lossWPerK, 'W/K')}; shell and air as entered make ${withUnit(formatFixed(enteredWPerK), 'W/K')}.`;
  if (lossWPerK)
    return `The heat of the bills rises by ${banded(lossWPerK, 'W')} for each degree that it is colder outdoors.`;
  const range = lossRange
    ? ` It lies somewhere between ${formatFixed(lossRange.low)} and ${withUnit(formatFixed(lossRange.high), 'W/K')}.`
    : '';
  return `No slope is read from these bills, so the loss is not known to a figure.${range}`;
}

function figures({ byBills, model, hotWaterKwhPerDay }: BillsStudy, enteredWPerK: number) {
  const list: { value: string; words: string }[] = [];
  if (model) {
    list.push({
      value: banded(model.lossWPerK, 'W/K'),
      words: `loss by the bills, 95 % band; entered ${withUnit(formatFixed(enteredWPerK), 'W/K')}`,
    });
    list.push({
      value: formatFixed(enteredWPerK / model.lossWPerK.value, 2),
      words: 'drawings over bills; 0.80 to 1.25 agree',
    });
  }
  if (byBills.baseKwhPerDay)
    list.push({
      value: withUnit(formatFixed(byBills.baseKwhPerDay.value, 1), 'kWh/d'),
      words: `base load, ± ${formatFixed(byBills.baseKwhPerDay.band, 1)}; hot water as entered takes ${withUnit(formatFixed(hotWaterKwhPerDay, 1), 'kWh/d')}`,
    });
  if (byBills.yearKwh)
    list.push({
      value: withUnit(formatSignificant(byBills.yearKwh / 1000), 'MWh'),
      words: 'useful heat of a typical year by the bills',
    });
  return list;
}

function Weather() {
  const { byBills, outdoor } = useBillsStudy();
  const { weatherName } = useBillsSurroundings();
  const weatherHref = usePathname().replace(/\/bills$/, '/weather');
  const months = Object.keys(outdoor.monthMeanC).length;
  if (!weatherName)
    return (
      <p className="max-w-[70ch]">
        No weather year is chosen, so only months whose mean is typed below can be used.{' '}
        <Link href={weatherHref}>Choose a weather year</Link>.
      </p>
    );
  return (
    <p className="max-w-[70ch] text-note text-muted">
      The weather of a typical year, {weatherName}, stands for that of the {byBills.intervals.length}{' '}
      intervals
      {months > 0
        ? `, moved to the mean of ${months === 1 ? 'the one month' : `the ${months} months`} typed below`
        : ''}
      . A year colder than the typical one shows as a greater loss: type the months as they were to mend that.
    </p>
  );
}

/** The verdict over the readings: sentence, picture, figures, checks, and the way to take the loss. */
export function BillsSay({ model }: { model: 'working' | 'worked' | (string & {}) }) {
  const study = useBillsStudy();
  const bills = useHeld<BillsRecord>();
  const { house } = useBillsSurroundings();
  const { enteredWPerK } = houseLoss(house);
  const { byBills } = study;
  const findings = byBills.intervals.length > 0 ? billsFindings(study, bills, enteredWPerK) : [];
  const { fit } = byBills.signature ?? {};
  return (
    <FormSection id="say" title="What the bills say">
      <p className="max-w-[44rem] font-display text-h2" aria-live="polite">
        {sentence(study, enteredWPerK)}
      </p>
      {byBills.intervals.length > 0 && (
        <>
          <HingePicture study={study} />
          <BigFigures figures={figures(study, enteredWPerK)} />
          <ul className="rule-ink" aria-label="Checks">
            {findings.map(({ id, severity, text, source }) => (
              <li key={`${id} ${text}`} className="flex gap-3 py-1.5 rule-hair">
                <CheckMark severity={severity} />
                <p className="max-w-[70ch]">
                  <strong>{WORDS[severity]}</strong> {text}{' '}
                  <span className="text-note text-muted">{source}.</span>
                </p>
              </li>
            ))}
          </ul>
        </>
      )}
      {model === 'working' && <p role="status">The simulated house is being worked …</p>}
      {model !== 'working' && model !== 'worked' && (
        <p role="status">The house could not be simulated: {model}</p>
      )}
      {study.model && <TakeLoss study={study} enteredWPerK={enteredWPerK} />}
      <Weather />
      {study.model && byBills.signature && fit && (
        <details className="max-w-[70ch] text-note">
          <summary className="inline-flex min-h-6 items-center underline underline-offset-4">
            How was this computed?
          </summary>
          <p className="mt-1">
            Useful heat of each interval = (quantity × energy in a unit − other use) × efficiency. Through it
            a line with a hinge is laid by least squares: base load + slope × degrees below the hinge, day by
            day; slope {banded(byBills.signature.slope, 'W/K')}, hinge{' '}
            {banded(byBills.signature.hinge, '°C', 1)}, scatter about the line CV(RMSE){' '}
            {formatShare(fit.cvRmse)}. Sun through windows and the losses under a heated floor bend such a
            line, so its slope is not yet the loss: the same line is laid through the simulated heat of the
            same days, slope {withUnit(formatFixed(study.model.slopeWPerK), 'W/K')}, and the loss is that of
            the simulated house × {formatFixed(study.model.ratio.value, 3)}, the ratio of the two slopes
            {bills.stoveKwhPerYear > 0
              ? ', with the heat of the stove added to the bills by degree days'
              : ''}
            . Bands hold 95 %; they know of the scatter of the readings, not of a wrong efficiency. NMBE and
            CV(RMSE) compare the simulated heat with the bills (ASHRAE Guideline 14, one parameter).
          </p>
        </details>
      )}
    </FormSection>
  );
}
