'use client';

import { useState, useTransition } from 'react';
import type { Answer, Conflict, Refusal } from '@/lib/schemas/answer';

/** What a save returns; a run that failed after the save stands beside it. */
export type SaveAnswer<T> = Answer<{ version: number; runRefusal?: Refusal | undefined }> | Conflict<T>;

/** The stored record that a form edits, or a part of which it edits. */
export interface Stored<T> {
  data: T;
  version: number;
}

export type SaveState<T> =
  | { kind: 'untouched' }
  | { kind: 'saved'; at: string; runRefusal: Refusal | undefined }
  | { kind: 'refused'; refusal: Refusal }
  | { kind: 'conflict'; message: string; current: Stored<T> };

const NO_ANSWER: Refusal = {
  ok: false,
  code: 'database unavailable',
  message: 'The server did not answer. Everything you typed is kept in this tab: try again in a moment.',
};

function clock(): string {
  return new Date().toLocaleTimeString('en-GB', { hour: '2-digit', minute: '2-digit' });
}

function stateAfter<T>(answer: SaveAnswer<T>): SaveState<T> {
  if (answer.ok) return { kind: 'saved', at: clock(), runRefusal: answer.runRefusal };
  if (answer.code === 'conflict' && 'current' in answer)
    return { kind: 'conflict', message: answer.message, current: answer.current };
  return { kind: 'refused', refusal: answer };
}

/** Sends a record to the server and tells what became of it; an answer that never comes is a refusal in words. */
export function useSaving<T>(send: (data: T, version: number) => Promise<SaveAnswer<T>>) {
  const [state, setState] = useState<SaveState<T>>({ kind: 'untouched' });
  const [pending, startTransition] = useTransition();

  function save(data: T, version: number, onSaved: (version: number) => void) {
    startTransition(async () => {
      const answer = await send(data, version).catch(() => NO_ANSWER);
      if (answer.ok) onSaved(answer.version);
      setState(stateAfter<T>(answer));
    });
  }

  return { state, pending, save, calm: () => setState({ kind: 'untouched' }) };
}
