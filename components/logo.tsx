const PITCH = 3;
const STONE = 2.4;

/** The mark as rows of stones: ink for the walls of two rooms, sun for the warmth that stands in them. */
const ROWS = ['#########', '#...#...#', '#...#...#', '#.o.#...#', '#.o.#.o.#', '#########'];

/** A warm room beside a hot one, laid in small stones. Decorative: the name stands beside it. */
export function Logo() {
  const stones = ROWS.flatMap((row, y) => [...row].map((kind, x) => ({ kind, x, y }))).filter(
    ({ kind }) => kind !== '.',
  );
  return (
    <svg width={27} height={18} viewBox="0 0 27 18" aria-hidden="true" className="shrink-0">
      {stones.map(({ kind, x, y }) => (
        <rect
          key={`${x},${y}`}
          x={x * PITCH}
          y={y * PITCH}
          width={STONE}
          height={STONE}
          className={kind === 'o' ? 'fill-sun' : 'fill-ink'}
        />
      ))}
    </svg>
  );
}
