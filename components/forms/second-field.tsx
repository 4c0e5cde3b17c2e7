'use client';

import { useEffect, useId, useRef, useState, type ReactNode, type Ref } from 'react';
import { useFormContext, useWatch } from 'react-hook-form';
import { genericCollectors } from '@/data/collectors/generic';
import { collectorSchema } from '@/lib/schemas/collector';
import { arraySchema, type DesignRecord } from '@/lib/schemas/design';
import { FormSection } from './form-section';
import { toTyped, type Typed } from './typed-values';

interface SecondFieldProps {
  /** the array that a new field begins with */
  firstArray: DesignRecord['array'];
  /** path of the field that is looked at first once it has been added */
  firstField: string;
  /** what else stands on another page */
  elsewhere: string;
  children: ReactNode;
}

/** The section of a second collector field: added from a generic class and the first array, or taken away again. */
export function SecondField({ firstArray, firstField, elsewhere, children }: SecondFieldProps) {
  const { control, setValue, getValues, clearErrors, setFocus } = useFormContext();
  const present = Boolean(useWatch({ control, name: 'second' }));
  const [removed, setRemoved] = useState<Typed>();
  const [changed, setChanged] = useState(false);
  const addButton = useRef<HTMLButtonElement>(null);

  useEffect(() => {
    if (!changed) return;
    if (present) setFocus(firstField);
    else addButton.current?.focus();
  }, [changed, present, firstField, setFocus]);

  function put(second: Typed) {
    setChanged(true);
    setValue('second', second, { shouldDirty: true });
    clearErrors('second');
  }

  return (
    <FormSection
      id="second"
      title="Second field"
      aside={
        present && (
          <button
            type="button"
            className="word"
            onClick={() => {
              setRemoved(getValues('second') as Typed);
              put(null);
            }}
          >
            Remove the second field
          </button>
        )
      }
    >
      <p className="max-w-[70ch] text-muted">
        {present
          ? `On the same store, with the same layout and controller settings. ${elsewhere}`
          : 'Collectors of another kind, on another slope or in other months can charge the same store. They get pipes of their own; layout, controller settings and store serve both fields.'}
      </p>
      {present ? (
        children
      ) : (
        <AddField
          button={addButton}
          onAdd={(collector) => put({ collector, array: toTyped(arraySchema, firstArray) })}
        />
      )}
      {!present && removed !== undefined && (
        <p role="status">
          The second field is gone once this is saved.{' '}
          <button
            type="button"
            className="word"
            onClick={() => {
              put(removed);
              setRemoved(undefined);
            }}
          >
            Put it back
          </button>
        </p>
      )}
    </FormSection>
  );
}

interface AddFieldProps {
  button: Ref<HTMLButtonElement>;
  onAdd(collector: Typed): void;
}

/** Which collectors a second field begins with. */
function AddField({ button, onAdd }: AddFieldProps) {
  const [chosen, setChosen] = useState(genericCollectors.at(-1)!.name);
  const id = useId();
  return (
    <div className="flex flex-wrap items-end gap-x-4 gap-y-2 bg-band p-3">
      <div>
        <label htmlFor={id} className="mb-1 block">
          Its collectors, to begin with
        </label>
        <select id={id} value={chosen} onChange={(event) => setChosen(event.target.value)} className="field">
          {genericCollectors.map(({ name }) => (
            <option key={name}>{name}</option>
          ))}
        </select>
      </div>
      <button
        ref={button}
        type="button"
        className="framed"
        onClick={() =>
          onAdd(
            toTyped(
              collectorSchema,
              genericCollectors.find(({ name }) => name === chosen),
            ),
          )
        }
      >
        Add a second field
      </button>
    </div>
  );
}
