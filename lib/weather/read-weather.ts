import { readEpw } from '@/lib/weather/read-epw';
import { readTmy3 } from '@/lib/weather/read-tmy3';
import { decodeText } from '@/lib/weather/scan-bytes';
import type { ReadOptions, WeatherRefusal, WeatherResult } from '@/lib/weather/weather-result';

interface Reader {
  format: string;
  /** whether the first lines of a file look like this format, complete or with a header line lost */
  recognises: (head: string) => boolean;
  read: (bytes: Uint8Array, options: ReadOptions) => WeatherResult;
}

const HEAD_BYTES = 4096;

/** Every format that can be read; the first that recognises the file gets it. */
const READERS: readonly Reader[] = [
  {
    format: 'EPW',
    recognises: (head) =>
      /^\s*"?(LOCATION|DESIGN CONDITIONS|TYPICAL\/EXTREME PERIODS|GROUND TEMPERATURES|HOLIDAYS|COMMENTS 1|DATA PERIODS)"?,/i.test(
        head,
      ) || /^\d{4},\s*\d{1,2},\s*\d{1,2},\s*\d{1,2},\s*\d{1,2},(?:[^,\n]*,){25}/.test(head),
    read: readEpw,
  },
  {
    format: 'TMY3',
    recognises: (head) =>
      /^[^\n]*\n"?Date \(MM\/DD\/YYYY\)/i.test(head) ||
      /^"?Date \(MM\/DD\/YYYY\)/i.test(head) ||
      /^\d{6},(?:"[^"\n]*"|[^",\n]*),[^,\n]*,[^,\n]*,[^,\n]*,[^,\n]*,[^,\n]*\r?\n/.test(head) ||
      /^\d{2}\/\d{2}\/\d{4},\s*\d{2}:\d{2},(?:[^,\n]*,){40}/.test(head),
    read: readTmy3,
  },
];

/**
 * Reads a weather file of any known format, told by its content, never by its name.
 * @param bytes the file
 * @param options `repair: true` does what a refusal offered
 * @returns the year of 8,760 hours, or a refusal in words with row numbers of the file
 * @see lib/weather/read-epw.ts, lib/weather/read-tmy3.ts for the formats' sources
 */
export function readWeather(bytes: Uint8Array, options: ReadOptions = {}): WeatherResult {
  if (bytes.length === 0) {
    return { ok: false, code: 'empty', message: 'The file is empty. Choose another one.' };
  }
  const head = decodeText(bytes.subarray(0, HEAD_BYTES)).replace(/^\uFEFF/, '');
  const reader = READERS.find((candidate) => candidate.recognises(head));
  return reader ? reader.read(bytes, options) : unknownFormat(head);
}

function unknownFormat(head: string): WeatherRefusal {
  const known = READERS.map((reader) => reader.format).join(' or ');
  const advice = head.startsWith('PK')
    ? 'This is a zip archive: unpack it and upload the weather file inside.'
    : `This is none of the formats read so far: upload an hourly year as ${known}.`;
  return { ok: false, code: 'unknown-format', message: advice };
}
