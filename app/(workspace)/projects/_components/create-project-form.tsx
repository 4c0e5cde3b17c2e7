'use client';

import { useActionState, useState } from 'react';
import { createProjectAction } from '../actions';

interface CreateProjectFormProps {
  defaultName: string;
  /** the one filled button of the page while there is no project yet */
  first: boolean;
}

/** Names a new project and lays the demonstration house out under that name. */
export function CreateProjectForm({ defaultName, first }: CreateProjectFormProps) {
  const [state, action, pending] = useActionState(createProjectAction, {});
  const [name, setName] = useState(state.name ?? defaultName);
  return (
    <form action={action}>
      <label htmlFor="new-project-name" className="mb-1 block">
        Name of the house
      </label>
      <div className="flex flex-wrap gap-3">
        <input
          id="new-project-name"
          name="name"
          className="field min-w-0 grow sm:max-w-[22rem]"
          value={name}
          maxLength={120}
          onChange={(event) => setName(event.target.value)}
          aria-invalid={state.message ? true : undefined}
          aria-describedby={state.message ? 'new-project-message' : undefined}
        />
        <button type="submit" className={first ? 'framed filled' : 'framed'} disabled={pending}>
          {pending ? 'Laying it out …' : 'Begin with the demonstration house'}
        </button>
      </div>
      <p id="new-project-message" role="alert" className="mt-1 text-hot-text empty:hidden">
        {state.message}
      </p>
    </form>
  );
}
