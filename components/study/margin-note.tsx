import type { DesignRecord } from '@/lib/schemas/design';
import type { StudyAnswer } from '@/lib/study/study-question';
import { formatShare, formatSignificant, formatTyped, withUnit } from '@/lib/units/display';
import type { StudyWeather } from './study-context';

const KWH_PER_MWH = 1000;

interface MarginNoteProps {
  weather: StudyWeather;
  design: DesignRecord;
  answer: StudyAnswer | undefined;
  /** the saved design's year, when the levers stand elsewhere */
  saved: StudyAnswer | undefined;
}

/** Beside the verdict: which weather, how the array stands, what was saved, and what stops the design. */
export function MarginNote({ weather, design, answer, saved }: MarginNoteProps) {
  const stops = answer?.findings.filter((finding) => finding.severity === 'stop').length ?? 0;
  return (
    <aside
      aria-label="Notes to the verdict"
      className="text-note text-muted lg:border-l lg:border-hair lg:pl-4"
    >
      <p>
        Weather year: {weather.name}
        {weather.synthetic && (
          <>
            , <i>synthetic</i>
          </>
        )}
        .{' '}
        {design.second
          ? `First field at ${stands(design.array)}; second at ${stands(design.second.array)}.`
          : `Array at ${stands(design.array)}.`}
      </p>
      {stops > 0 && (
        <p className="mt-1 text-hot-text">
          <strong>{stops === 1 ? 'One check says stop' : `${stops} checks say stop`}</strong>: the figures
          hold only once that is mended.
        </p>
      )}
      {saved && (
        <p className="mt-1">
          saved: {formatShare(saved.result.year.fractions.solar)}, {withUnit(backupMwh(saved), 'MWh')} still
          bought
        </p>
      )}
    </aside>
  );
}

function stands({ tiltDeg, mountedMonths }: DesignRecord['array']): string {
  const months = mountedMonths.filter(Boolean).length;
  return `${withUnit(formatTyped(tiltDeg), '°')}, ${months === 12 ? 'all year' : `${months} months`}`;
}

function backupMwh({ result: { year } }: StudyAnswer): string {
  return formatSignificant((year.backupHeatingKwh + year.backupTapKwh) / KWH_PER_MWH, 3);
}
