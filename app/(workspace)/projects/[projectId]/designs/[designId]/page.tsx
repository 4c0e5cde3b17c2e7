import type { Metadata } from 'next';
import Link from 'next/link';
import { notFound } from 'next/navigation';
import { ProjectStudy } from '@/components/study/project-study';
import { Refused } from '../../../../_components/refused';
import { projectOf } from '../../_components/project-of';
import { repeatRunAction, saveDesignAction } from '../../actions';

export const metadata: Metadata = { title: 'Study' };

interface StudyPageProps {
  params: Promise<{ projectId: string; designId: string }>;
  searchParams: Promise<Record<string, string | string[] | undefined>>;
}

/** The study of one design of a project. */
export default async function StudyPage({ params, searchParams }: StudyPageProps) {
  const [{ projectId, designId }, asked] = await Promise.all([params, searchParams]);
  const answer = await projectOf(projectId);
  if (!answer.ok) return <Refused refusal={answer} from={`/projects/${projectId}/designs/${designId}`} />;
  const { house, prices, designs, weatherYear } = answer;
  const design = designs.find(({ id }) => id === designId);
  if (!design) notFound();
  if (!weatherYear) return <NoWeather name={design.name} projectId={projectId} />;
  const { name, synthetic, latitudeDeg, longitudeDeg, timeZoneH } = weatherYear;
  return (
    <ProjectStudy
      key={designId}
      designId={designId}
      house={house}
      prices={prices}
      weather={{
        source: { kind: 'packed', url: `/api/weather/${weatherYear.id}` },
        name,
        synthetic,
        latitudeDeg,
        longitudeDeg,
        timeZoneH,
      }}
      stored={{ data: design.data, version: design.version }}
      lastRun={design.lastRun}
      params={Object.entries(asked).flatMap(([key, value]) =>
        typeof value === 'string' ? [[key, value] as const] : [],
      )}
      save={saveDesignAction.bind(null, projectId, designId)}
      repeat={repeatRunAction.bind(null, projectId, designId)}
    />
  );
}

/** A design without a weather year cannot be worked: what is missing, and where to choose it. */
function NoWeather({ name, projectId }: { name: string; projectId: string }) {
  return (
    <section className="max-w-[44rem] pt-7">
      <h1 className="mb-3">{name} has no weather year yet.</h1>
      <p>
        Without one no hour can be worked.{' '}
        <Link href={`/projects/${projectId}/weather`}>Choose or upload one</Link>; everything else of the
        project can be changed meanwhile.
      </p>
    </section>
  );
}
