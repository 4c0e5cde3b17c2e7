'use client';

import { useEffect, useState } from 'react';
import { get, useFormContext, useFormState } from 'react-hook-form';

export interface ContentsEntry {
  /** id of the section on the page */
  id: string;
  title: string;
  /** paths of the fields that it holds; a group's path stands for all its fields */
  fields: readonly string[];
}

function countLeaves(error: unknown): number {
  if (!error || typeof error !== 'object') return 0;
  if ('message' in error && typeof error.message === 'string') return 1;
  return Object.values(error).reduce((sum: number, part) => sum + countLeaves(part), 0);
}

const holds = (entry: ContentsEntry, path: string) =>
  entry.fields.some((field) => path === field || path.startsWith(`${field}.`));

/** The section that is on the screen, by scrolling. */
function useSectionInView(entries: readonly ContentsEntry[]): string {
  const [inView, setInView] = useState(entries[0]?.id ?? '');
  useEffect(() => {
    if (typeof IntersectionObserver === 'undefined') return;
    const watcher = new IntersectionObserver(
      (seen) => {
        const first = seen.find((entry) => entry.isIntersecting);
        if (first) setInView(first.target.id);
      },
      { rootMargin: '-20% 0px -70% 0px' },
    );
    for (const { id } of entries) {
      const section = document.getElementById(id);
      if (section) watcher.observe(section);
    }
    return () => watcher.disconnect();
  }, [entries]);
  return inView;
}

/** List of the sections with what is left to mend in each. */
export function Contents({ entries, focused }: { entries: readonly ContentsEntry[]; focused: string }) {
  const { control } = useFormContext();
  const { errors } = useFormState({ control });
  const inView = useSectionInView(entries);
  const current = entries.find((entry) => holds(entry, focused))?.id ?? inView;
  if (entries.length < 2) return <div className="max-lg:hidden" />;
  return (
    <nav aria-label="Sections of this form" className="lg:sticky lg:top-16 lg:self-start">
      <ul className="max-lg:flex max-lg:flex-wrap max-lg:gap-x-5">
        {entries.map((entry) => {
          const faults = entry.fields.reduce((sum, field) => sum + countLeaves(get(errors, field)), 0);
          const here = entry.id === current;
          return (
            <li
              key={entry.id}
              className={`rule-hair max-lg:border-b-0 ${here ? 'lg:border-b-[3px] lg:border-ink lg:font-strong' : ''}`}
            >
              <a
                href={`#${entry.id}`}
                aria-current={here ? 'location' : undefined}
                className="flex min-h-8 items-center justify-between gap-2 no-underline hover:underline pointer-coarse:min-h-11"
              >
                {entry.title}
                <span
                  className={`text-note ${faults ? 'font-strong text-hot-text' : 'text-muted max-lg:sr-only'}`}
                >
                  {faults ? `${faults} to mend` : 'done'}
                </span>
              </a>
            </li>
          );
        })}
      </ul>
    </nav>
  );
}
