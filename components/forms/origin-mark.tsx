import { ORIGINS, type Origin, type QuantityMeta } from '@/lib/schemas/quantity';
import { readNumber } from '@/lib/units/display';

const WORDS: Record<Origin, string> = {
  measured: 'measured',
  certificate: 'certificate',
  standard: 'standard',
  handbook: 'handbook',
  'common practice': 'common practice',
  assumed: 'assumed',
  typed: 'typed',
};

/** Where the value in a field comes from: the default's own origin until somebody types another. */
export function originOf(meta: QuantityMeta, typed: string): Origin {
  return readNumber(typed) === meta.default ? meta.origin : 'typed';
}

function Cut({ origin }: { origin: Origin }) {
  switch (origin) {
    case 'measured':
      return <rect x="0" y="0" width="11" height="11" fill="currentColor" />;
    case 'certificate':
      return (
        <>
          <rect x="0.5" y="0.5" width="10" height="10" fill="none" stroke="currentColor" />
          <rect x="3" y="3" width="5" height="5" fill="currentColor" />
        </>
      );
    case 'standard':
    case 'handbook':
      return (
        <>
          <rect x="0.5" y="0.5" width="10" height="10" fill="none" stroke="currentColor" />
          <path d="M0 0H11L0 11Z" fill="currentColor" />
        </>
      );
    case 'common practice':
      return <rect x="0.5" y="0.5" width="10" height="10" fill="none" stroke="currentColor" />;
    case 'assumed':
      return (
        <rect
          x="0.5"
          y="0.5"
          width="10"
          height="10"
          fill="none"
          stroke="currentColor"
          strokeDasharray="2 1.33"
        />
      );
    case 'typed':
      return <path d="M0 9.5H11M5.5 9.5V2M3 2H8" fill="none" stroke="currentColor" strokeWidth="1.5" />;
  }
}

/** The 11 px square that says how well a value is known; its word follows it. */
export function OriginMark({ origin, word = WORDS[origin] }: { origin: Origin; word?: string }) {
  return (
    <span className="inline-flex items-baseline gap-1.5">
      <svg
        width="11"
        height="11"
        viewBox="0 0 11 11"
        aria-hidden="true"
        className="shrink-0 translate-y-px text-ink"
      >
        <Cut origin={origin} />
      </svg>
      {word}
    </span>
  );
}

/** All marks with their words, for the margin. */
export function OriginLegend() {
  const shown = ORIGINS.filter((origin) => origin !== 'handbook');
  const words: Partial<Record<Origin, string>> = {
    measured: 'measured here',
    standard: 'standard or handbook',
    typed: 'typed by you',
  };
  return (
    <ul className="space-y-2 text-note text-muted">
      {shown.map((origin) => (
        <li key={origin}>
          <OriginMark origin={origin} word={words[origin] ?? WORDS[origin]} />
        </li>
      ))}
    </ul>
  );
}
