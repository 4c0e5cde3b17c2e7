'use client';

import { createContext, useContext } from 'react';
import type { z } from 'zod';

/** What every field of a form knows beside its own path. */
export interface FormKnowledge {
  schema: z.ZodType;
  /** three letters of ISO 4217 */
  currency: string;
  /** path of the field that has the focus */
  focused: string;
  /** forgets the last good values of a removed row, so that the rows below keep theirs */
  dropRow(path: string, index: number): void;
}

export const FormKnowledgeContext = createContext<FormKnowledge | undefined>(undefined);
export const HeldContext = createContext<unknown>(undefined);

/** Schema, currency and focus of the form around. */
export function useFormKnowledge(): FormKnowledge {
  const knowledge = useContext(FormKnowledgeContext);
  if (!knowledge) throw new Error('A field stands outside a form.');
  return knowledge;
}

/** The record that results go by: as typed where it is good, the last good value where it is not. */
export function useHeld<T>(): T {
  return useContext(HeldContext) as T;
}
