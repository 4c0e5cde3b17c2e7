/** A quantity of a docstring: what it means, in which unit, and where it holds. */
export interface Quantity {
  name: string;
  meaning: string;
  /** as written in brackets; '' where the text names several or none */
  unit: string;
  range: string;
}

/** What a docstring says, taken apart. */
export interface Docstring {
  purpose: string;
  /** the equation as written, or what else follows the purpose; '' when nothing does */
  body: string;
  bodyIsEquation: boolean;
  params: Quantity[];
  returns: Quantity | undefined;
  remarks: string[];
  sources: string[];
}

const ONE_LINE = /\s*\n\s*/g;
const MATHS = /[=^√Σ∫·×≈≤²³/]| [−+] /;
const EQUATION = /[=^√Σ∫≈≤]| [−·/×] |\)\/|\/\(/;

/**
 * Takes a docstring apart: purpose, equation, parameters, result, remarks, sources.
 * @param text docstring without stars
 * @returns its parts; empty ones where it says nothing
 */
export function readDocstring(text: string): Docstring {
  const [head = '', ...tags] = text.split(/^(?=@[a-z]+\b)/m);
  const bodies = (name: string) =>
    tags
      .filter((tag) => new RegExp(`^@${name}\\b`).test(tag))
      .map((tag) =>
        tag
          .replace(/^@[a-z]+\s*/, '')
          .replace(ONE_LINE, ' ')
          .trim(),
      );
  const [returns] = bodies('returns');
  return {
    ...splitPurpose(head.replace(ONE_LINE, ' ').trim()),
    params: bodies('param').map((tag) => {
      const [name = '', ...rest] = tag.split(' ');
      return quantity(name, rest.join(' '));
    }),
    returns: returns === undefined ? undefined : quantity('', returns),
    remarks: bodies('remarks'),
    sources: bodies('see').map((source) => source.replace(/^- /, '')),
  };
}

/** "Return of a loop: θR = θV − Φ/C." → purpose and equation. */
function splitPurpose(head: string): Pick<Docstring, 'purpose' | 'body' | 'bodyIsEquation'> {
  const colon = head.indexOf(': ');
  const stop = head.search(/\. (?=\S)/);
  const afterColon = colon < 0 ? '' : head.slice(colon + 2);
  const atColon = colon >= 0 && (stop < 0 || colon < stop) && MATHS.test(afterColon);
  const cut = atColon ? colon : stop;
  const purpose = (cut < 0 ? head : head.slice(0, cut)).replace(/\.$/, '');
  const body = cut < 0 ? '' : head.slice(cut + 1).trim();
  return { purpose, body: body.replace(/^Equation: /, ''), bodyIsEquation: atColon || EQUATION.test(body) };
}

/** "mean excess of the water [K] from 0" → meaning, unit, range; several units stay in the text. */
function quantity(name: string, text: string): Quantity {
  const units = text.match(/\[[^\]]+\]/g) ?? [];
  const [unit] = units;
  if (units.length !== 1 || unit === undefined) return { name, meaning: text, unit: '', range: '' };
  const at = text.indexOf(unit);
  const trim = (part: string) => part.replace(/^[\s,;]+|[\s,;]+$/g, '');
  return {
    name,
    meaning: trim(text.slice(0, at)),
    unit: unit.slice(1, -1),
    range: trim(text.slice(at + unit.length)),
  };
}
