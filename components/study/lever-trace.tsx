import { W_PER_KW } from '@/lib/units/constants';
import { formatSignificant } from '@/lib/units/display';
import type { TracePoint } from './use-traces';

interface LeverTraceProps {
  /** place on the rule (0 to 1) of each point */
  points: readonly (TracePoint & { place: number })[];
  /** separate choices instead of a line */
  separate?: boolean;
  range: readonly [number, number];
  now: { place: number; kwh: number } | undefined;
}

const TRACE_PX = 34;
const KWH_PER_MWH = W_PER_KW;

/** Heat still bought over the whole lever, above its rule; a square where it stands now. */
export function LeverTrace({ points, separate = false, range, now }: LeverTraceProps) {
  const [least, most] = range;
  const height = (kwh: number) =>
    most > least ? 3 + (1 - (kwh - least) / (most - least)) * (TRACE_PX - 10) : TRACE_PX / 2;
  return (
    <div
      className="relative"
      style={{ height: TRACE_PX, marginInline: 'calc(var(--stone-width) / 2)' }}
      aria-hidden="true"
    >
      {!separate && points.length > 1 && (
        <svg
          viewBox={`0 0 100 ${TRACE_PX}`}
          preserveAspectRatio="none"
          className="absolute inset-0 size-full overflow-visible"
        >
          <polyline
            points={points.map((point) => `${point.place * 100},${height(point.kwh)}`).join(' ')}
            fill="none"
            strokeWidth="1.3"
            className="stroke-backup-text"
            vectorEffect="non-scaling-stroke"
          />
        </svg>
      )}
      {separate &&
        points.map((point) => (
          <span
            key={point.value}
            className="absolute -bottom-3 -translate-x-1/2 border-l border-dotted border-backup-text"
            style={{ left: `${point.place * 100}%`, top: height(point.kwh) }}
          >
            <span className="absolute -top-1 -left-1 size-2 border border-backup-text bg-paper" />
          </span>
        ))}
      {now && (
        <span
          className="absolute -bottom-2 w-px bg-backup-text"
          style={{ left: `${now.place * 100}%`, top: height(now.kwh) }}
        >
          <span className="absolute -top-1 -left-[3.5px] size-2 bg-backup-text" />
          <span
            className={`absolute -top-4.5 text-note whitespace-nowrap text-backup-text ${now.place > 0.85 ? 'right-2' : 'left-2'}`}
          >
            {formatSignificant(now.kwh / KWH_PER_MWH, 3)}
          </span>
        </span>
      )}
    </div>
  );
}
