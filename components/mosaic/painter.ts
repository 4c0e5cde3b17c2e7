import { HOURS_PER_DAY } from '@/lib/units/constants';
import { cutCell } from './cuts';
import type { Cut, Palette } from './cuts';
import type { MosaicLayout } from './layout';

/** Cells of one stone in every width and height that snapping makes: index = stone · sizes + size. */
export interface Sprites {
  cells: Uint32Array[];
  /** narrowest column; a column may be one pixel wider */
  baseWidth: number;
  rowHeight: number;
}

/** Cuts every kind of stone once, for the two widths that snapped columns have. */
export function cutSprites(
  cuts: readonly Cut[],
  layout: MosaicLayout,
  pixel: number,
  palette: Palette,
): Sprites {
  const baseWidth = Math.floor(layout.width / layout.columns);
  const rowHeight = layout.y[1]!;
  const cells = cuts.flatMap((cut) =>
    [baseWidth, baseWidth + 1].map((width) =>
      cutCell(cut, { width, height: rowHeight, grout: layout.grout, pixel }, palette),
    ),
  );
  return { cells, baseWidth, rowHeight };
}

/**
 * Lays all stones into the pixels of a picture.
 * @param pixels width × height pixels of the layout, filled
 * @param laid stones in the order of the picture: column after column, midnight on top
 */
export function layStones(
  pixels: Uint32Array,
  layout: MosaicLayout,
  laid: Uint8Array,
  sprites: Sprites,
): void {
  const { width, x: edges } = layout;
  const { cells, baseWidth, rowHeight } = sprites;
  for (let column = 0; column < layout.columns; column++) {
    const left = edges[column]!;
    const cellWidth = edges[column + 1]! - left;
    const size = cellWidth - baseWidth;
    for (let hour = 0; hour < HOURS_PER_DAY; hour++) {
      const cell = cells[laid[column * HOURS_PER_DAY + hour]! * 2 + size]!;
      let target = hour * rowHeight * width + left;
      for (let at = 0; at < cell.length; target += width - cellWidth) {
        for (const end = at + cellWidth; at < end;) pixels[target++] = cell[at++]!;
      }
    }
  }
}
