'use client';

import { useEffect, useRef } from 'react';
import { carrierCut, type Cut, type PaletteName } from '@/components/mosaic/cuts';
import { mosaicLayout, yearColumns } from '@/components/mosaic/layout';
import { cutSprites, layStones } from '@/components/mosaic/painter';
import { readPalette, watchPalette } from '@/components/mosaic/palette';
import { CARRIER_STONES, HOT_STONE, WEEKS_SHOWN, layDays, layWeeks } from '@/components/mosaic/stones';
import { HOURS_PER_DAY } from '@/lib/units/constants';
import { COMPARE_STONES } from './changes';

const THIN_COLOURS: readonly PaletteName[] = [
  'pebble',
  'sun',
  'store',
  'sun',
  'store',
  'backup',
  'ink',
  'hot',
];

/** An hour that stays as it was: one pixel of its colour. */
function thinCut(stone: number): Cut {
  const colour = THIN_COLOURS[stone] ?? 'pebble';
  return (u, v, { width, height, grout, pixel }) =>
    u < width - grout && Math.abs(v - (height - grout) / 2) < pixel / 2 ? colour : 'paper';
}

function cutOf(stone: number, large: boolean): Cut {
  return stone < CARRIER_STONES ? carrierCut(stone, large) : thinCut(stone - CARRIER_STONES);
}

function paint(canvas: HTMLCanvasElement, stones: Uint8Array, firstDay: number, rowPx: number) {
  const cssWidth = canvas.parentElement?.clientWidth ?? 0;
  const context = canvas.getContext('2d', { alpha: false });
  if (!context || cssWidth === 0) return;
  const pixelRatio = window.devicePixelRatio;
  const columns = yearColumns(cssWidth);
  const layout = mosaicLayout(columns, cssWidth, rowPx, pixelRatio);
  canvas.width = layout.width;
  canvas.height = layout.height;
  canvas.style.width = `${layout.width / pixelRatio}px`;
  canvas.style.height = `${layout.height / pixelRatio}px`;
  const cuts = Array.from({ length: COMPARE_STONES }, (_, stone) => cutOf(stone, layout.large));
  const sprites = cutSprites(cuts, layout, pixelRatio, readPalette(canvas));
  const laid =
    columns === WEEKS_SHOWN
      ? layWeeks(stones, firstDay, COMPARE_STONES, HOT_STONE)
      : layDays(stones, firstDay);
  const image = new ImageData(layout.width, layout.height);
  layStones(new Uint32Array(image.data.buffer), layout, laid, sprites);
  context.putImageData(image, 0, 0);
}

interface StonesPictureProps {
  stones: Uint8Array;
  firstDay: number;
  /** height of an hour [CSS px] */
  rowPx: number;
  label: string;
}

/** A year of stones that does not change while one looks at it. */
export function StonesPicture({ stones, firstDay, rowPx, label }: StonesPictureProps) {
  const canvasRef = useRef<HTMLCanvasElement>(null);
  useEffect(() => {
    const canvas = canvasRef.current;
    const room = canvas?.parentElement;
    if (!canvas || !room) return;
    const repaint = () => paint(canvas, stones, firstDay, rowPx);
    repaint();
    const observer = new ResizeObserver(repaint);
    observer.observe(room);
    const stopWatching = watchPalette(repaint);
    return () => {
      observer.disconnect();
      stopWatching();
    };
  }, [stones, firstDay, rowPx]);
  return (
    <div className="min-w-0 overflow-hidden" style={{ height: rowPx * HOURS_PER_DAY }}>
      <canvas ref={canvasRef} role="img" aria-label={label} className="block" />
    </div>
  );
}
