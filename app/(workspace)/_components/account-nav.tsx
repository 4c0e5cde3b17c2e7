import Link from 'next/link';
import { currentAccount } from '@/lib/server/current-account';
import { signOutAction } from '../sign-out';

/** The way to all projects and out, at the end of the running head. */
export async function AccountNav() {
  const answer = await currentAccount();
  if (!answer.ok) return null;
  return (
    <div className="ml-auto flex items-center gap-x-5 max-sm:text-note" data-screen-only>
      <nav aria-label="Workspace">
        <Link href="/projects" className="inline-flex min-h-9 items-center pointer-coarse:min-h-11">
          Projects
        </Link>
      </nav>
      <form action={signOutAction}>
        <button type="submit" className="word min-h-9 pointer-coarse:min-h-11" title={answer.account.email}>
          Sign out
        </button>
      </form>
    </div>
  );
}
