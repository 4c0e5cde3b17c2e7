import type { Metadata } from 'next';
import { BillsForm } from '@/components/bills/bills-form';
import { readBills, readModelHeat } from '@/lib/server/bills';
import { Refused } from '../../../_components/refused';
import { projectOf } from '../_components/project-of';
import { releaseLossAction, saveBillsAction, takeLossAction } from './actions';

export const metadata: Metadata = { title: 'Bills' };

export default async function BillsPage({ params }: { params: Promise<{ projectId: string }> }) {
  const { projectId } = await params;
  const from = `/projects/${projectId}/bills`;
  const [project, answer] = await Promise.all([projectOf(projectId), readBills(projectId)]);
  if (!project.ok) return <Refused refusal={project} from={from} />;
  if (!answer.ok) return <Refused refusal={answer} from={from} />;
  const { house, houseVersion, weatherYear } = project;
  const weatherName = weatherYear && `${weatherYear.name}${weatherYear.synthetic ? ' (synthetic)' : ''}`;
  return (
    <BillsForm
      projectId={projectId}
      stored={{ data: answer.bills, version: answer.version }}
      typicalDayC={answer.typicalDayC}
      modelHeat={readModelHeat(projectId)}
      house={house}
      houseVersion={houseVersion}
      weatherName={weatherName ?? undefined}
      save={saveBillsAction.bind(null, projectId)}
      scale={takeLossAction.bind(null, projectId)}
      release={releaseLossAction.bind(null, projectId)}
    />
  );
}
