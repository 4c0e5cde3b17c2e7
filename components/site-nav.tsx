'use client';

import Link from 'next/link';
import { usePathname } from 'next/navigation';

/** Pages that need an account have a strip of their own; the sign-in needs no link to itself. */
const WITHOUT = ['/projects', '/sign-in'];

/** The way in, on the public pages. */
export function SiteNav() {
  const pathname = usePathname();
  if (WITHOUT.some((start) => pathname.startsWith(start))) return null;
  return (
    <nav aria-label="Main" className="ml-auto flex flex-wrap gap-x-6">
      <Link href="/method" className="inline-flex min-h-9 items-center">
        How it computes
      </Link>
      <Link href="/sign-in" className="inline-flex min-h-9 items-center">
        Sign in
      </Link>
    </nav>
  );
}
