'use client';

import { useEffect, useState } from 'react';

const REFRESH_MS = 10_000;
const UNITS: readonly [Intl.RelativeTimeFormatUnit, number][] = [
  ['day', 86_400],
  ['hour', 3600],
  ['minute', 60],
];
const format = new Intl.RelativeTimeFormat('en-GB', { numeric: 'auto' });

function agoWords(seconds: number): string {
  const unit = UNITS.find(([, length]) => seconds >= length);
  return unit ? format.format(-Math.floor(seconds / unit[1]), unit[0]) : 'just now';
}

/** "14 minutes ago", kept up to date; the time itself as its title. */
export function TimeAgo({ at }: { at: string }) {
  const [words, setWords] = useState('');
  useEffect(() => {
    const tell = () => setWords(agoWords(Math.max(0, (Date.now() - Date.parse(at)) / 1000)));
    tell();
    const timer = setInterval(tell, REFRESH_MS);
    return () => clearInterval(timer);
  }, [at]);
  return (
    <time dateTime={at} title={at}>
      {words}
    </time>
  );
}
