'use client';

import { useEffect, useRef } from 'react';
import type { PlotOptions } from '@observablehq/plot';

interface PlotFigureProps {
  /** builds the options for a width [CSS px]; loaded with the library when first drawn */
  load(): Promise<(width: number) => PlotOptions>;
  height: number;
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
        if (room.clientWidth > 0) room.replaceChildren(Plot.plot(options(room.clientWidth)));
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
