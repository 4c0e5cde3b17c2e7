'use client';

import { useActionState, useState } from 'react';
import { copyDesignAction } from '../actions';

interface AddDesignProps {
  projectId: string;
  designs: readonly { id: string; name: string }[];
}

/** Another design: a copy of one that is there, under its own name. */
export function AddDesign({ projectId, designs }: AddDesignProps) {
  const [state, action, pending] = useActionState(copyDesignAction, {});
  const [name, setName] = useState('Another design');
  const [from, setFrom] = useState(designs[0]?.id ?? '');
  if (designs.length === 0) return null;
  return (
    <form id="add-design" action={action} className="scroll-mt-20">
      <input type="hidden" name="projectId" value={projectId} />
      <div className="flex flex-wrap items-end gap-x-4 gap-y-3">
        <div>
          <label htmlFor="add-design-name" className="mb-1 block">
            Name of a new design
          </label>
          <input
            id="add-design-name"
            name="name"
            className="field"
            value={name}
            maxLength={120}
            onChange={(event) => setName(event.target.value)}
          />
        </div>
        <div>
          <label htmlFor="add-design-from" className="mb-1 block">
            Begin with a copy of
          </label>
          <select
            id="add-design-from"
            name="from"
            className="field max-w-full"
            value={from}
            onChange={(event) => setFrom(event.target.value)}
          >
            {designs.map((design) => (
              <option key={design.id} value={design.id}>
                {design.name}
              </option>
            ))}
          </select>
        </div>
        <button type="submit" className="framed" disabled={pending}>
          {pending ? 'Adding …' : 'Add the design'}
        </button>
      </div>
      <p role="alert" className="mt-1 text-hot-text empty:hidden">
        {state.message}
      </p>
    </form>
  );
}
