'use client';

import { createContext, useContext } from 'react';
import type { Answer } from '@/lib/schemas/answer';
import type { HouseRecord } from '@/lib/schemas/house';
import type { BillsStudy } from '@/lib/study/house-by-bills';

/** What the sections of the page know beside the form. */
export interface BillsSurroundings {
  house: HouseRecord;
  houseVersion: number;
  /** the weather year in words; undefined where none is chosen */
  weatherName: string | undefined;
  scale(version: number): Promise<Answer<object>>;
  release(version: number): Promise<Answer<object>>;
}

export const BillsContext = createContext<BillsSurroundings | undefined>(undefined);
export const StudyContext = createContext<BillsStudy | undefined>(undefined);

function found<T>(value: T | undefined): T {
  if (value === undefined) throw new Error('A part of the bills stands outside their page.');
  return value;
}

/** House, weather and actions of the page. */
export const useBillsSurroundings = () => found(useContext(BillsContext));

/** What the readings say just now. */
export const useBillsStudy = () => found(useContext(StudyContext));
