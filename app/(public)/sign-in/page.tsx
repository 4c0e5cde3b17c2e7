import type { Metadata } from 'next';
import Link from 'next/link';
import { redirect } from 'next/navigation';
import { localPath } from '@/lib/auth/redirect-target';
import { currentAccount } from '@/lib/server/current-account';
import { SignInForm } from './sign-in-form';

export const metadata: Metadata = { title: 'Sign in' };

interface SignInPageProps {
  searchParams: Promise<{ to?: string | string[] }>;
}

export default async function SignInPage({ searchParams }: SignInPageProps) {
  const to = localPath((await searchParams).to, '/projects');
  if ((await currentAccount()).ok) redirect(to);
  return (
    <div className="grid max-w-[60rem] gap-10 pt-10 sm:grid-cols-[minmax(0,22rem)_minmax(0,1fr)]">
      <section>
        <h1 className="mb-6">Sign in</h1>
        <SignInForm to={to} />
      </section>
      <aside className="text-note text-muted sm:border-l sm:border-hair sm:pl-7">
        <h2 className="mb-2 text-h3 text-ink">The first account</h2>
        <p className="mb-4">
          The first start printed its e-mail and a password in the terminal, once. The password is stored
          nowhere; only its hash is. Whoever lost it makes a new one with <code>npm run db -- password</code>.
        </p>
        <h2 className="mb-2 text-h3 text-ink">Without an account</h2>
        <p>
          <Link href="/">The demonstration on the start page</Link> works without one; nothing of it is kept.
        </p>
      </aside>
    </div>
  );
}
