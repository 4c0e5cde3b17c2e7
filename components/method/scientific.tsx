import { formatFixed, formatSignificant } from '@/lib/units/display';

const SMALL = 1e-4;
const LARGE = 1e7;

/** A number of any size: plain where it reads well, else with its power of ten. */
export function Scientific({ value, figures = 2 }: { value: number; figures?: number }) {
  const size = Math.abs(value);
  if (value === 0 || !Number.isFinite(value) || (size >= SMALL && size < LARGE)) {
    return <>{formatSignificant(value, figures)}</>;
  }
  const exponent = Math.floor(Math.log10(size));
  return (
    <span className="whitespace-nowrap">
      {formatFixed(value / 10 ** exponent, figures - 1)} × 10<sup>{formatFixed(exponent)}</sup>
    </span>
  );
}
