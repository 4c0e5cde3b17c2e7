'use client';

import Link from 'next/link';
import { Popover } from 'radix-ui';
import { useRef, useState } from 'react';
import type { ReactNode, RefObject } from 'react';
import { OriginMark } from '@/components/forms/origin-mark';
import type { ExplainedInput, Explanation } from './explanation';

interface HowComputedProps {
  /** called when somebody asks, not while years stream in */
  explain(): Explanation;
  /** look of the number; dots under it by default */
  className?: string;
  /** a name for those who listen, where the number alone says too little */
  label?: string;
  children: ReactNode;
}

const DOTTED = 'inline-block min-h-6 underline decoration-line decoration-dotted underline-offset-4';

/**
 * A number that opens how it was computed: equation, inputs with their origins, source, method pages. Closed it is a
 * plain button, because dozens of them are drawn with every year while a lever moves.
 */
export function HowComputed({ explain, className = DOTTED, label, children }: HowComputedProps) {
  const [open, setOpen] = useState(false);
  const button = useRef<HTMLButtonElement>(null);
  return (
    <>
      <button
        ref={button}
        type="button"
        className={`${className} whitespace-nowrap hover:bg-band`}
        title="How it was computed"
        aria-label={label}
        aria-haspopup="dialog"
        aria-expanded={open}
        onClick={() => setOpen(!open)}
      >
        {children}
      </button>
      {open && <ExplanationPopover explanation={explain()} anchor={button} onClose={() => setOpen(false)} />}
    </>
  );
}

interface ExplanationPopoverProps {
  explanation: Explanation;
  anchor: RefObject<HTMLButtonElement | null>;
  onClose(): void;
}

function ExplanationPopover({ explanation, anchor, onClose }: ExplanationPopoverProps) {
  const leftForElsewhere = useRef(false);
  return (
    <Popover.Root open onOpenChange={onClose}>
      <Popover.Anchor virtualRef={anchor} />
      <Popover.Portal>
        <Popover.Content
          sideOffset={8}
          collisionPadding={16}
          aria-label={`How it was computed: ${explanation.title}`}
          className="z-10 max-h-(--radix-popover-content-available-height) w-[min(28rem,calc(100vw-2rem))] overflow-y-auto border border-ink bg-paper p-4 font-text text-body"
          onInteractOutside={(event) => {
            leftForElsewhere.current = true;
            // The button closes by itself; closed from here first, its click would open the sheet again.
            if (anchor.current?.contains(event.target as Node)) event.preventDefault();
          }}
          onCloseAutoFocus={(event) => {
            event.preventDefault();
            if (!leftForElsewhere.current) anchor.current?.focus();
          }}
        >
          <ExplanationSheet explanation={explanation} />
          <Popover.Close className="mt-3 word">Close</Popover.Close>
        </Popover.Content>
      </Popover.Portal>
    </Popover.Root>
  );
}

function ExplanationSheet({ explanation }: { explanation: Explanation }) {
  const { title, value, equation, inputs, entered, source, method } = explanation;
  return (
    <>
      <h2 className="flex items-baseline justify-between gap-4">
        {title} <span className="whitespace-nowrap">{value}</span>
      </h2>
      <p className="mt-2 font-display text-h3 italic">= {equation}</p>
      <InputList inputs={inputs} />
      {entered && (
        <>
          <h3 className="mt-3">Entered for it</h3>
          <InputList inputs={entered} />
        </>
      )}
      <p className="mt-3 text-note text-muted">{source}</p>
      <p className="mt-2 text-note">
        Equations, sources, checks:{' '}
        {method.map(({ text, href }, place) => (
          <span key={href}>
            {place > 0 && ' · '}
            <Link href={href}>{text}</Link>
          </span>
        ))}
      </p>
    </>
  );
}

function InputList({ inputs }: { inputs: readonly ExplainedInput[] }) {
  return (
    <dl className="mt-2 rule-ink">
      {inputs.map(({ name, value, origin, source }) => (
        <div key={name} className="flex justify-between gap-4 py-1 rule-hair">
          <dt>
            {name}
            {origin && (
              <span className="block text-note text-muted">
                <OriginMark origin={origin} />
                {source && `: ${source}`}
              </span>
            )}
          </dt>
          <dd className="whitespace-nowrap tabular-nums">{value}</dd>
        </div>
      ))}
    </dl>
  );
}
