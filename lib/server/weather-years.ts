import 'server-only';
import { createHash } from 'node:crypto';
import { z } from 'zod';
import { setWeatherYear } from '@/db/queries/projects';
import {
  deleteUploadedYear,
  findWeatherYear,
  insertWeatherYear,
  listWeatherHeaders,
} from '@/db/queries/weather-years';
import type { Answer, Refusal } from '@/lib/schemas/answer';
import { shortName } from '@/lib/schemas/quantity';
import { readWeather } from '@/lib/weather/read-weather';
import type { WeatherHeader } from '@/lib/weather/weather-header';
import type { WeatherRefusal } from '@/lib/weather/weather-result';
import type { WeatherYear } from '@/lib/weather/weather-year';
import { asAccount, notFound, withProject } from './authorise';
import { database } from './database';
import { parseInput } from './parse-input';

/** Why an uploaded file was not taken: rows in question and the repair that is offered. */
export interface FileRefusal extends Refusal {
  rows?: WeatherRefusal['rows'];
  repair?: string;
}

const uploadName = z.object({ fileName: shortName('File name', 'weather.epw') });

/** The climates that ship with the application, and the project's own uploads. */
export function listWeatherYears(
  projectId: string,
): Promise<Answer<{ weatherYears: WeatherHeader[]; chosenId: string | null }>> {
  return withProject(projectId, async (project) => {
    const weatherYears = await listWeatherHeaders(database(), project.id);
    return { ok: true as const, weatherYears, chosenId: project.weather_year_id };
  });
}

/** Reads an uploaded file again on the server, keeps it byte for byte, and chooses its year for the project. */
export function storeWeatherYear(
  projectId: string,
  fileName: string,
  bytes: Uint8Array,
  { repair }: { repair: boolean },
): Promise<Answer<{ weatherYear: WeatherHeader }> | FileRefusal> {
  return withProject(projectId, async (project) => {
    const input = parseInput(uploadName, { fileName });
    if (!input.ok) return input;
    const read = readWeather(bytes, { repair });
    if (!read.ok) {
      const { message, rows, repair: offered } = read;
      return { ok: false as const, code: 'invalid' as const, message, rows, repair: offered };
    }
    const sha256 = createHash('sha256').update(bytes).digest('hex');
    const file = { name: input.data.fileName, bytes, sha256 };
    const weatherYear = await database()
      .transaction()
      .execute(async (trx) => {
        const stored = await insertWeatherYear(trx, project.id, read.year, file);
        await setWeatherYear(trx, project.id, stored.id);
        return stored;
      });
    return { ok: true as const, weatherYear };
  });
}

/** Makes a shipped climate or one of its uploads the weather of the project. */
export function chooseWeatherYear(projectId: string, weatherYearId: string): Promise<{ ok: true } | Refusal> {
  return withProject(projectId, async (project) => {
    const choices = await listWeatherHeaders(database(), project.id);
    const chosen = choices.find((year) => year.id === weatherYearId);
    if (!chosen) return notFound('weather year');
    await setWeatherYear(database(), project.id, chosen.id);
    return { ok: true as const };
  });
}

/** Removes one of the project's uploads with its file. */
export function deleteWeatherYear(projectId: string, weatherYearId: string): Promise<{ ok: true } | Refusal> {
  return withProject(projectId, async (project) => {
    const id = z.uuid().safeParse(weatherYearId);
    const gone = id.success && (await deleteUploadedYear(database(), project.id, id.data));
    return gone ? { ok: true as const } : notFound('weather year');
  });
}

/** A whole weather year with its hours. */
export function readWeatherYear(weatherYearId: string): Promise<Answer<{ weatherYear: WeatherYear }>> {
  return asAccount(async (account) => {
    const id = z.uuid().safeParse(weatherYearId);
    const weatherYear = id.success ? await findWeatherYear(database(), id.data, account.id) : undefined;
    return weatherYear ? { ok: true as const, weatherYear } : notFound('weather year');
  });
}
