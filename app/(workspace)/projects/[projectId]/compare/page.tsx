import type { Metadata } from 'next';
import Link from 'next/link';
import { comparedDesign } from '@/components/compare/compared-design';
import { Comparison } from '@/components/compare/comparison';
import { readRun } from '@/lib/server/runs';
import { Refused } from '../../../_components/refused';
import { projectOf } from '../_components/project-of';
import { ChooseDesigns } from './_components/choose-designs';

export const metadata: Metadata = { title: 'Compare' };

/** More years than this cannot be told apart on one page. */
const MOST = 4;

interface ComparePageProps {
  params: Promise<{ projectId: string }>;
  searchParams: Promise<{ design?: string | string[] }>;
}

export default async function ComparePage({ params, searchParams }: ComparePageProps) {
  const [{ projectId }, { design: asked = [] }] = await Promise.all([params, searchParams]);
  const answer = await projectOf(projectId);
  if (!answer.ok) return <Refused refusal={answer} from={`/projects/${projectId}/compare`} />;
  const { designs, house, prices, weatherYear } = answer;
  const wanted = [asked].flat().flatMap((id) => designs.find((design) => design.id === id) ?? []);
  const shown = (wanted.length > 1 ? wanted : designs).slice(0, MOST);
  const runs = await Promise.all(shown.map(async (design) => ({ design, run: await readRun(design.id) })));
  const compared = runs.flatMap(({ design, run }) =>
    run.ok ? [comparedDesign(design.id, design.data, house, prices, run.result)] : [],
  );
  const refused = runs.flatMap(({ design, run }) => (run.ok ? [] : [{ design, message: run.message }]));
  const base = `/projects/${projectId}`;
  const ids = compared.map(({ id }) => id);
  const measureBy = (id: string) =>
    `${base}/compare?${[id, ...ids.filter((other) => other !== id)].map((one) => `design=${one}`).join('&')}`;
  return (
    <>
      {refused.map(({ design, message }) => (
        <p key={design.id} role="alert" className="mt-4 border-l-2 border-hot pl-3">
          <strong className="text-hot-text">{design.name} is not shown.</strong> {message}
        </p>
      ))}
      {compared.length < 2 ? (
        <div className="max-w-[44rem] pt-7">
          <h1 className="mb-3">Two designs make a comparison.</h1>
          <p>
            Copy one on the <Link href={`${base}#add-design`}>project’s page</Link>, change it, and come back.
          </p>
        </div>
      ) : (
        <Comparison
          designs={compared}
          terms={prices}
          fuel={house.backup.fuel}
          latitudeDeg={weatherYear?.latitudeDeg ?? 0}
          links={compared.map(({ id, name }, place) => (
            <span key={id} data-screen-only>
              <Link href={`${base}/designs/${id}`}>
                Open<span className="sr-only"> {name}</span>
              </Link>
              {place > 0 && (
                <>
                  {' · '}
                  <Link href={measureBy(id)}>
                    measure by this one<span className="sr-only">: {name}</span>
                  </Link>
                </>
              )}
            </span>
          ))}
          rateLink={<Link href={`${base}/prices#hands`}>set an hourly rate</Link>}
        />
      )}
      {designs.length > 2 && (
        <ChooseDesigns designs={designs} chosen={shown.map(({ id }) => id)} most={MOST} />
      )}
    </>
  );
}
