import type { CheckedEntry } from '@/lib/method/method-page';
import { CheckTable } from './check-table';
import { Equation, Prose } from './method-text';

/** One function of the core: its equation, symbols, range, source and the present value of its checks. */
export function EntrySection({ entry }: { entry: CheckedEntry }) {
  const { name, file, purpose, body, bodyIsEquation, params, returns, remarks, sources, checks } = entry;
  return (
    <section id={name} aria-labelledby={`${name}-heading`} className="mt-6 scroll-mt-4 pt-2 rule-ink">
      <h3 id={`${name}-heading`} className="max-w-[44rem]">
        <Prose text={purpose} />
      </h3>
      {body !== '' &&
        (bodyIsEquation ? (
          <p className="mt-2 max-w-[52rem] pl-4 font-display text-h2 break-words italic lining-nums">
            <Equation text={body} />
          </p>
        ) : (
          <p className="mt-2 max-w-[44rem]">
            <Prose text={body} />
          </p>
        ))}
      {(params.length > 0 || returns !== undefined) && <SymbolTable entry={entry} />}
      {remarks.map((remark) => (
        <p key={remark} className="mt-2 max-w-[44rem]">
          <Prose text={remark} />
        </p>
      ))}
      <p className="mt-2 max-w-[52rem] text-note break-words text-muted">
        {sources.length > 0 && <>Source: {sources.join('; ')}. </>}
        In the code <i>{name}</i>, {file}.
      </p>
      {checks.length > 0 && (
        <div className="mt-3">
          <CheckTable label={`Checks of ${purpose}`} rows={checks} />
        </div>
      )}
      <AlsoChecked entry={entry} />
    </section>
  );
}

function AlsoChecked({ entry }: { entry: CheckedEntry }) {
  if (entry.alsoChecked.length === 0) return null;
  return (
    <p className="mt-2 text-note text-muted">
      Also called by{' '}
      {entry.alsoChecked.map(({ id }, place) => (
        <span key={id}>
          {place > 0 && ', '}
          <a href={`#check-${id}`}>{id}</a>
        </span>
      ))}
      .
    </p>
  );
}

function SymbolTable({ entry: { purpose, params, returns } }: { entry: CheckedEntry }) {
  const rows = returns === undefined ? params : [...params, { ...returns, name: 'result' }];
  return (
    <div
      className="mt-3 max-w-[52rem] overflow-x-auto"
      role="region"
      aria-label={`Symbols of ${purpose}`}
      tabIndex={0}
    >
      <table className="w-full">
        <thead>
          <tr>
            {['Name', 'Meaning', 'Unit', 'Holds for'].map((word) => (
              <th key={word} scope="col">
                {word}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {rows.map(({ name, meaning, unit, range }) => (
            <tr key={name}>
              <th scope="row" className="pr-4 font-normal italic">
                {name}
              </th>
              <td className="pr-4">
                <Prose text={meaning} />
              </td>
              <td className="pr-4 whitespace-nowrap text-muted">{unit}</td>
              <td>
                <Prose text={range} />
              </td>
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}
