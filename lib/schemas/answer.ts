/** Reasons for which the server refuses; the page decides by these, people read the message. */
export type RefusalCode =
  | 'signed out'
  | 'not found'
  | 'invalid'
  | 'conflict'
  | 'busy'
  | 'too slow'
  | 'engine'
  | 'database unavailable';

/** An expected failure as a value, with words that a user can act on. */
export interface Refusal {
  ok: false;
  code: RefusalCode;
  message: string;
  /** path of the offending input, joined by dots, for example 'array.areaM2' */
  field?: string;
}

/** What every function of the server returns. */
export type Answer<T> = ({ ok: true } & T) | Refusal;

/** Somebody saved first: what stands in the database now, so that nothing is overwritten unseen. */
export interface Conflict<T> extends Refusal {
  code: 'conflict';
  current: { data: T; version: number };
}
