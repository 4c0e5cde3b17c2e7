'use server';

import { CredentialsSignin } from 'next-auth';
import { redirect } from 'next/navigation';
import { signIn } from '@/lib/auth/next-auth';
import { localPath } from '@/lib/auth/redirect-target';
import { credentialsSchema } from '@/lib/schemas/credentials';

export interface SignInState {
  message?: string;
  field?: 'email' | 'password';
  /** what was typed, given back to the form */
  email?: string;
}

const DATABASE_DOWN = 'The database does not answer, so nobody can be signed in. Try again in a moment.';
const WRONG = 'E-mail and password do not belong together. Check both and try again.';

/** Opens a session and leads on; the same words whether the e-mail or the password was wrong. */
export async function signInAction(_before: SignInState, form: FormData): Promise<SignInState> {
  const typed = { email: form.get('email'), password: form.get('password') };
  const email = typeof typed.email === 'string' ? typed.email : '';
  const parsed = credentialsSchema.safeParse(typed);
  if (!parsed.success) {
    const issue = parsed.error.issues[0];
    return { message: issue?.message, field: issue?.path[0] === 'email' ? 'email' : 'password', email };
  }
  try {
    await signIn('credentials', { ...parsed.data, redirect: false });
  } catch (error) {
    if (!(error instanceof CredentialsSignin)) throw error;
    return { message: error.code === 'database unavailable' ? DATABASE_DOWN : WRONG, email };
  }
  redirect(localPath(form.get('to'), '/projects'));
}
