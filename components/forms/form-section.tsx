import type { ReactNode } from 'react';

interface FormSectionProps {
  id: string;
  title: string;
  aside?: ReactNode;
  children: ReactNode;
}

/** One section of a sheet: a heading to which the contents lead, and its fields. */
export function FormSection({ id, title, aside, children }: FormSectionProps) {
  return (
    <section id={id} aria-labelledby={`${id}-title`} className="scroll-mt-20 space-y-4">
      <div className="flex flex-wrap items-baseline justify-between gap-x-6">
        <h2 id={`${id}-title`} className="text-title">
          {title}
        </h2>
        {aside}
      </div>
      {children}
    </section>
  );
}

/** Fields side by side, four to a line where there is room. */
export function FieldRow({ children }: { children: ReactNode }) {
  return <div className="grid grid-cols-2 gap-x-7 gap-y-4 max-sm:gap-x-4 md:grid-cols-4">{children}</div>;
}
