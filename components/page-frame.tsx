import type { ReactNode } from 'react';
import { SiteFoot } from './site-foot';
import { SiteHead } from './site-head';

/** Running head with the ways around, the one `main`, and the foot. */
export function PageFrame({ nav, children }: { nav: ReactNode; children: ReactNode }) {
  return (
    <>
      <SiteHead>{nav}</SiteHead>
      <main id="main" tabIndex={-1} className="pb-10">
        {children}
      </main>
      <SiteFoot />
    </>
  );
}
