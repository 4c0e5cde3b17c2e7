'use server';

import { revalidatePath } from 'next/cache';
import { chooseWeatherYear, deleteWeatherYear } from '@/lib/server/weather-years';

export interface WeatherChoiceState {
  message?: string;
}

interface Choice {
  projectId: string;
  weatherYearId: string;
}

function choiceOf(form: FormData): Choice {
  return {
    projectId: String(form.get('projectId') ?? ''),
    weatherYearId: String(form.get('weatherYearId') ?? ''),
  };
}

/** Works the project with this year from now on. */
export async function chooseWeatherAction(
  _before: WeatherChoiceState,
  form: FormData,
): Promise<WeatherChoiceState> {
  const { projectId, weatherYearId } = choiceOf(form);
  const answer = await chooseWeatherYear(projectId, weatherYearId);
  revalidatePath(`/projects/${projectId}`, 'layout');
  return answer.ok ? {} : { message: answer.message };
}

/** Removes an uploaded year and its file. */
export async function deleteWeatherAction(
  _before: WeatherChoiceState,
  form: FormData,
): Promise<WeatherChoiceState> {
  const { projectId, weatherYearId } = choiceOf(form);
  const answer = await deleteWeatherYear(projectId, weatherYearId);
  revalidatePath(`/projects/${projectId}`, 'layout');
  return answer.ok ? {} : { message: answer.message };
}
