'use client';

import { useEffect, useRef } from 'react';
import type { PlotOptions } from '@observablehq/plot';

interface PlotFigureProps {
  /** builds the options for a width [CSS px]; loaded with the library when first drawn */
  load(): Promise<(width: number) => PlotOptions>;
  height: number;
}

/** A chart is one picture with one name: the library's names for its groups mean nothing to those who listen. */
function asOneImage(chart: Element): Element {
  chart.setAttribute('role', 'img');
  chart.querySelectorAll('g[aria-label]').forEach((group) => group.removeAttribute('aria-label'));
  return chart;
}

/** Draws one chart; the library comes with the first of them. */
export function PlotFigure({ load, height }: PlotFigureProps) {
  const roomRef = useRef<HTMLDivElement>(null);

  useEffect(() => {
    const room = roomRef.current;
    if (!room) return;
    let gone = false;
    let stop: () => void = () => undefined;
    void Promise.all([import('@observablehq/plot'), load()]).then(([Plot, options]) => {
      if (gone) return;
      const draw = () => {
        if (room.clientWidth > 0) room.replaceChildren(asOneImage(Plot.plot(options(room.clientWidth))));
      };
      draw();
      const observer = new ResizeObserver(draw);
      observer.observe(room);
      stop = () => observer.disconnect();
    });
    return () => {
      gone = true;
      stop();
    };
  }, [load]);

  return <div ref={roomRef} style={{ minHeight: height }} />;
}
