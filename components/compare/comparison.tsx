import type { ReactNode } from 'react';
import { FIRST_OF_JULY } from '@/components/mosaic/stones';
import { withShortNames, type ComparedDesign } from './compared-design';
import { differences, notLikeForLike, type Terms } from './differences';
import { headline } from './headline';
import { ReceiptTable } from './receipt-table';
import { StackedMosaics } from './stacked-mosaics';

const COURSES = { ink: 'course-ink', sun: 'course-sun', hot: 'course-hot' } as const;

interface ComparisonProps {
  designs: readonly ComparedDesign[];
  terms: Terms;
  /** word for the fuel of the backup */
  fuel: string;
  latitudeDeg: number;
  links?: readonly ReactNode[];
  rateLink?: ReactNode;
}

/** Two to four designs of one house: a sentence, their years above each other, the differences, the receipt. */
export function Comparison({ designs, terms, fuel, latitudeDeg, links, rateLink }: ComparisonProps) {
  const short = withShortNames(designs);
  const warning = notLikeForLike(short);
  return (
    <>
      <h1 className="my-5 max-w-[74rem] text-verdict font-verdict text-pretty">
        {headline(short, terms.currency).map((part, i) =>
          typeof part === 'string' ? (
            part
          ) : (
            <span key={i} className={`whitespace-nowrap ${COURSES[part.course]}`}>
              {part.text}
            </span>
          ),
        )}
      </h1>
      {warning && (
        <p role="note" className="mb-4 border-l-2 border-hot pl-3 font-strong text-hot-text">
          {warning}
        </p>
      )}
      <StackedMosaics
        designs={designs}
        currency={terms.currency}
        firstDay={latitudeDeg < 0 ? 0 : FIRST_OF_JULY}
        {...(links ? { links } : {})}
      />
      <div className="mt-6 grid gap-x-14 gap-y-8 pt-3 rule-ink lg:grid-cols-[minmax(0,57fr)_minmax(0,43fr)]">
        <section aria-labelledby="differences-title">
          <h2 id="differences-title" className="pb-1">
            The differences in words
          </h2>
          <dl className="rule-ink">
            {differences(short, terms).map(({ title, sentence }) => (
              <div
                key={title}
                className="grid gap-x-6 gap-y-1 py-2 rule-hair sm:grid-cols-[12rem_minmax(0,1fr)]"
              >
                <dt className="font-display text-h3 font-heading">{title}</dt>
                <dd>{sentence}</dd>
              </div>
            ))}
          </dl>
          <p className="mt-3 text-note text-muted">
            Limits of parts are screening values; the maker’s data sheet, local codes and licensed practice
            decide.
            {designs.some(({ synthetic }) => synthetic) &&
              ` Weather year: ${designs[0]!.weatherName}, synthetic: not for a real decision.`}
          </p>
        </section>
        <ReceiptTable designs={short} terms={terms} fuel={fuel} {...(rateLink ? { rateLink } : {})} />
      </div>
    </>
  );
}
