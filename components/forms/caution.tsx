import type { ReactNode } from 'react';

/** The usual caution beside a number that could hurt somebody: a diamond, its upper half solid, and the word. */
export function Caution({ children }: { children: ReactNode }) {
  return (
    <p className="flex max-w-[70ch] gap-3 border-t border-hair pt-2 text-note">
      <svg width="15" height="15" viewBox="0 0 15 15" aria-hidden="true" className="mt-0.5 shrink-0">
        <path d="M7.5 1 14 7.5 7.5 14 1 7.5Z" fill="none" stroke="currentColor" strokeWidth="1.2" />
        <path d="M7.5 1 14 7.5H1Z" fill="currentColor" />
      </svg>
      <span>
        <strong>Caution.</strong> {children}
      </span>
    </p>
  );
}
