import { HOURS_PER_DAY } from '@/lib/units/constants';
import { DAYS_SHOWN, WEEKS_SHOWN } from './stones';

/** Where the stones lie, in device pixels: edges snapped, so that every grout line is sharp. */
export interface MosaicLayout {
  /** 365 days, 52 weeks or the days of a loupe */
  columns: number;
  width: number;
  height: number;
  /** left edge of each column, and the right edge of the last */
  x: Int32Array;
  /** top edge of each hour, and the bottom edge of the last */
  y: Int32Array;
  grout: number;
  /** stones large enough for the full cut */
  large: boolean;
}

/** Narrower than this a year is laid in weeks [CSS px]. */
export const WEEKS_BELOW_PX = 620;
const LARGE_STONE_PX = 11;

/** Columns of the year that a width has room for. */
export function yearColumns(cssWidth: number): number {
  return cssWidth < WEEKS_BELOW_PX ? WEEKS_SHOWN : DAYS_SHOWN;
}

/**
 * Snaps a grid of stones to device pixels.
 * @param columns stones beside each other
 * @param cssWidth room for the picture [CSS px]
 * @param cssRow height of one hour [CSS px]
 * @param pixelRatio device pixels per CSS pixel
 */
export function mosaicLayout(
  columns: number,
  cssWidth: number,
  cssRow: number,
  pixelRatio: number,
): MosaicLayout {
  const width = Math.max(columns, Math.round(cssWidth * pixelRatio));
  const row = Math.max(1, Math.round(cssRow * pixelRatio));
  const pitch = width / columns;
  return {
    columns,
    width,
    height: row * HOURS_PER_DAY,
    x: Int32Array.from({ length: columns + 1 }, (_, column) => Math.round(column * pitch)),
    y: Int32Array.from({ length: HOURS_PER_DAY + 1 }, (_, hour) => hour * row),
    grout: Math.max(1, Math.min(Math.round(pixelRatio), Math.floor(pitch / 3))),
    large: Math.min(pitch, row) / pixelRatio >= LARGE_STONE_PX,
  };
}
