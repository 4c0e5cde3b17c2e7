import type { Typed } from './typed-values';

/** What was typed and not saved yet, with the version that it was typed upon. */
export interface Draft {
  version: number;
  typed: { [key: string]: Typed };
}

const key = (form: string) => `tepidarium draft ${form}`;

/** Reads a kept draft; undefined when there is none or the browser keeps nothing. */
export function readDraft(form: string): Draft | undefined {
  try {
    const text = sessionStorage.getItem(key(form));
    return text ? (JSON.parse(text) as Draft) : undefined;
  } catch {
    return undefined;
  }
}

/** Keeps a draft in this tab until it is saved. A browser that keeps nothing is no reason to stop typing. */
export function keepDraft(form: string, draft: Draft): void {
  try {
    sessionStorage.setItem(key(form), JSON.stringify(draft));
  } catch {
    return;
  }
}

/** Forgets a draft, once saved or discarded. */
export function forgetDraft(form: string): void {
  try {
    sessionStorage.removeItem(key(form));
  } catch {
    return;
  }
}
