'use client';

import { useEffect, useState } from 'react';
import { valueAt } from '@/components/ui/slider';
import type { StudyQuestion } from '@/lib/study/study-question';
import { LEVERS, coverChoices, withCollector } from './levers';
import type { Lever, LeverId } from './levers';
import { yearClient } from './year-client';

export interface TracePoint {
  value: number;
  /** heat still bought [kWh] */
  kwh: number;
}

export type Traces = Partial<Record<LeverId | 'cover', TracePoint[]>>;

const STILL_MS = 350;
const POINTS = 9;

/** The questions along one lever, everything else as it stands. */
function alongLever(lever: Lever, question: StudyQuestion): { value: number; question: StudyQuestion }[] {
  return Array.from({ length: POINTS }, (_, point) => {
    const value = valueAt(point / (POINTS - 1), lever.from, lever.to, lever.meta.step, lever.logarithmic);
    return { value, question: { ...question, design: lever.write(question.design, value) } };
  });
}

/**
 * The heat still bought along the whole of each lever, worked one year at a time while nothing else is asked.
 * Point after point, so that a moving lever never waits for more than one of them.
 */
export function useTraces(question: StudyQuestion, saved: StudyQuestion['design'], active: boolean): Traces {
  const [traces, setTraces] = useState<Traces>({});

  useEffect(() => {
    if (!active) return;
    let stopped = false;
    async function along(steps: { value: number; question: StudyQuestion }[]): Promise<TracePoint[]> {
      const points: TracePoint[] = [];
      for (const step of steps) {
        if (stopped) break;
        const kwh = await yearClient().backupKwh(step.question);
        if (kwh !== undefined) points.push({ value: step.value, kwh });
      }
      return points;
    }
    async function work() {
      const covers = coverChoices(saved).map((collector, value) => ({
        value,
        question: { ...question, design: withCollector(question.design, collector) },
      }));
      const all = [
        ...LEVERS.map((lever) => [lever.id, alongLever(lever, question)] as const),
        ['cover', covers] as const,
      ];
      for (const [id, steps] of all) {
        const points = await along(steps);
        if (stopped) return;
        setTraces((known) => ({ ...known, [id]: points }));
      }
    }
    const timer = setTimeout(() => void work().catch(() => undefined), STILL_MS);
    return () => {
      stopped = true;
      clearTimeout(timer);
    };
  }, [question, saved, active]);

  return traces;
}

/** Least and most of all traces: the one vertical scale of all levers. */
export function traceRange(traces: Traces, nowKwh: number): readonly [number, number] {
  const all = Object.values(traces).flatMap((points) => points.map((point) => point.kwh));
  return [Math.min(nowKwh, ...all), Math.max(nowKwh, ...all)];
}

const FLAT_SHARE = 1.01;

/** The stretch on which the heat still bought stays within 1 % of its least; undefined when it reaches an end. */
export function flatStretch(
  points: readonly TracePoint[] | undefined,
): readonly [number, number] | undefined {
  if (!points || points.length < 3) return undefined;
  const least = Math.min(...points.map((point) => point.kwh));
  const flat = points.map((point) => point.kwh <= least * FLAT_SHARE);
  const first = flat.indexOf(true);
  const last = flat.lastIndexOf(true);
  const inner = first > 0 && last < points.length - 1 && first < last;
  return inner ? [points[first]!.value, points[last]!.value] : undefined;
}
