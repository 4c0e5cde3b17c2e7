'use client';

import { useCallback, useMemo, useState } from 'react';
import type { HingeNail } from '@/components/charts/hinge-plot';
import { PlotFigure } from '@/components/charts/plot-figure';
import { dayWords, isoDay } from '@/lib/calibration/day-number';
import type { BillsStudy } from '@/lib/study/house-by-bills';
import { HOURS_PER_DAY, W_PER_KW, WH_PER_KWH } from '@/lib/units/constants';
import { formatFixed, NO_VALUE } from '@/lib/units/display';

function nailsOf({ byBills, model }: BillsStudy): HingeNail[] {
  return byBills.intervals.map((interval, i) => {
    const modelKwh = model?.heatKwh[i];
    return {
      meanC: interval.meanC,
      powerW: interval.powerW,
      fittedW: byBills.signature?.fittedW[i],
      modelW: modelKwh === undefined ? undefined : (modelKwh * WH_PER_KWH) / (interval.days * HOURS_PER_DAY),
      from: isoDay(interval.from),
      joined: interval.rows.length > 1,
    };
  });
}

/** The bills as nails and the line with its hinge, or the same as a table. */
export function HingePicture({ study }: { study: BillsStudy }) {
  const [asTable, setAsTable] = useState(false);
  const nails = useMemo(() => nailsOf(study), [study]);
  const { signature } = study.byBills;
  const load = useCallback(async () => {
    const { hingePlot } = await import('@/components/charts/hinge-plot');
    return (width: number) => hingePlot(nails, signature, width);
  }, [nails, signature]);
  return (
    <figure className="pt-2 rule-ink">
      <figcaption className="mb-2 flex flex-wrap items-baseline justify-between gap-x-4">
        <h3>Each bill at its outdoor temperature</h3>
        <button
          type="button"
          className="word text-note"
          aria-pressed={asTable}
          onClick={() => setAsTable(!asTable)}
        >
          Table
        </button>
      </figcaption>
      {asTable ? <HingeTable study={study} nails={nails} /> : <PlotFigure load={load} height={340} />}
      {!asTable && <Legend joined={nails.some((nail) => nail.joined)} model={study.model !== undefined} />}
    </figure>
  );
}

function Legend({ joined, model }: { joined: boolean; model: boolean }) {
  return (
    <ul className="mt-1 flex flex-wrap gap-x-6 text-note">
      <li className="flex items-center gap-2">
        <span className="size-2 bg-backup-text" aria-hidden="true" /> a bill, with its distance from the line
      </li>
      {joined && (
        <li className="flex items-center gap-2">
          <span className="size-2 border-2 border-backup-text" aria-hidden="true" /> joined over an estimate
        </li>
      )}
      {model && (
        <li className="flex items-center gap-2">
          <span aria-hidden="true" className="text-muted">
            +
          </span>{' '}
          the simulated house in the same days
        </li>
      )}
      {model && (
        <li className="basis-full text-muted">
          The slope holds sun through windows and losses under the floor as well; held against the slope of
          the simulated house it gives the loss below.
        </li>
      )}
    </ul>
  );
}

function HingeTable({ study, nails }: { study: BillsStudy; nails: readonly HingeNail[] }) {
  const kw = (watts: number | undefined) =>
    watts === undefined ? NO_VALUE : formatFixed(watts / W_PER_KW, 2);
  return (
    <div className="overflow-x-auto" tabIndex={0} role="region" aria-label="Bills as intervals">
      <table className="w-full">
        <thead>
          <tr>
            <th scope="col">Interval</th>
            <th scope="col" data-number>
              outdoors, °C
            </th>
            {['bill, kW', 'line, kW', 'off the line, kW', 'simulated, kW'].map((head) => (
              <th key={head} scope="col" data-number>
                {head}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {study.byBills.intervals.map((interval, i) => {
            const nail = nails[i]!;
            const off = nail.fittedW === undefined ? undefined : nail.powerW - nail.fittedW;
            return (
              <tr key={interval.from}>
                <th scope="row" className="font-normal">
                  {dayWords(interval.from)} to {dayWords(interval.to)}
                </th>
                <td data-number>{formatFixed(nail.meanC, 1)}</td>
                <td data-number>{kw(nail.powerW)}</td>
                <td data-number>{kw(nail.fittedW)}</td>
                <td data-number>{kw(off)}</td>
                <td data-number>{kw(nail.modelW)}</td>
              </tr>
            );
          })}
        </tbody>
      </table>
    </div>
  );
}
