interface BigFiguresProps {
  figures: readonly { value: string; words: string }[];
}

/** What the form adds up to: a few large figures, each with its words. */
export function BigFigures({ figures }: BigFiguresProps) {
  return (
    <dl className="grid grid-cols-2 gap-x-7 gap-y-4 max-sm:gap-x-4 md:grid-cols-4" aria-live="polite">
      {figures.map(({ value, words }) => (
        <div key={words} className="flex flex-col-reverse justify-end pt-1 rule-ink">
          <dt>{words}</dt>
          <dd className="font-display text-title font-heading">{value}</dd>
        </div>
      ))}
    </dl>
  );
}
