import type { HourColumns } from '@/lib/simulation/results';
import { HOURS_PER_DAY, HOURS_PER_YEAR } from '@/lib/units/constants';
import { bandCut, carrierCut } from './cuts';
import { mosaicLayout } from './layout';
import type { MosaicLayout } from './layout';
import { cutSprites, layStones } from './painter';
import type { Sprites } from './painter';
import { readPalette } from './palette';
import {
  BAND_READINGS,
  CARRIER_STONES,
  DAYS_SHOWN,
  HOT_STONE,
  WEEKS_SHOWN,
  dayOfColumn,
  layDays,
  layWeeks,
  packBands,
  packCarriers,
} from './stones';
import type { ReadingId } from './stones';

/** Which stones, from which day on, and how many columns of them: 365 days, 52 weeks, or a few days. */
export interface MosaicView {
  reading: ReadingId;
  firstDay: number;
  columns: number;
}

/** Draws a year of hours into a canvas, outside of React: the columns come in, the stones lie there. */
export class MosaicPainter {
  private readonly context: CanvasRenderingContext2D | null;
  private readonly stones = new Uint8Array(HOURS_PER_YEAR);
  private image: ImageData | undefined;
  private pixels = new Uint32Array(0);
  private layout: MosaicLayout | undefined;
  private sprites: Sprites | undefined;
  private view: MosaicView | undefined;
  private columns: HourColumns | undefined;
  private size = { cssWidth: 0, cssRow: 0, pixelRatio: 1 };

  constructor(private readonly canvas: HTMLCanvasElement) {
    this.context = canvas.getContext('2d', { alpha: false });
  }

  /** Fits the canvas to its room; returns the grid that whatever lies over the canvas must follow. */
  fit(view: MosaicView, cssWidth: number, cssRow: number, pixelRatio: number): MosaicLayout {
    const layout = mosaicLayout(view.columns, cssWidth, cssRow, pixelRatio);
    this.view = view;
    this.layout = layout;
    this.size = { cssWidth, cssRow, pixelRatio };
    if (this.canvas.width !== layout.width || this.canvas.height !== layout.height || !this.image) {
      this.canvas.width = layout.width;
      this.canvas.height = layout.height;
      this.image = new ImageData(layout.width, layout.height);
      this.pixels = new Uint32Array(this.image.data.buffer);
    }
    this.recolour();
    return layout;
  }

  /** Cuts the stones anew, in the colours that the page has now. */
  recolour(): void {
    if (!this.layout || !this.view) return;
    const palette = readPalette(this.canvas);
    this.sprites = cutSprites(
      cutsOf(this.view.reading, this.layout.large),
      this.layout,
      this.size.pixelRatio,
      palette,
    );
    this.paint();
  }

  show(columns: HourColumns): void {
    this.columns = columns;
    this.paint();
  }

  private paint(): void {
    const { layout, sprites, view, image, context } = this;
    if (!layout || !sprites || !view || !image || !context) return;
    if (this.columns) pack(view.reading, this.columns, this.stones);
    layStones(this.pixels, layout, lay(this.stones, view), sprites);
    context.putImageData(image, 0, 0);
  }
}

function cutsOf(reading: ReadingId, large: boolean) {
  const bands = BAND_READINGS.find((one) => one.id === reading);
  if (!bands) return Array.from({ length: CARRIER_STONES }, (_, stone) => carrierCut(stone, large));
  const kinds = bands.edges.length;
  return Array.from({ length: kinds + 1 }, (_, band) => bandCut(band, kinds, bands.token));
}

function pack(reading: ReadingId, columns: HourColumns, stones: Uint8Array): void {
  const bands = BAND_READINGS.find((one) => one.id === reading);
  if (bands) packBands(bands, columns, stones);
  else packCarriers(columns, stones);
}

function lay(stones: Uint8Array, { reading, firstDay, columns }: MosaicView): Uint8Array {
  if (columns === DAYS_SHOWN) return layDays(stones, firstDay);
  if (columns === WEEKS_SHOWN)
    return layWeeks(stones, firstDay, CARRIER_STONES, reading === 'carrier' ? HOT_STONE : -1);
  const laid = new Uint8Array(columns * HOURS_PER_DAY);
  for (let column = 0; column < columns; column++) {
    const from = dayOfColumn(column, firstDay) * HOURS_PER_DAY;
    laid.set(stones.subarray(from, from + HOURS_PER_DAY), column * HOURS_PER_DAY);
  }
  return laid;
}
