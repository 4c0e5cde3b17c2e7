'use server';

import { signOut } from '@/lib/auth/next-auth';

/** Ends the session here and in the database, and leads to the start page. */
export async function signOutAction(): Promise<void> {
  await signOut({ redirectTo: '/' });
}
