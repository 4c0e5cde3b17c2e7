import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { CollectorForm } from '@/components/forms/collector-form';
import { Refused } from '../../../../../_components/refused';
import { ProjectFrieze } from '../../../_components/project-frieze';
import { projectOf } from '../../../_components/project-of';
import { saveDesignAction } from '../../../actions';

export const metadata: Metadata = { title: 'Collector' };

interface PageProps {
  params: Promise<{ projectId: string; designId: string }>;
}

export default async function CollectorPage({ params }: PageProps) {
  const { projectId, designId } = await params;
  const answer = await projectOf(projectId);
  if (!answer.ok)
    return <Refused refusal={answer} from={`/projects/${projectId}/designs/${designId}/collector`} />;
  const design = answer.designs.find(({ id }) => id === designId);
  if (!design) notFound();
  return (
    <CollectorForm
      key={designId}
      designId={designId}
      stored={{ data: design.data, version: design.version }}
      currency={answer.prices.currency}
      save={saveDesignAction.bind(null, projectId, designId)}
      frieze={<ProjectFrieze designId={designId} />}
    />
  );
}
