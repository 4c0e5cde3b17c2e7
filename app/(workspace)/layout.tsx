import Link from 'next/link';
import type { ReactNode } from 'react';
import { currentAccount } from '@/lib/server/current-account';
import { signOutAction } from './sign-out';

/** The strip under the running head of every page that needs an account; each page authorises for itself. */
export default async function WorkspaceLayout({ children }: Readonly<{ children: ReactNode }>) {
  const answer = await currentAccount();
  return (
    <>
      {answer.ok && (
        <div className="flex flex-wrap items-center gap-x-6 gap-y-1 py-2 rule-hair" data-screen-only>
          <nav aria-label="Workspace">
            <Link href="/projects" className="inline-flex min-h-9 items-center">
              Projects
            </Link>
          </nav>
          <span className="ml-auto text-note break-all text-muted">{answer.account.email}</span>
          <form action={signOutAction}>
            <button type="submit" className="word min-h-9">
              Sign out
            </button>
          </form>
        </div>
      )}
      {children}
    </>
  );
}
