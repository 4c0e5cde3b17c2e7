import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { LoopAndStoreForm } from '@/components/forms/loop-and-store-form';
import { Refused } from '../../../../../_components/refused';
import { ProjectFrieze } from '../../../_components/project-frieze';
import { projectOf } from '../../../_components/project-of';
import { saveDesignAction } from '../../../actions';

export const metadata: Metadata = { title: 'Loop and store' };

interface PageProps {
  params: Promise<{ projectId: string; designId: string }>;
}

export default async function LoopAndStorePage({ params }: PageProps) {
  const { projectId, designId } = await params;
  const answer = await projectOf(projectId);
  if (!answer.ok)
    return <Refused refusal={answer} from={`/projects/${projectId}/designs/${designId}/loop-and-store`} />;
  const design = answer.designs.find(({ id }) => id === designId);
  if (!design) notFound();
  return (
    <LoopAndStoreForm
      key={designId}
      designId={designId}
      stored={{ data: design.data, version: design.version }}
      currency={answer.prices.currency}
      save={saveDesignAction.bind(null, projectId, designId)}
      frieze={<ProjectFrieze designId={designId} />}
    />
  );
}
