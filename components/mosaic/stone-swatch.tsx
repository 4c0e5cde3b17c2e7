import { HOT_STONE } from './stones';

const SIZE = 14;

/** A stone large enough to show its cut, for the legend; drawn, so that it prints and follows forced colours. */
export function StoneSwatch({ stone }: { stone: number }) {
  return (
    <svg width={SIZE} height={SIZE} viewBox="0 0 14 14" aria-hidden="true" className="shrink-0">
      {cutOf(stone)}
    </svg>
  );
}

function cutOf(stone: number) {
  switch (stone) {
    case 0:
      return <rect x="5" y="5" width="4" height="4" className="fill-pebble" />;
    case 1:
      return (
        <>
          <rect width="14" height="14" className="fill-sun" />
          <circle cx="7" cy="7" r="2.4" className="fill-paper" />
        </>
      );
    case 2:
      return <path d="M0 0h14v3H0zM0 5.5h14v3H0zM0 11h14v3H0z" className="fill-store" />;
    case 3:
    case 4:
      return (
        <>
          <rect width="14" height="14" className="fill-backup" />
          <path d="M0 0h14L0 14z" className={stone === 3 ? 'fill-sun' : 'fill-store'} />
        </>
      );
    case 5:
      return (
        <>
          <rect width="14" height="14" className="fill-backup" />
          <path
            d="M0 5 5 0M0 9.5 9.5 0M0 14 14 0M4.5 14 14 4.5M9 14l5-5"
            className="stroke-paper"
            strokeWidth=".9"
          />
        </>
      );
    case HOT_STONE:
      return (
        <>
          <rect width="14" height="14" className="fill-hot" />
          <path d="m3 3 8 8m0-8-8 8" className="stroke-paper" strokeWidth="1.8" />
        </>
      );
    default:
      return (
        <>
          <rect x="1" y="1" width="12" height="12" fill="none" className="stroke-ink" strokeWidth="2" />
          <rect x="5" y="5" width="4" height="4" className="fill-ink" />
        </>
      );
  }
}

const TOKEN_FILL = { ink: 'fill-ink', sun: 'fill-sun', store: 'fill-store', hot: 'fill-hot' } as const;

/** A stone of a reading: as tall as its band. */
export function BandSwatch({
  band,
  bands,
  token,
}: {
  band: number;
  bands: number;
  token: keyof typeof TOKEN_FILL;
}) {
  const tall = (SIZE * band) / bands;
  return (
    <svg width={SIZE} height={SIZE} viewBox="0 0 14 14" aria-hidden="true" className="shrink-0">
      {band === 0 ? (
        cutOf(0)
      ) : (
        <rect x="3" y={SIZE - tall} width="8" height={tall} className={TOKEN_FILL[token]} />
      )}
    </svg>
  );
}
