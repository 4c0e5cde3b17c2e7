import Link from 'next/link';
import { Logo } from './logo';
import { SiteNav } from './site-nav';

/** The running head: mark and name lead to the start page, the rest to the pages that exist. */
export function SiteHead() {
  return (
    <header className="flex flex-wrap items-center gap-x-10 gap-y-1 py-2 rule-double">
      <Link
        href="/"
        className="flex min-h-9 items-center gap-2.5 font-display text-h2 font-heading no-underline"
      >
        <Logo />
        Tepidarium
      </Link>
      <SiteNav />
    </header>
  );
}
