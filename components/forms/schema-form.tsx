'use client';

import { zodResolver } from '@hookform/resolvers/zod';
import { useEffect, useMemo, useState, type FocusEvent, type KeyboardEvent, type ReactNode } from 'react';
import { FormProvider, useForm, type FieldValues, type Resolver } from 'react-hook-form';
import type { z } from 'zod';
import { Contents, type ContentsEntry } from './contents';
import { forgetDraft, keepDraft, readDraft } from './draft';
import { FormKnowledgeContext, HeldContext } from './form-context';
import { MarginNotes } from './margin-notes';
import { SaveBar } from './save-bar';
import { fromTyped, heldValues, toTyped, type Typed } from './typed-values';
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

function resolverOf(schema: z.ZodObject): Resolver<FieldValues> {
  const judge = zodResolver(schema);
  return (typed, context, options) =>
    judge(fromTyped(schema, typed) as FieldValues, context, options as Parameters<typeof judge>[2]);
}

function withoutRow(record: unknown, path: string[], index: number): unknown {
  const [key, ...rest] = path;
  if (key === undefined) return Array.isArray(record) ? record.filter((_, i) => i !== index) : record;
  const here = record as Record<string, unknown>;
  return { ...here, [key]: withoutRow(here[key], rest, index) };
}

/**
 * A form page: contents, sheet, margin notes. Limits, words and defaults come from the schema; what is typed is kept
 * in this tab until the server has taken it.
 */
export function SchemaForm<T extends FieldValues>(props: SchemaFormProps<T>) {
  const { schema, draftKey, currency, contents } = props;
  const [stored, setStored] = useState(props.stored);
  const savedText = useMemo(() => toTyped(schema, stored.data) as TypedRecord, [schema, stored]);
  const [held, setHeld] = useState<unknown>(() => schema.parse(stored.data));
  const [focused, setFocused] = useState('');
  const [restored, setRestored] = useState(false);
  const resolver = useMemo(() => resolverOf(schema), [schema]);
  const form = useForm<FieldValues>({ defaultValues: savedText, resolver, mode: 'onTouched' });
  const { state, pending, save, calm } = useSaving(props.save);

  useEffect(() => {
    const draft = readDraft(draftKey);
    if (!draft || JSON.stringify(draft.typed) === JSON.stringify(form.getValues())) return;
    form.reset(draft.typed, { keepDefaultValues: true });
    setStored((now) => ({ ...now, version: draft.version }));
    setHeld((last: unknown) => heldValues(schema, draft.typed, last as z.output<typeof schema>));
    setRestored(true);
    void form.trigger();
  }, [draftKey, form, schema]);

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
              <div className="min-w-0 space-y-10">{props.children}</div>
              <MarginNotes />
            </div>
          </form>
        </HeldContext>
      </FormKnowledgeContext>
    </FormProvider>
  );
}
