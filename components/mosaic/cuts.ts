import { HOT_STONE } from './stones';

/** Colours of a stone as red, green, blue of 0 to 255. */
export type Colour = readonly [number, number, number];
export type PaletteName = 'paper' | 'ink' | 'sun' | 'store' | 'backup' | 'hot' | 'pebble';
export type Palette = Readonly<Record<PaletteName, Colour>>;

/** Size of a stone in device pixels and the length of one CSS pixel in them. */
export interface StoneBox {
  width: number;
  height: number;
  grout: number;
  pixel: number;
}

/** Which colour lies at a point of a cell (u to the right, v down, in device pixels). */
export type Cut = (u: number, v: number, box: StoneBox) => PaletteName;

const whole =
  (colour: PaletteName): Cut =>
  (u, v, { width, height, grout }) =>
    u < width - grout && v < height - grout ? colour : 'paper';

/** A pebble of the given share of the stone, in its middle. */
function pebble(u: number, v: number, { width, height, grout, pixel }: StoneBox): PaletteName {
  const side = Math.max(2 * pixel, Math.min(width, height) * 0.3);
  const inX = Math.abs(u - (width - grout) / 2) < side / 2;
  return inX && Math.abs(v - (height - grout) / 2) < side / 2 ? 'pebble' : 'paper';
}

const halves =
  (upper: PaletteName, lower: PaletteName): Cut =>
  (u, v, box) =>
    whole(v < (box.height - box.grout) / 2 ? upper : lower)(u, v, box);

const stripes =
  (colour: PaletteName, bars: number): Cut =>
  (u, v, box) => {
    const band = ((v / (box.height - box.grout)) * (2 * bars - 1)) % 2;
    return band < 1 ? whole(colour)(u, v, box) : 'paper';
  };

function storeSmall(u: number, v: number, box: StoneBox): PaletteName {
  const middle = (box.height - box.grout) / 2;
  return Math.abs(v - middle) < box.grout / 2 ? 'paper' : whole('store')(u, v, box);
}

/** Fills its grout; a notch of paper in the middle. */
function hotSmall(u: number, v: number, { width, height, grout }: StoneBox): PaletteName {
  const inX = Math.abs(u - (width - grout) / 2) < Math.max(1, width / 4);
  return inX && Math.abs(v - (height - grout) / 2) < height / 8 ? 'paper' : 'hot';
}

function eye(u: number, v: number, box: StoneBox): PaletteName {
  const radius = Math.min(box.width, box.height) * 0.17;
  const du = u - (box.width - box.grout) / 2;
  const dv = v - (box.height - box.grout) / 2;
  return du * du + dv * dv < radius * radius ? 'paper' : whole('sun')(u, v, box);
}

function hatch(u: number, v: number, box: StoneBox): PaletteName {
  const pitch = Math.max(3 * box.pixel, box.width / 3.5);
  return (u + v) % pitch < pitch * 0.2 ? 'paper' : whole('backup')(u, v, box);
}

const corners =
  (upper: PaletteName): Cut =>
  (u, v, box) => {
    const lower = u / (box.width - box.grout) + v / (box.height - box.grout) > 1;
    return whole(lower ? 'backup' : upper)(u, v, box);
  };

function cross(u: number, v: number, box: StoneBox): PaletteName {
  const x = u / (box.width - box.grout) - 0.5;
  const y = v / (box.height - box.grout) - 0.5;
  const onCross = Math.abs(Math.abs(x) - Math.abs(y)) < 0.11 && Math.abs(x) < 0.34;
  return onCross ? 'paper' : whole('hot')(u, v, box);
}

/** A frame of ink with a core of ink. */
function frame(u: number, v: number, box: StoneBox): PaletteName {
  const edge = Math.max(box.grout, Math.min(box.width, box.height) * 0.16);
  const right = box.width - box.grout;
  const bottom = box.height - box.grout;
  const rim = u < edge || v < edge || u > right - edge || v > bottom - edge;
  const core = Math.abs(u - right / 2) < right * 0.16 && Math.abs(v - bottom / 2) < bottom * 0.16;
  return rim || core ? whole('ink')(u, v, box) : 'paper';
}

const SMALL: readonly Cut[] = [
  pebble,
  whole('sun'),
  storeSmall,
  halves('sun', 'backup'),
  halves('store', 'backup'),
  whole('backup'),
  stripes('ink', 3),
];
const LARGE: readonly Cut[] = [
  pebble,
  eye,
  stripes('store', 3),
  corners('sun'),
  corners('store'),
  hatch,
  frame,
];

/** The cut of a stone of "who carried the house": the shape says what the colour says. */
export function carrierCut(stone: number, large: boolean): Cut {
  if (stone === HOT_STONE) return large ? cross : hotSmall;
  return (large ? LARGE : SMALL)[stone] ?? pebble;
}

/** The cut of band `band` of `bands`: a stone as tall as its value. */
export function bandCut(band: number, bands: number, colour: PaletteName): Cut {
  if (band === 0) return pebble;
  return (u, v, box) => {
    const tall = ((box.height - box.grout) * band) / bands;
    return v >= box.height - box.grout - tall ? whole(colour)(u, v, box) : 'paper';
  };
}

const SUB = 3;

/**
 * The pixels of one cell, grout on its right and lower side, smoothed by 3 × 3 samples per pixel.
 * @returns width × height pixels, row after row, as a canvas stores them (little-endian RGBA)
 */
export function cutCell(cut: Cut, box: StoneBox, palette: Palette): Uint32Array {
  const pixels = new Uint32Array(box.width * box.height);
  for (let y = 0; y < box.height; y++) {
    for (let x = 0; x < box.width; x++) pixels[y * box.width + x] = samplePixel(cut, x, y, box, palette);
  }
  return pixels;
}

function samplePixel(cut: Cut, x: number, y: number, box: StoneBox, palette: Palette): number {
  let red = 0;
  let green = 0;
  let blue = 0;
  for (let i = 0; i < SUB * SUB; i++) {
    const [r, g, b] = palette[cut(x + ((i % SUB) + 0.5) / SUB, y + (Math.floor(i / SUB) + 0.5) / SUB, box)];
    red += r;
    green += g;
    blue += b;
  }
  const n = SUB * SUB;
  return (
    ((255 << 24) | (Math.round(blue / n) << 16) | (Math.round(green / n) << 8) | Math.round(red / n)) >>> 0
  );
}
