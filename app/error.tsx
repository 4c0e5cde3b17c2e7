'use client';

import { PageFrame } from '@/components/page-frame';
import { SiteNav } from '@/components/site-nav';

interface ErrorPageProps {
  error: Error & { digest?: string };
  retry: () => void;
}

/** What a page shows when something unexpected broke while it was drawn. Expected failures never get here. */
export default function ErrorPage({ error, retry }: ErrorPageProps) {
  return (
    <PageFrame nav={<SiteNav />}>
      <section role="alert" className="max-w-[34rem] pt-10">
        <h1 className="mb-4">This page could not be drawn.</h1>
        <p className="mb-4">
          Something broke on our side, or the database does not answer. What was saved before is still there.
        </p>
        <p className="mb-6">
          <button type="button" className="framed" onClick={retry}>
            Try again
          </button>
        </p>
        {error.digest && <p className="text-note text-muted">Mark of this failure: {error.digest}</p>}
      </section>
    </PageFrame>
  );
}
