'use client';

import { useId, useState } from 'react';
import { useFormContext } from 'react-hook-form';
import { genericCollectors } from '@/data/collectors/generic';
import { collectorSchema } from '@/lib/schemas/collector';
import { toTyped, type Typed } from './typed-values';

/** Lays a generic class into the collector at a path; what stood there can be put back. */
export function GenericStart({ path }: { path: string }) {
  const { setValue, getValues, trigger } = useFormContext();
  const [chosen, setChosen] = useState(genericCollectors[0]!.name);
  const [before, setBefore] = useState<Typed>();
  const id = useId();

  function lay(collector: Typed) {
    setValue(path, collector, { shouldDirty: true });
    void trigger(path);
  }

  return (
    <div className="flex flex-wrap items-end gap-x-4 gap-y-2 bg-band p-3">
      <div>
        <label htmlFor={id} className="mb-1 block">
          Start from a generic class
        </label>
        <select id={id} value={chosen} onChange={(event) => setChosen(event.target.value)} className="field">
          {genericCollectors.map(({ name }) => (
            <option key={name}>{name}</option>
          ))}
        </select>
      </div>
      <button
        type="button"
        className="framed"
        onClick={() => {
          const collector = genericCollectors.find(({ name }) => name === chosen);
          if (!collector) return;
          setBefore(getValues(path) as Typed);
          lay(toTyped(collectorSchema, collector));
        }}
      >
        Lay it in
      </button>
      {before !== undefined && (
        <p role="status" className="py-1">
          All figures below are those of the class.{' '}
          <button
            type="button"
            className="word"
            onClick={() => {
              lay(before);
              setBefore(undefined);
            }}
          >
            Put mine back
          </button>
        </p>
      )}
    </div>
  );
}
