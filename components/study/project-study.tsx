'use client';

import Link from 'next/link';
import { useState } from 'react';
import { useSaving } from '@/components/forms/use-saving';
import type { SaveAnswer, SaveState, Stored } from '@/components/forms/use-saving';
import type { Answer } from '@/lib/schemas/answer';
import type { DesignRecord } from '@/lib/schemas/design';
import type { RunSummary } from '@/lib/schemas/run-summary';
import { formatShare } from '@/lib/units/display';
import { readAddress } from './address';
import { OlderRun } from './older-run';
import type { RepeatedYear } from './older-run';
import { Study } from './study';
import type { StudyProps } from './study';
import { TimeAgo } from './time-ago';

interface ProjectStudyProps extends Pick<StudyProps, 'house' | 'prices' | 'weather'> {
  designId: string;
  stored: Stored<DesignRecord>;
  /** the server's own year of the stored design */
  lastRun: RunSummary | null;
  /** search parameters of the address */
  params: readonly (readonly [string, string])[];
  save(data: DesignRecord, version: number): Promise<SaveAnswer<DesignRecord>>;
  /** has the stored design worked again by the present engine */
  repeat(): Promise<Answer<RepeatedYear>>;
}

/** The study of a project's design: every lever, and a button that keeps what they stand at. */
export function ProjectStudy(props: ProjectStudyProps) {
  const { designId, stored: first, lastRun, params, house, prices, weather } = props;
  const [asked] = useState(() =>
    readAddress(new URLSearchParams(params.map(([name, value]) => [name, value])), first.data),
  );
  const [stored, setStored] = useState(first);
  const { state, pending, save, calm } = useSaving<DesignRecord>(props.save);

  function keep(design: DesignRecord, version: number) {
    save(design, version, (next) => setStored({ data: design, version: next }));
  }

  return (
    <Study
      subject={designId}
      house={house}
      prices={prices}
      weather={weather}
      saved={stored.data}
      initial={asked.design}
      broken={asked.broken}
      actions={(design, changed, setDesign) => (
        <>
          <button
            type="button"
            className="framed filled"
            disabled={pending || !changed}
            onClick={() => keep(design, stored.version)}
          >
            Save this design
          </button>
          <p className="text-note text-muted" aria-live="polite">
            <Standing pending={pending} changed={changed} lastRun={lastRun} />
          </p>
          {lastRun && !lastRun.currentEngine && !changed && (
            <OlderRun engineVersion={lastRun.engineVersion} repeat={props.repeat} />
          )}
          <SaveTrouble
            state={state}
            onTakeTheirs={(theirs) => {
              setStored(theirs);
              setDesign(theirs.data);
              calm();
            }}
            onKeepMine={(theirs) => {
              setStored(theirs);
              keep(design, theirs.version);
            }}
          />
        </>
      )}
    />
  );
}

function Standing(props: { pending: boolean; changed: boolean; lastRun: RunSummary | null }) {
  const { pending, changed, lastRun } = props;
  if (pending) return 'saving, and working the year on the server…';
  if (changed) return 'not saved yet';
  if (!lastRun) return 'as saved';
  return (
    <>
      saved; the server worked it <TimeAgo at={lastRun.createdAt} /> and found{' '}
      {formatShare(lastRun.year.fractions.solar)}
      {!lastRun.current && ', before something was changed'}
    </>
  );
}

interface SaveTroubleProps {
  state: SaveState<DesignRecord>;
  onTakeTheirs(theirs: Stored<DesignRecord>): void;
  onKeepMine(theirs: Stored<DesignRecord>): void;
}

/** What went wrong with a save, in words; the levers stay where they stand. */
function SaveTrouble({ state, onTakeTheirs, onKeepMine }: SaveTroubleProps) {
  if (state.kind === 'conflict') {
    return (
      <p role="alert" className="border-l-2 border-hot pl-3">
        <strong className="text-hot-text">{state.message}</strong> Your levers stay as they are.{' '}
        <button type="button" className="word" onClick={() => onTakeTheirs(state.current)}>
          Take theirs
        </button>{' '}
        or{' '}
        <button type="button" className="word" onClick={() => onKeepMine(state.current)}>
          keep mine
        </button>
        .
      </p>
    );
  }
  if (state.kind === 'refused') {
    return (
      <p role="alert" className="border-l-2 border-hot pl-3">
        <strong className="text-hot-text">{state.refusal.message}</strong> Your levers stay as they are, and
        the address of this page holds them.{' '}
        {state.refusal.code === 'signed out' && <Link href="/sign-in">Sign in again</Link>}
      </p>
    );
  }
  if (state.kind === 'saved' && state.runRefusal) {
    return (
      <p role="status" className="border-l-2 border-ink pl-3">
        Saved, but the server could not work the year: {state.runRefusal.message}
      </p>
    );
  }
  return null;
}
