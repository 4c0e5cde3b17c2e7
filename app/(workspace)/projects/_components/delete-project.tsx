'use client';

import { useActionState } from 'react';
import { deleteProjectAction } from '../actions';

/** A word that opens the question; the second press deletes. */
export function DeleteProject({ projectId, name }: { projectId: string; name: string }) {
  const [state, action, pending] = useActionState(deleteProjectAction, {});
  return (
    <details>
      <summary className="inline-flex min-h-6 items-center underline underline-offset-4">
        Delete<span className="sr-only"> {name}</span> …
      </summary>
      <form action={action} className="mt-2">
        <input type="hidden" name="projectId" value={projectId} />
        <p className="mb-2 text-note">House, designs, results and uploaded weather go for good.</p>
        <button type="submit" className="framed border-hot text-hot-text" disabled={pending}>
          Delete {name} for good
        </button>
        <p role="alert" className="mt-1 text-hot-text empty:hidden">
          {state.message}
        </p>
      </form>
    </details>
  );
}
