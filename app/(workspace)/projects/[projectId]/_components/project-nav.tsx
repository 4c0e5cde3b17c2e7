'use client';

import Link from 'next/link';
import { useParams, usePathname } from 'next/navigation';
import { HeadLinks } from '@/components/head-links';

interface ProjectNavProps {
  projectId: string;
  projectName: string;
  designs: readonly { id: string; name: string }[];
}

const PROJECT_PAGES = ['House', 'Bills', 'Weather', 'Prices'];
const DESIGN_PAGES = [
  { word: 'Collector', path: '/collector' },
  { word: 'Loop and store', path: '/loop-and-store' },
  { word: 'Study', path: '' },
];

/** In the running head: the project, on the pages of a design also the design, and the pages of both. */
export function ProjectNav({ projectId, projectName, designs }: ProjectNavProps) {
  const path = usePathname();
  const { designId } = useParams<{ designId?: string }>();
  const base = `/projects/${projectId}`;
  const shown = designs.find(({ id }) => id === designId);
  const design = shown ?? designs[0];
  const pages = [
    ...PROJECT_PAGES.map((word) => ({ href: `${base}/${word.toLowerCase()}`, word })),
    ...(design
      ? DESIGN_PAGES.map((page) => ({ href: `${base}/designs/${design.id}${page.path}`, word: page.word }))
      : []),
    { href: `${base}/compare`, word: 'Compare' },
  ];
  return (
    <nav aria-label="Project" className="flex min-w-0 flex-wrap items-center gap-x-7 max-sm:w-full">
      <p className="max-w-full lg:max-w-[19rem] lg:truncate">
        <Link
          href={base}
          aria-current={path === base ? 'page' : undefined}
          className="inline-flex min-h-9 items-center font-strong no-underline hover:underline pointer-coarse:min-h-11"
        >
          {projectName}
        </Link>
        {shown && <span className="text-muted">, {shown.name}</span>}
      </p>
      <div className="max-sm:w-full">
        <HeadLinks links={pages.map((page) => ({ ...page, current: path === page.href }))} />
      </div>
    </nav>
  );
}
