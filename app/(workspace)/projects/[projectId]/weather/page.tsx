import type { Metadata } from 'next';
import { listWeatherYears } from '@/lib/server/weather-years';
import { Refused } from '../../../_components/refused';
import { projectOf } from '../_components/project-of';
import { WeatherChoices } from './_components/weather-choices';
import { WeatherUpload } from './_components/weather-upload';

export const metadata: Metadata = { title: 'Weather' };

interface WeatherPageProps {
  params: Promise<{ projectId: string }>;
}

export default async function WeatherPage({ params }: WeatherPageProps) {
  const { projectId } = await params;
  const from = `/projects/${projectId}/weather`;
  const [project, years] = await Promise.all([projectOf(projectId), listWeatherYears(projectId)]);
  if (!project.ok) return <Refused refusal={project} from={from} />;
  if (!years.ok) return <Refused refusal={years} from={from} />;
  return (
    <div className="pt-7">
      <h1 className="mb-2">Weather</h1>
      <p className="mb-7 max-w-[44rem]">
        {project.project.name} is worked hour by hour through one typical year.{' '}
        {project.weatherYear
          ? `Just now it is the year of ${project.weatherYear.name}.`
          : 'No year is chosen yet: choose one, or upload the file of your place.'}
      </p>
      <section className="mb-10">
        <h2 className="mb-3">Years to choose from</h2>
        <WeatherChoices projectId={projectId} years={years.weatherYears} chosenId={years.chosenId} />
      </section>
      <section>
        <h2 className="mb-3">The file of your place</h2>
        <WeatherUpload projectId={projectId} />
      </section>
    </div>
  );
}
