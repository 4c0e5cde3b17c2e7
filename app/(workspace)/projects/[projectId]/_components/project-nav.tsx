'use client';

import Link from 'next/link';
import { useParams, usePathname } from 'next/navigation';

interface ProjectNavProps {
  projectId: string;
  projectName: string;
  designs: readonly { id: string; name: string }[];
}

const DESIGN_PAGES = [
  { word: 'Collector', path: '/collector' },
  { word: 'Loop and store', path: '/loop-and-store' },
  { word: 'Study', path: '' },
];

function NavLink({ href, word, current }: { href: string; word: string; current: boolean }) {
  return (
    <li>
      <Link
        href={href}
        aria-current={current ? 'page' : undefined}
        className={`inline-flex min-h-9 items-center border-b-2 no-underline hover:underline pointer-coarse:min-h-11 ${current ? 'border-ink font-strong' : 'border-transparent'}`}
      >
        {word}
      </Link>
    </li>
  );
}

/** Project, its pages, and on the pages of a design the other designs. */
export function ProjectNav({ projectId, projectName, designs }: ProjectNavProps) {
  const path = usePathname();
  const { designId } = useParams<{ designId?: string }>();
  const base = `/projects/${projectId}`;
  const design = designs.find(({ id }) => id === designId) ?? designs[0];
  const designBase = design && `${base}/designs/${design.id}`;
  const here = designId && designBase ? path.slice(designBase.length) : undefined;
  return (
    <div className="pt-1">
      <nav aria-label="Project" className="flex flex-wrap items-center gap-x-8">
        <Link
          href={base}
          aria-current={path === base ? 'page' : undefined}
          className="inline-flex min-h-9 items-center font-strong no-underline hover:underline"
        >
          {projectName}
        </Link>
        <ul className="flex flex-wrap items-center gap-x-5">
          {['House', 'Bills', 'Weather', 'Prices'].map((word) => {
            const href = `${base}/${word.toLowerCase()}`;
            return <NavLink key={word} href={href} word={word} current={path === href} />;
          })}
          {designBase &&
            DESIGN_PAGES.map(({ word, path: page }) => (
              <NavLink key={word} href={`${designBase}${page}`} word={word} current={here === page} />
            ))}
          <NavLink href={`${base}/compare`} word="Compare" current={path === `${base}/compare`} />
        </ul>
      </nav>
      {here !== undefined && designs.length > 1 && (
        <nav aria-label="Designs">
          <ul className="flex flex-wrap items-center gap-x-5 text-note">
            {designs.map(({ id, name }) => (
              <NavLink key={id} href={`${base}/designs/${id}${here}`} word={name} current={id === designId} />
            ))}
          </ul>
        </nav>
      )}
    </div>
  );
}
