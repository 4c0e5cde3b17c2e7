import { formatFixed } from '@/lib/units/display';
import type { HouseLoss } from './house-loss';

const STONE = 12;
const PITCH = 14;

/** Two rows of stones; the count is what says the size. */
function Stones({ count }: { count: number }) {
  const columns = Math.max(1, Math.ceil(count / 2));
  const squares = Array.from({ length: count }, (_, i) => {
    const x = (i % columns) * PITCH;
    const y = Math.floor(i / columns) * PITCH;
    return `M${x} ${y}h${STONE}v${STONE}h-${STONE}Z`;
  });
  return (
    <svg width={columns * PITCH - 2} height={2 * PITCH - 2} aria-hidden="true" className="max-w-full">
      <path d={squares.join('')} fill="currentColor" />
    </svg>
  );
}

/** Where the watts per kelvin go, laid out in stones. */
export function LossStones({ loss }: { loss: HouseLoss }) {
  const wattsPerStone = loss.wholeWPerK > 500 ? 10 : 2;
  return (
    <figure className="pt-2 rule-ink">
      <figcaption className="mb-2 flex flex-wrap items-baseline justify-between gap-x-4">
        <h3>Where {formatFixed(loss.wholeWPerK)} W/K go</h3>
        <span className="text-note text-muted">one stone: {wattsPerStone} W/K</span>
      </figcaption>
      <ul className="flex flex-wrap gap-x-6 gap-y-3">
        {loss.shares.map(({ name, wattsPerK }) => (
          <li key={name}>
            <Stones count={Math.round(wattsPerK / wattsPerStone)} />
            {name} <strong>{formatFixed(wattsPerK)}</strong>
          </li>
        ))}
      </ul>
    </figure>
  );
}
