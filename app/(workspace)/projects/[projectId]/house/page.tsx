import type { Metadata } from 'next';
import { HouseForm } from '@/components/forms/house-form';
import { Refused } from '../../../_components/refused';
import { ProjectFrieze } from '../_components/project-frieze';
import { projectOf } from '../_components/project-of';
import { saveHouseAction } from '../actions';

export const metadata: Metadata = { title: 'House' };

export default async function HousePage({ params }: { params: Promise<{ projectId: string }> }) {
  const { projectId } = await params;
  const answer = await projectOf(projectId);
  if (!answer.ok) return <Refused refusal={answer} from={`/projects/${projectId}/house`} />;
  const { house, houseVersion, prices, designs } = answer;
  return (
    <HouseForm
      projectId={projectId}
      stored={{ data: house, version: houseVersion }}
      currency={prices.currency}
      save={saveHouseAction.bind(null, projectId)}
      frieze={<ProjectFrieze designId={designs[0]?.id} />}
    />
  );
}
