import type { WeatherNote } from '@/lib/weather/weather-year';

const KIND: Record<WeatherNote['kind'], string> = {
  repair: 'Repaired',
  assumption: 'Assumed',
  caution: 'Caution',
};
const ROWS_SHOWN = 12;

function rowWords(rows: readonly number[]): string {
  const shown = rows.slice(0, ROWS_SHOWN).join(', ');
  const rest = rows.length - ROWS_SHOWN;
  return `${rows.length === 1 ? 'row' : 'rows'} ${shown}${rest > 0 ? ` and ${rest} more` : ''}`;
}

/** What was repaired or assumed while a year was read. */
export function WeatherNotes({ notes }: { notes: readonly WeatherNote[] }) {
  if (notes.length === 0) return null;
  return (
    <ul className="mt-1 max-w-[44rem] text-note">
      {notes.map((note, i) => (
        <li key={i}>
          <strong>{KIND[note.kind]}.</strong> {note.message}
          {note.rows && note.rows.length > 0 && <span className="text-muted"> ({rowWords(note.rows)})</span>}
        </li>
      ))}
    </ul>
  );
}
