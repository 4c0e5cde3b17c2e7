import { describe, expect, it } from 'vitest';
import { bandCut, carrierCut, cutCell } from '@/components/mosaic/cuts';
import type { Palette } from '@/components/mosaic/cuts';
import { mosaicLayout, yearColumns } from '@/components/mosaic/layout';
import { cutSprites, layStones } from '@/components/mosaic/painter';
import { hexColour } from '@/components/mosaic/palette';
import {
  BAND_READINGS,
  CARRIER_STONES,
  FIRST_OF_JULY,
  HOT_STONE,
  columnOfDay,
  countStones,
  dayOfColumn,
  layDays,
  layWeeks,
  packBands,
  packCarriers,
} from '@/components/mosaic/stones';
import type { HourColumns } from '@/lib/simulation/results';

const palette: Palette = {
  paper: hexColour('#f5f0e6'),
  ink: hexColour('#1f1b15'),
  sun: hexColour('#b97f18'),
  store: hexColour('#237f7a'),
  backup: hexColour('#252d52'),
  hot: hexColour('#97301a'),
  pebble: hexColour('#c4b798'),
};

describe('packing a year into stones', () => {
  it('lays the mark of a too hot empty collector over the carrier', () => {
    const carrier = Uint8Array.of(0, 1, 5);
    const stones = new Uint8Array(3);
    packCarriers({ carrier, overLimit: Uint8Array.of(0, 4, 0) }, stones);
    expect([...stones]).toEqual([0, HOT_STONE, 5]);
    expect(countStones(stones, CARRIER_STONES)).toEqual([1, 0, 0, 0, 0, 1, 0, 1]);
  });

  it('counts the edges that a reading reaches and leaves unknown hours empty', () => {
    const room = BAND_READINGS.find((reading) => reading.id === 'room')!;
    const roomC = Float32Array.of(Number.NaN, 16.9, 17, 20.5, 30);
    const stones = new Uint8Array(5);
    packBands(room, { roomC } as HourColumns, stones);
    expect([...stones]).toEqual([0, 0, 1, 3, 6]);
  });

  it('reads powers in kW from a column in W', () => {
    const output = BAND_READINGS.find((reading) => reading.id === 'output')!;
    const stones = new Uint8Array(3);
    packBands(output, { arrayW: Float32Array.of(0, 1500, 12000) } as HourColumns, stones);
    expect([...stones]).toEqual([0, 2, 6]);
  });

  it('puts 1 July first and 30 June last', () => {
    const year = Uint8Array.from({ length: 8760 }, (_, hour) => Math.floor(hour / 24) % 251);
    const laid = layDays(year, FIRST_OF_JULY);
    expect(laid[0]).toBe(181);
    expect(laid[364 * 24]).toBe(180);
    expect(dayOfColumn(0, FIRST_OF_JULY)).toBe(181);
    expect(columnOfDay(180, FIRST_OF_JULY)).toBe(364);
    for (let day = 0; day < 365; day++)
      expect(dayOfColumn(columnOfDay(day, FIRST_OF_JULY), FIRST_OF_JULY)).toBe(day);
  });

  it('lays weeks by majority, keeps a warning, and loses no day', () => {
    const year = new Uint8Array(8760).fill(5);
    for (const day of [0, 1, 2, 3]) year[day * 24 + 12] = 1;
    year[8 * 24 + 12] = HOT_STONE;
    for (const day of [357, 358, 359, 360, 361]) year[day * 24] = 2;
    const laid = layWeeks(year, 0, CARRIER_STONES, HOT_STONE);
    expect(laid).toHaveLength(52 * 24);
    expect(laid[12]).toBe(1);
    expect(laid[24 + 12]).toBe(HOT_STONE);
    expect(laid[51 * 24]).toBe(2);
    expect(laid[51 * 24 + 1]).toBe(5);
  });
});

describe('cutting and laying stones', () => {
  const box = { width: 3, height: 9, grout: 1, pixel: 1 };
  const at = (cell: Uint32Array, x: number, y: number, width = 3) => cell[y * width + x]!;
  const paper = cutCell(() => 'paper', { ...box, width: 1, height: 1 }, palette)[0]!;

  it('tells the stones apart by their cut alone', () => {
    const black = Object.fromEntries(
      Object.keys(palette).map((name) => [name, name === 'paper' ? [255, 255, 255] : [0, 0, 0]]),
    ) as unknown as Palette;
    const shapes = (stones: number[], size: typeof box) =>
      new Set(stones.map((stone) => cutCell(carrierCut(stone, size.width > 10), size, black).join())).size;
    expect(shapes([0, 1, 2, 6, HOT_STONE], box)).toBe(5);
    expect(shapes([0, 1, 2, 5, 6, HOT_STONE], { ...box, width: 12, height: 12 })).toBe(6);
  });

  it('leaves grout on the right and below, except round a hot stone', () => {
    const sun = cutCell(carrierCut(1, false), box, palette);
    expect(at(sun, 0, 0)).not.toBe(paper);
    expect(at(sun, 2, 0)).toBe(paper);
    expect(at(sun, 0, 8)).toBe(paper);
    const hot = cutCell(carrierCut(HOT_STONE, false), box, palette);
    expect(at(hot, 2, 0)).not.toBe(paper);
    expect(at(hot, 0, 8)).not.toBe(paper);
  });

  it('makes a stone as tall as its band', () => {
    const inked = [1, 2, 3].map(
      (band) =>
        cutCell(bandCut(band, 3, 'store'), { ...box, height: 13 }, palette).filter((p) => p !== paper).length,
    );
    expect(inked).toEqual([8, 16, 24]);
  });

  it('covers every pixel of the picture at any width and density', () => {
    for (const [width, ratio] of [
      [1095, 1],
      [1280, 1],
      [1000, 1.25],
      [336, 3],
      [1360, 2],
    ] as const) {
      const columns = yearColumns(width);
      const layout = mosaicLayout(columns, width, 9, ratio);
      const cuts = Array.from({ length: CARRIER_STONES }, (_, stone) => carrierCut(stone, layout.large));
      const pixels = new Uint32Array(layout.width * layout.height);
      layStones(
        pixels,
        layout,
        new Uint8Array(columns * 24).fill(1),
        cutSprites(cuts, layout, ratio, palette),
      );
      expect(pixels.includes(0)).toBe(false);
    }
  });

  it('lays a year within a frame', () => {
    const layout = mosaicLayout(365, 1095, 9, 2);
    const cuts = Array.from({ length: CARRIER_STONES }, (_, stone) => carrierCut(stone, layout.large));
    const sprites = cutSprites(cuts, layout, 2, palette);
    const pixels = new Uint32Array(layout.width * layout.height);
    const laid = Uint8Array.from({ length: 8760 }, (_, hour) => (hour * 7) % CARRIER_STONES);
    for (let warm = 0; warm < 20; warm++) layStones(pixels, layout, laid, sprites);
    const times = Array.from({ length: 9 }, () => {
      const start = performance.now();
      layStones(pixels, layout, laid, sprites);
      return performance.now() - start;
    }).sort((a, b) => a - b);
    expect(times[4]).toBeLessThan(16);
    process.stdout.write(`8,760 stones at 2 device pixels per pixel: ${times[4]!.toFixed(2)} ms\n`);
  });
});
