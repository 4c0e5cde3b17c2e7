import { DAYS_SHOWN } from './stones';

const PITCH = 3;
const HEIGHT = 9;

type Cut = (x: number) => string;

const bar =
  (top: number, height: number): Cut =>
  (x) =>
    `M${x} ${top}h2v${height}h-2z`;

/** Small cuts, layer by layer: colour and the piece of the stone that it fills. */
const LAYERS: readonly { stones: readonly number[]; fill: string; cut: Cut }[] = [
  { stones: [0], fill: 'fill-pebble', cut: bar(3, 2) },
  { stones: [1], fill: 'fill-sun', cut: bar(0, 8) },
  { stones: [2], fill: 'fill-store', cut: (x) => bar(0, 3.5)(x) + bar(4.5, 3.5)(x) },
  { stones: [3], fill: 'fill-sun', cut: bar(0, 4) },
  { stones: [4], fill: 'fill-store', cut: bar(0, 4) },
  { stones: [3, 4], fill: 'fill-backup', cut: bar(4, 4) },
  { stones: [5], fill: 'fill-backup', cut: bar(0, 8) },
  { stones: [6], fill: 'fill-ink', cut: (x) => bar(0, 2)(x) + bar(3, 2)(x) + bar(6, 2)(x) },
  { stones: [7], fill: 'fill-hot', cut: (x) => `M${x} 0h3v9h-3zM${x + 1} 3.5h1v2h-1z` },
];

/** The year as 365 small stones in one line. */
export function Frieze({ days, label }: { days: Uint8Array; label: string }) {
  return (
    <svg
      role="img"
      aria-label={label}
      viewBox={`0 0 ${DAYS_SHOWN * PITCH} ${HEIGHT}`}
      preserveAspectRatio="none"
      className="block h-[9px] w-full"
      shapeRendering="crispEdges"
    >
      {LAYERS.map(({ stones, fill, cut }) => (
        <path
          key={`${fill} ${stones.join()}`}
          className={fill}
          fillRule="evenodd"
          d={[...days].map((stone, day) => (stones.includes(stone) ? cut(day * PITCH) : '')).join('')}
        />
      ))}
    </svg>
  );
}
