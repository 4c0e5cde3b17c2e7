import type { MosaicLayout } from './layout';
import { DAYS_SHOWN, LOUPE_DAYS } from './stones';

interface CursorMarksProps {
  layout: MosaicLayout;
  pixelRatio: number;
  /** day column 0 to 364 */
  column: number;
  hour: number;
  bracketFrom?: number | undefined;
}

/** The frame round the stone under the cursor, its marks on both axes, and the bracket of the loupe. */
export function CursorMarks({ layout, pixelRatio, column, hour, bracketFrom }: CursorMarksProps) {
  const at = Math.min(layout.columns - 1, Math.floor((column / DAYS_SHOWN) * layout.columns));
  const left = layout.x[at]! / pixelRatio;
  const top = layout.y[hour]! / pixelRatio;
  const width = (layout.x[at + 1]! - layout.x[at]! - layout.grout) / pixelRatio;
  const height = (layout.y[1]! - layout.grout) / pixelRatio;
  const share = (day: number) => `${(day / DAYS_SHOWN) * 100}%`;
  return (
    <div className="pointer-events-none absolute inset-0" aria-hidden="true">
      <span
        className="absolute border border-ink ring-1 ring-paper outline-2 outline-paper"
        style={{ left: left - 3, top: top - 3, width: width + 6, height: height + 6 }}
      />
      <svg
        className="absolute overflow-visible"
        style={{ left: left + width / 2, top: -2 }}
        width="1"
        height="1"
      >
        <path d="m-5-6h10l-5 6z" className="fill-ink" />
      </svg>
      <svg
        className="absolute overflow-visible"
        style={{ left: -2, top: top + height / 2 }}
        width="1"
        height="1"
      >
        <path d="m-7-5v10l6-5z" className="fill-ink" />
      </svg>
      {bracketFrom !== undefined && (
        <span
          className="absolute top-full mt-0.5 h-1.5 border border-t-0 border-ink"
          style={{ left: share(bracketFrom), width: share(LOUPE_DAYS) }}
        />
      )}
    </div>
  );
}
