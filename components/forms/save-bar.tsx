'use client';

import Link from 'next/link';
import { usePathname } from 'next/navigation';
import type { ReactNode } from 'react';
import { useFormContext, useFormState } from 'react-hook-form';
import type { SaveState, Stored } from './use-saving';

interface SaveBarProps<T> {
  title: string;
  frieze?: ReactNode;
  state: SaveState<T>;
  pending: boolean;
  /** typing of before a reload or a sign-out has been laid back in */
  restored: boolean;
  onDiscard(): void;
  onTakeTheirs(current: Stored<T>): void;
  onKeepMine(current: Stored<T>): void;
}

function Standing<T>({
  state,
  pending,
  changed,
}: {
  state: SaveState<T>;
  pending: boolean;
  changed: boolean;
}) {
  if (pending) return <>saving…</>;
  if (changed) return <>not saved yet</>;
  return state.kind === 'saved' ? <>saved at {state.at}</> : <>as saved</>;
}

function SignInAgain() {
  const here = usePathname();
  return <Link href={`/sign-in?to=${encodeURIComponent(here)}`}>Sign in again</Link>;
}

function Trouble<T>(props: SaveBarProps<T>) {
  const { state } = props;
  if (state.kind === 'conflict')
    return (
      <p role="alert" className="border-l-2 border-hot pl-3">
        <strong className="text-hot-text">{state.message}</strong> Nothing of yours is lost.{' '}
        <button type="button" className="word" onClick={() => props.onTakeTheirs(state.current)}>
          Take theirs
        </button>{' '}
        or{' '}
        <button type="button" className="word" onClick={() => props.onKeepMine(state.current)}>
          keep mine
        </button>
        .
      </p>
    );
  if (state.kind === 'refused')
    return (
      <p role="alert" className="border-l-2 border-hot pl-3">
        <strong className="text-hot-text">{state.refusal.message}</strong> What you typed is kept in this tab.{' '}
        {state.refusal.code === 'signed out' && <SignInAgain />}
      </p>
    );
  if (state.kind === 'saved' && state.runRefusal)
    return (
      <p role="status" className="border-l-2 border-ink pl-3">
        Saved, but the year could not be worked: {state.runRefusal.message}
      </p>
    );
  if (props.restored)
    return (
      <p role="status" className="border-l-2 border-ink pl-3">
        What you typed before and had not saved is back.{' '}
        <button type="button" className="word" onClick={props.onDiscard}>
          Discard it
        </button>
      </p>
    );
  return null;
}

/** Title, frieze, how the form stands, and the one filled button of the page. */
export function SaveBar<T>(props: SaveBarProps<T>) {
  const { control } = useFormContext();
  const { dirtyFields, errors } = useFormState({ control });
  const changed = Object.keys(dirtyFields).length > 0;
  const faulty = Object.keys(errors).length > 0;
  return (
    <div className="sticky top-0 z-10 bg-paper pt-3 pb-2 rule-hair">
      <div className="flex flex-wrap items-center gap-x-6 gap-y-2">
        <h1>{props.title}</h1>
        <div className="min-w-0 flex-1">{props.frieze}</div>
        <p className="text-note text-muted" aria-live="polite">
          {faulty ? (
            <span className="text-hot-text">something to mend; not saved</span>
          ) : (
            <Standing state={props.state} pending={props.pending} changed={changed || props.restored} />
          )}
        </p>
        <button type="submit" className="framed filled" disabled={props.pending}>
          Save
        </button>
      </div>
      <div className="mt-1 empty:hidden">
        <Trouble {...props} />
      </div>
    </div>
  );
}
