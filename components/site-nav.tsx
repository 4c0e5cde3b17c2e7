'use client';

import { usePathname } from 'next/navigation';
import { HeadLinks } from './head-links';

const PAGES = [
  { href: '/demonstration', word: 'Demonstration' },
  { href: '/demonstration/compare', word: 'Compare' },
  { href: '/method', word: 'How it computes' },
  { href: '/validation', word: 'Validation' },
  { href: '/sign-in', word: 'Sign in' },
] as const;

/** The pages that need no account, and the way in. */
export function SiteNav() {
  const pathname = usePathname();
  const isHere = (href: string) => (href === '/method' ? pathname.startsWith(href) : pathname === href);
  return (
    <nav aria-label="Main" className="max-sm:w-full sm:ml-auto">
      <HeadLinks wrap links={PAGES.map((page) => ({ ...page, current: isHere(page.href) }))} />
    </nav>
  );
}
