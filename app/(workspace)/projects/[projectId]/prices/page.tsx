import type { Metadata } from 'next';
import { PricesForm } from '@/components/forms/prices-form';
import { Refused } from '../../../_components/refused';
import { projectOf } from '../_components/project-of';
import { savePricesAction } from '../actions';

export const metadata: Metadata = { title: 'Prices' };

export default async function PricesPage({ params }: { params: Promise<{ projectId: string }> }) {
  const { projectId } = await params;
  const answer = await projectOf(projectId);
  if (!answer.ok) return <Refused refusal={answer} from={`/projects/${projectId}/prices`} />;
  return (
    <PricesForm
      projectId={projectId}
      stored={{ data: answer.prices, version: answer.pricesVersion }}
      save={savePricesAction.bind(null, projectId)}
    />
  );
}
