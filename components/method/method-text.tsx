import { Fragment } from 'react';

const INDEX = '_\\{[^}]+\\}|_[A-Za-zΑ-ω0-9]+(?:,[A-Za-zΑ-ω0-9]+)*';
const POWER = '\\^\\([^()]*(?:\\([^()]*\\)[^()]*)*\\)|\\^\\{[^}]+\\}|\\^[−-]?[A-Za-z0-9.⅓]*[A-Za-z0-9⅓]';
const SCRIPTS = new RegExp(`(${INDEX}|${POWER})`);

/** Indices and powers as the docstrings write them: `K_H`, `x^n`, `e^(−N)`. */
function Scripts({ text }: { text: string }) {
  return (
    <>
      {text.split(SCRIPTS).map((part, place) => (
        <Script key={place} part={part} />
      ))}
    </>
  );
}

function Script({ part }: { part: string }) {
  const inner = part.slice(1).replace(/^[({]|[)}]$/g, '');
  if (part.startsWith('_') && part.length > 1) return <sub>{inner}</sub>;
  if (part.startsWith('^') && part.length > 1) return <sup>{inner}</sup>;
  return <>{part}</>;
}

/** An equation of a docstring, without the marks of code and the full stop. */
export function Equation({ text }: { text: string }) {
  return <Scripts text={text.replaceAll('`', '').replace(/\.$/, '')} />;
}

/** A sentence of a docstring; names of the code, in backticks there, are set in italics. */
export function Prose({ text }: { text: string }) {
  return (
    <>
      {text.split('`').map((part, place) => (
        <Fragment key={place}>{place % 2 === 1 ? <i>{part}</i> : <Scripts text={part} />}</Fragment>
      ))}
    </>
  );
}
