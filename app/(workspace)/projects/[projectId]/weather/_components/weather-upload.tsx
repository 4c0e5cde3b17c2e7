'use client';

import { useRouter } from 'next/navigation';
import { useState } from 'react';
import type { Answer } from '@/lib/schemas/answer';
import type { WeatherHeader } from '@/lib/weather/weather-header';
import type { WeatherResult } from '@/lib/weather/weather-result';
import { WeatherPreview } from './weather-preview';
import { WeatherRefused } from './weather-refused';

interface ReadFile {
  file: File;
  bytes: Uint8Array<ArrayBuffer>;
  repair: boolean;
  result: WeatherResult;
}

/** Reads the file here in the browser first, so that people see what was found before anything is kept. */
export function WeatherUpload({ projectId }: { projectId: string }) {
  const [read, setRead] = useState<ReadFile>();
  const [message, setMessage] = useState<string>();
  const [sending, setSending] = useState(false);
  const router = useRouter();

  async function readAgain(file: File, repair: boolean) {
    const { readWeather } = await import('@/lib/weather/read-weather');
    const bytes = new Uint8Array(await file.arrayBuffer());
    setMessage(undefined);
    setRead({ file, bytes, repair, result: readWeather(bytes, { repair }) });
  }

  async function keep({ file, bytes, repair }: ReadFile) {
    setSending(true);
    const answer = await send(projectId, file.name, bytes, repair);
    setSending(false);
    if (!answer.ok) return setMessage(answer.message);
    setRead(undefined);
    setMessage(`${answer.weatherYear.name} is kept and in use.`);
    router.refresh();
  }

  return (
    <div>
      <label htmlFor="weather-file" className="mb-1 block">
        EPW or TMY3 file with the 8 760 hours of a year
      </label>
      <input
        id="weather-file"
        type="file"
        accept=".epw,.csv,.CSV,.EPW,text/csv,text/plain"
        className="field w-full max-w-[32rem] file:mr-3 file:cursor-pointer file:border-0 file:bg-transparent file:p-0 file:text-ink file:underline file:underline-offset-4"
        aria-describedby="weather-file-note"
        onChange={(event) => {
          const file = event.target.files?.[0];
          if (file) void readAgain(file, false);
        }}
      />
      <p id="weather-file-note" className="mt-1 mb-4 text-note text-muted">
        The file is looked at in this browser; it is sent and kept, byte for byte, only when you say so.
      </p>
      {read?.result.ok && (
        <WeatherPreview year={read.result.year} sending={sending} onKeep={() => void keep(read)} />
      )}
      {read && !read.result.ok && (
        <WeatherRefused refusal={read.result} onRepair={() => void readAgain(read.file, true)} />
      )}
      <p role="status" className="mt-3 empty:hidden">
        {message}
      </p>
    </div>
  );
}

async function send(
  projectId: string,
  fileName: string,
  bytes: Uint8Array<ArrayBuffer>,
  repair: boolean,
): Promise<Answer<{ weatherYear: WeatherHeader }>> {
  const query = new URLSearchParams({ fileName, repair: repair ? 'yes' : 'no' });
  try {
    const response = await fetch(`/api/projects/${projectId}/weather?${query}`, {
      method: 'POST',
      body: bytes,
    });
    return (await response.json()) as Answer<{ weatherYear: WeatherHeader }>;
  } catch {
    return {
      ok: false,
      code: 'busy',
      message: 'The server does not answer. The file is still chosen here: try again in a moment.',
    };
  }
}
