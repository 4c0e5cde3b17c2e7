import Link from 'next/link';
import { PageFrame } from '@/components/page-frame';
import { SiteNav } from '@/components/site-nav';

/** Answer to an address that leads nowhere, or to something that the visitor may not see. */
export default function NotFound() {
  return (
    <PageFrame nav={<SiteNav />}>
      <section className="max-w-[34rem] pt-10">
        <h1 className="mb-4">There is nothing at this address.</h1>
        <p>
          The link may be old, or the page belongs to an account that you are not signed in to.{' '}
          <Link href="/">Go to the start page</Link>
        </p>
      </section>
    </PageFrame>
  );
}
