'use client';

import { useActionState, useState } from 'react';
import { signInAction } from './actions';

/** E-mail and password; both stay typed when the answer is no. */
export function SignInForm({ to }: { to: string }) {
  const [state, action, pending] = useActionState(signInAction, {});
  const [email, setEmail] = useState(state.email ?? '');
  const [password, setPassword] = useState('');
  const describedBy = state.message ? 'sign-in-message' : undefined;
  return (
    <form action={action} className="flex flex-col gap-4" noValidate>
      <input type="hidden" name="to" value={to} />
      <label className="flex flex-col gap-1">
        E-mail
        <input
          className="field"
          type="email"
          name="email"
          autoComplete="username"
          value={email}
          onChange={(event) => setEmail(event.target.value)}
          aria-invalid={state.field === 'email' || undefined}
          aria-describedby={describedBy}
        />
      </label>
      <label className="flex flex-col gap-1">
        Password
        <input
          className="field"
          type="password"
          name="password"
          autoComplete="current-password"
          value={password}
          onChange={(event) => setPassword(event.target.value)}
          aria-invalid={state.field === 'password' || undefined}
          aria-describedby={describedBy}
        />
      </label>
      <p id="sign-in-message" role="alert" className="text-hot-text empty:hidden">
        {state.message}
      </p>
      <p>
        <button type="submit" className="framed filled" disabled={pending}>
          {pending ? 'Signing in …' : 'Sign in'}
        </button>
      </p>
    </form>
  );
}
