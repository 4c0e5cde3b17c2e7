'use client';

import {
  useEffect,
  useMemo,
  useState,
  useSyncExternalStore,
  type FocusEvent,
  type KeyboardEvent,
  type ReactNode,
} from 'react';
import { FormProvider, useForm, type FieldValues } from 'react-hook-form';
import type { z } from 'zod';
import { Contents, type ContentsEntry } from './contents';
import { forgetDraft, keepDraft, readDraft } from './draft';
import { FormKnowledgeContext, HeldContext } from './form-context';
import { resolverOf } from './form-resolver';
import { MarginNotes } from './margin-notes';
import { SaveBar } from './save-bar';
import { heldValues, toTyped, withoutRow, type Typed } from './typed-values';
import { useSaving, type SaveAnswer, type Stored } from './use-saving';

interface SchemaFormProps<T> {
  /** the part of the record that this form edits */
  schema: z.ZodObject;
  /** the whole record as it stands in the database */
  stored: Stored<T>;
  /** name under which unsaved typing is kept */
  draftKey: string;
  title: string;
  currency: string;
  contents: readonly ContentsEntry[];
  save(data: T, version: number): Promise<SaveAnswer<T>>;
  children: ReactNode;
  /** under the running head, beside the title */
  frieze?: ReactNode;
}

type TypedRecord = { [key: string]: Typed };

const never = () => () => undefined;

/**
 * A form page: contents, sheet, margin notes. Limits, words and defaults come from the schema; what is typed is kept
 * in this tab until the server has taken it.
 */
export function SchemaForm<T extends FieldValues>(props: SchemaFormProps<T>) {
  const inBrowser = useSyncExternalStore(
    never,
    () => true,
    () => false,
  );
  return <FormSheet key={String(inBrowser)} {...props} inBrowser={inBrowser} />;
}

/** The draft of before a reload, where it says something else than the database. */
function unsavedDraft(draftKey: string, savedText: TypedRecord) {
  const draft = readDraft(draftKey);
  return draft && JSON.stringify(draft.typed) !== JSON.stringify(savedText) ? draft : undefined;
}

function FormSheet<T extends FieldValues>(props: SchemaFormProps<T> & { inBrowser: boolean }) {
  const { schema, draftKey, currency, contents } = props;
  const [draft] = useState(() =>
    props.inBrowser ? unsavedDraft(draftKey, toTyped(schema, props.stored.data) as TypedRecord) : undefined,
  );
  const [restored, setRestored] = useState(draft !== undefined);
  const [stored, setStored] = useState({
    data: props.stored.data,
    version: draft?.version ?? props.stored.version,
  });
  const [held, setHeld] = useState<unknown>(() => {
    const saved = schema.parse(stored.data);
    return draft ? heldValues(schema, draft.typed, saved) : saved;
  });
  const [focused, setFocused] = useState('');
  const resolver = useMemo(() => resolverOf(schema), [schema]);
  const form = useForm<FieldValues>({
    defaultValues: toTyped(schema, stored.data) as TypedRecord,
    resolver,
    mode: 'onTouched',
  });
  const { state, pending, save, calm } = useSaving(props.save);

  useEffect(() => {
    if (!draft) return;
    form.reset(draft.typed, { keepDefaultValues: true });
    void form.trigger();
  }, [draft, form]);

  useEffect(
    () =>
      form.subscribe({
        formState: { values: true },
        callback: ({ values }) => {
          const typed = values as TypedRecord;
          setHeld((last: unknown) => heldValues(schema, typed, last as z.output<typeof schema>));
          keepDraft(draftKey, { version: stored.version, typed });
        },
      }),
    [draftKey, form, schema, stored.version],
  );

  function sendUpon(base: Stored<T>) {
    return form.handleSubmit((part) => {
      const typed = form.getValues() as TypedRecord;
      const data = { ...base.data, ...part } as T;
      save(data, base.version, (version) => {
        const unchanged = JSON.stringify(typed) === JSON.stringify(form.getValues());
        setStored({ data, version });
        setRestored(false);
        form.reset(typed, { keepValues: true });
        if (unchanged) forgetDraft(draftKey);
        else keepDraft(draftKey, { version, typed: form.getValues() as TypedRecord });
      });
    });
  }

  function standBack(at: Stored<T>) {
    form.reset(toTyped(schema, at.data) as TypedRecord);
    setStored(at);
    setHeld(schema.parse(at.data));
    setRestored(false);
    forgetDraft(draftKey);
    calm();
  }

  const submit = sendUpon(stored);
  const knowledge = useMemo(
    () => ({
      schema,
      currency,
      focused,
      dropRow: (path: string, index: number) =>
        setHeld((last: unknown) => withoutRow(last, path.split('.'), index)),
    }),
    [schema, currency, focused],
  );

  function onKeyDown(event: KeyboardEvent) {
    if (event.key.toLowerCase() !== 's' || !(event.ctrlKey || event.metaKey)) return;
    event.preventDefault();
    void submit();
  }

  return (
    <FormProvider {...form}>
      <FormKnowledgeContext value={knowledge}>
        <HeldContext value={held}>
          <form
            noValidate
            aria-label={props.title}
            onSubmit={(event) => void submit(event)}
            onKeyDown={onKeyDown}
            onFocus={(event: FocusEvent<HTMLFormElement, HTMLElement>) => {
              const name = event.target.getAttribute('name');
              if (name) setFocused(name);
            }}
          >
            <SaveBar
              title={props.title}
              frieze={props.frieze}
              state={state}
              pending={pending}
              restored={restored}
              onDiscard={() => standBack(props.stored)}
              onTakeTheirs={standBack}
              onKeepMine={(current) => void sendUpon(current)()}
            />
            <div className="mt-4 grid gap-x-10 gap-y-6 lg:grid-cols-[200px_minmax(0,1fr)] xl:grid-cols-[200px_minmax(0,1fr)_262px]">
              <Contents entries={contents} focused={focused} />
              {/* until the script is there nothing could keep what is typed, so nothing can be typed */}
              <fieldset disabled={!props.inBrowser} className="min-w-0 space-y-10">
                {props.children}
              </fieldset>
              <MarginNotes />
            </div>
          </form>
        </HeldContext>
      </FormKnowledgeContext>
    </FormProvider>
  );
}
