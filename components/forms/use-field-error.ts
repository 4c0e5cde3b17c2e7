'use client';

import { get, useFormContext, useFormState } from 'react-hook-form';

/** The message below one field; undefined while it is good. */
export function useFieldError(path: string): string | undefined {
  const { control } = useFormContext();
  const { errors } = useFormState({ control, name: path });
  const error: unknown = get(errors, path);
  if (!error || typeof error !== 'object' || !('message' in error)) return undefined;
  return typeof error.message === 'string' ? error.message : undefined;
}
