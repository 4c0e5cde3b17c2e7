'use client';

import { useEffect, useRef } from 'react';
import type { AnswerFeed } from '@/components/study/answer-slot';
import type { MosaicLayout } from './layout';
import { MosaicPainter } from './mosaic-painter';
import { watchPalette } from './palette';
import type { ReadingId } from './stones';

interface StonesCanvasProps {
  feed: AnswerFeed;
  reading: ReadingId;
  firstDay: number;
  /** columns for a width [CSS px] */
  columnsFor(cssWidth: number): number;
  /** height of an hour for a width [CSS px] */
  rowFor(cssWidth: number): number;
  /** tells what lies over the canvas where the stones are */
  onLayout?(layout: MosaicLayout, pixelRatio: number): void;
}

/** The stones themselves. Painted past React, straight from the worker's answers; described elsewhere in words. */
export function StonesCanvas({ feed, reading, firstDay, columnsFor, rowFor, onLayout }: StonesCanvasProps) {
  const canvasRef = useRef<HTMLCanvasElement>(null);
  const painterRef = useRef<MosaicPainter>(undefined);

  useEffect(() => {
    const canvas = canvasRef.current;
    const room = canvas?.parentElement;
    if (!canvas || !room) return;
    const painter = (painterRef.current ??= new MosaicPainter(canvas));
    const fit = () => {
      const cssWidth = room.clientWidth;
      if (cssWidth === 0) return;
      const pixelRatio = window.devicePixelRatio;
      const view = { reading, firstDay, columns: columnsFor(cssWidth) };
      const layout = painter.fit(view, cssWidth, rowFor(cssWidth), pixelRatio);
      canvas.style.width = `${layout.width / pixelRatio}px`;
      canvas.style.height = `${layout.height / pixelRatio}px`;
      onLayout?.(layout, pixelRatio);
    };
    fit();
    const observer = new ResizeObserver(fit);
    observer.observe(room);
    const stopWatching = watchPalette(() => painter.recolour());
    return () => {
      observer.disconnect();
      stopWatching();
    };
  }, [reading, firstDay, columnsFor, rowFor, onLayout]);

  useEffect(() => {
    let painted = 0;
    return feed.listen((answer) => {
      painterRef.current?.show(answer.result.columns);
      if (canvasRef.current) canvasRef.current.dataset.years = String(++painted);
    });
  }, [feed]);

  return <canvas ref={canvasRef} aria-hidden="true" className="block" />;
}
