import Link from 'next/link';
import type { DesignRecord } from '@/lib/schemas/design';
import type { RunSummary } from '@/lib/schemas/run-summary';
import { formatFixed, formatShare, formatSignificant, formatTyped, withUnit } from '@/lib/units/display';
import { DeleteDesign } from './delete-design';

interface DesignListProps {
  projectId: string;
  designs: readonly { id: string; name: string; data: DesignRecord; lastRun: RunSummary | null }[];
}

function Figures({ run }: { run: RunSummary | null }) {
  if (!run) return <p className="text-muted">Its year is worked when it is opened or compared.</p>;
  const { year } = run;
  const figures = [
    { name: 'carried by the sun', value: formatShare(year.fractions.solar) },
    {
      name: 'heat still bought',
      value: withUnit(formatSignificant((year.backupHeatingKwh + year.backupTapKwh) / 1000, 3), 'MWh'),
    },
    {
      name: 'hours too hot, empty',
      value: year.overLimitHours ? withUnit(formatFixed(year.overLimitHours), 'h') : 'none',
      hot: year.overLimitHours > 0,
    },
  ];
  return (
    <div>
      <dl className="flex flex-wrap gap-x-6 gap-y-1">
        {figures.map(({ name, value, hot }) => (
          <div key={name} className="flex gap-2">
            <dt className="text-muted">{name}</dt>
            <dd className={`font-strong ${hot ? 'text-hot-text' : ''}`}>{value}</dd>
          </div>
        ))}
      </dl>
      {!run.current && (
        <p className="text-note text-muted">
          Of before the last change; worked again when it is opened or compared.
        </p>
      )}
    </div>
  );
}

function builtWords({ array, collector, second }: DesignRecord): string {
  const words = (field: Pick<DesignRecord, 'array' | 'collector'>) =>
    `${withUnit(formatTyped(field.array.areaM2), 'm²')}, ${field.collector.name}`;
  return second ? `${words({ array, collector })} and ${words(second)}` : words({ array, collector });
}

/** The designs of a project with the figures of their last year on the server. */
export function DesignList({ projectId, designs }: DesignListProps) {
  if (designs.length === 0) return <p>There is none yet.</p>;
  return (
    <ul className="rule-ink">
      {designs.map(({ id, name, data, lastRun }) => {
        const base = `/projects/${projectId}/designs/${id}`;
        return (
          <li
            key={id}
            className="grid gap-x-6 gap-y-1 py-3 rule-hair md:grid-cols-[minmax(0,5fr)_minmax(0,6fr)_auto]"
          >
            <div>
              <Link href={base} className="font-display text-h2">
                {name}
              </Link>
              <p className="text-note text-muted">
                {builtWords(data)}, {withUnit(formatTyped(data.store.volumeL), 'L')}
              </p>
            </div>
            <Figures run={lastRun} />
            <div className="flex flex-wrap gap-x-5 gap-y-1 md:justify-end">
              <Link href={`${base}/collector`}>
                Collector<span className="sr-only"> of {name}</span>
              </Link>
              <Link href={`${base}/loop-and-store`}>
                Loop and store<span className="sr-only"> of {name}</span>
              </Link>
              <DeleteDesign projectId={projectId} designId={id} name={name} />
            </div>
          </li>
        );
      })}
    </ul>
  );
}
