'use client';

import { useMemo, useState, type ReactNode } from 'react';
import { MONTHS, MONTH_FIRST_DAY, monthOrder } from '@/components/mosaic/calendar';
import { LegendLine } from '@/components/mosaic/legend';
import { DAYS_SHOWN, columnOfDay } from '@/components/mosaic/stones';
import { Segmented } from '@/components/ui/segmented';
import { formatFixed, formatTyped, withUnit } from '@/lib/units/display';
import { countChanges, markUnchanged, type Changes } from './changes';
import { readStones, type ComparedDesign } from './compared-design';
import { DesignFigures } from './design-figures';
import { StonesPicture } from './stones-picture';

const ROW_PX = 5;
type View = 'all' | 'changes';
const VIEWS: readonly { value: View; label: string }[] = [
  { value: 'all', label: 'All hours' },
  { value: 'changes', label: 'Hours that change hands' },
];

const COVER_WORDS: Record<ComparedDesign['fields'][number]['cover'], string> = {
  none: 'bare absorbers',
  film: 'one film over soft mats',
  glass: 'one glass over black mats',
  'twin-wall': '10 mm twin-wall sheet over black mats',
  'selective glass': 'selective-coated plates',
};

const hours = (count: number) => formatFixed(count);

function aboutWords(design: ComparedDesign, changes: Changes | undefined, first: string): string {
  const fields = design.fields.map(
    ({ areaM2, cover }) => `${withUnit(formatTyped(areaM2), 'm²')}, ${COVER_WORDS[cover]}`,
  );
  const build = `${fields.join('; ') || 'no array'}${fields.length > 1 ? '; ' : ', '}${withUnit(formatTyped(design.volumeL), 'L')}`;
  if (!changes) return `${build}: the measure for the others`;
  const gain = changes.backupToSun >= changes.sunToBackup;
  const kind = gain
    ? `${hours(changes.backupToSun)} of them from backup to sun`
    : `${hours(changes.sunToBackup)} of them from sun to backup`;
  return `${build}. ${hours(changes.hours)} hours change hands against ${first}, ${kind}`;
}

function HourAxis() {
  return (
    <div
      className="flex flex-col justify-between pr-1 text-right text-note leading-3 text-muted"
      aria-hidden="true"
    >
      <span>0</span>
      <span>12</span>
      <span>24</span>
    </div>
  );
}

function MonthAxis({ firstDay }: { firstDay: number }) {
  return (
    <div className="relative ml-7 h-6 font-display italic lg:mr-[224px]" aria-hidden="true">
      {monthOrder(firstDay).map((month) => (
        <span
          key={month}
          className="absolute border-l border-line pl-1"
          style={{ left: `${(columnOfDay(MONTH_FIRST_DAY[month]!, firstDay) / DAYS_SHOWN) * 100}%` }}
        >
          <span className="max-md:hidden">{MONTHS[month]}</span>
          <span className="md:hidden">{MONTHS[month]!.slice(0, 1)}</span>
        </span>
      ))}
    </div>
  );
}

interface StackedMosaicsProps {
  designs: readonly ComparedDesign[];
  currency: string;
  firstDay: number;
  /** beside the name of each design: where it can be opened */
  links?: readonly ReactNode[];
}

/** The designs as mosaics above each other on one time axis, each with its figures. */
export function StackedMosaics({ designs, currency, firstDay, links }: StackedMosaicsProps) {
  const [view, setView] = useState<View>('changes');
  const first = designs[0]!;
  const years = useMemo(() => {
    const measure = readStones(first.stones);
    return designs.map((design, place) => {
      const stones = readStones(design.stones);
      if (place === 0) return { stones, changed: stones, changes: undefined };
      return { stones, changed: markUnchanged(stones, measure), changes: countChanges(stones, measure) };
    });
  }, [designs, first]);
  return (
    <div>
      <div className="mb-3 flex flex-wrap items-center justify-between gap-x-8 gap-y-2">
        <div className="lg:ml-7">
          <Segmented<View> label="Stones shown" options={VIEWS} value={view} onChange={setView} />
        </div>
        <LegendLine />
      </div>
      {designs.map((design, place) => {
        const { stones, changed, changes } = years[place]!;
        const about = aboutWords(design, changes, first.name);
        return (
          <section
            key={design.id}
            aria-label={design.name}
            className="mb-4 grid grid-cols-[1.75rem_minmax(0,1fr)] gap-y-1 lg:grid-cols-[1.75rem_minmax(0,1fr)_224px]"
          >
            <p className="col-span-full lg:col-span-1 lg:col-start-2">
              <span className="font-display text-h3 font-heading">{design.name}</span>{' '}
              <span className="ml-2 text-note text-muted">
                {about}. {links?.[place]}
              </span>
            </p>
            <div className="col-start-1 grid lg:row-start-2">
              <HourAxis />
            </div>
            <div className="col-start-2 min-w-0 lg:row-start-2">
              <StonesPicture
                stones={view === 'all' ? stones : changed}
                firstDay={firstDay}
                rowPx={ROW_PX}
                label={`${design.name}: ${about}.`}
              />
            </div>
            <div className="col-span-full lg:col-span-1 lg:col-start-3 lg:row-span-2 lg:row-start-1 lg:-mr-0 lg:ml-6 lg:w-[200px] lg:pt-2">
              <DesignFigures design={design} currency={currency} />
            </div>
          </section>
        );
      })}
      <MonthAxis firstDay={firstDay} />
    </div>
  );
}
