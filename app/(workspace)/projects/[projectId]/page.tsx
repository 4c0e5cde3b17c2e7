import type { Metadata } from 'next';
import Link from 'next/link';
import { BigFigures } from '@/components/forms/big-figures';
import { houseLoss } from '@/components/forms/house-loss';
import { formatFixed, formatSignificant, formatTyped, withUnit } from '@/lib/units/display';
import { Refused } from '../../_components/refused';
import { AddDesign } from './_components/add-design';
import { DesignList } from './_components/design-list';
import { projectOf } from './_components/project-of';

export const metadata: Metadata = { title: 'Project' };

export default async function ProjectPage({ params }: { params: Promise<{ projectId: string }> }) {
  const { projectId } = await params;
  const answer = await projectOf(projectId);
  if (!answer.ok) return <Refused refusal={answer} from={`/projects/${projectId}`} />;
  const { project, house, designs, weatherYear } = answer;
  const loss = houseLoss(house);
  const base = `/projects/${projectId}`;
  return (
    <div className="space-y-10 pt-6">
      <section className="space-y-4">
        <h1>{project.name}</h1>
        <p className="max-w-[44rem]">
          {weatherYear ? (
            <>
              Worked through the year of {weatherYear.name}
              {weatherYear.synthetic ? ' (synthetic: invented weather, not for a real decision)' : ''}.{' '}
              <Link href={`${base}/weather`}>Choose another</Link>
            </>
          ) : (
            <>
              No weather year is chosen yet, so no year can be worked.{' '}
              <Link href={`${base}/weather`}>Choose one</Link>
            </>
          )}
        </p>
        <BigFigures
          figures={[
            {
              value: withUnit(formatTyped(house.floorAreaM2), 'm²'),
              words: `heated, at ${formatTyped(house.roomSetC)} °C`,
            },
            { value: withUnit(formatFixed(loss.wholeWPerK), 'W/K'), words: 'shell and air together' },
            {
              value: withUnit(formatSignificant(loss.designW / 1000, 2), 'kW'),
              words: `on the design day, at ${formatTyped(house.designOutdoorC)} °C`,
            },
            { value: withUnit(formatTyped(house.hotWater.litresPerDay), 'L'), words: 'of hot water a day' },
          ]}
        />
        <p className="flex flex-wrap gap-x-6 gap-y-1">
          <Link href={`${base}/house`}>Change the house</Link>
          <Link href={`${base}/prices`}>Change the prices</Link>
        </p>
      </section>
      <section className="space-y-3">
        <div className="flex flex-wrap items-baseline justify-between gap-x-6">
          <h2>Designs for it</h2>
          {designs.length > 1 && (
            <Link href={`${base}/compare`} className="framed filled">
              Compare them
            </Link>
          )}
        </div>
        <DesignList projectId={projectId} designs={designs} />
        <AddDesign projectId={projectId} designs={designs.map(({ id, name }) => ({ id, name }))} />
      </section>
    </div>
  );
}
