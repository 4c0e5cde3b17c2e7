'use client';

import { useActionState } from 'react';
import { deleteDesignAction } from '../actions';

interface DeleteDesignProps {
  projectId: string;
  designId: string;
  name: string;
}

/** A word that opens the question; the second press deletes. */
export function DeleteDesign({ projectId, designId, name }: DeleteDesignProps) {
  const [state, action, pending] = useActionState(deleteDesignAction, {});
  return (
    <details>
      <summary className="inline-flex min-h-6 items-center underline underline-offset-4">
        Delete<span className="sr-only"> {name}</span> …
      </summary>
      <form action={action} className="mt-2">
        <input type="hidden" name="projectId" value={projectId} />
        <input type="hidden" name="designId" value={designId} />
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
