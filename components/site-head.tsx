import Link from 'next/link';
import type { ReactNode } from 'react';
import { Logo } from './logo';

/** The running head: mark and name lead to the start page, the rest to the pages around this one. */
export function SiteHead({ children }: { children: ReactNode }) {
  return (
    <header className="flex flex-wrap items-center gap-x-7 gap-y-1 py-2 rule-double">
      <Link
        href="/"
        className="flex min-h-9 items-center gap-2.5 font-display text-h2 font-heading no-underline"
      >
        <Logo />
        Tepidarium
      </Link>
      {children}
    </header>
  );
}
