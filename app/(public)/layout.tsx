import type { ReactNode } from 'react';
import { PageFrame } from '@/components/page-frame';
import { SiteNav } from '@/components/site-nav';

/** The frame of the pages that need no account. */
export default function PublicLayout({ children }: Readonly<{ children: ReactNode }>) {
  return <PageFrame nav={<SiteNav />}>{children}</PageFrame>;
}
