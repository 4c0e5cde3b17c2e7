import type { Metadata } from 'next';
import Link from 'next/link';
import { PageFrame } from '@/components/page-frame';
import { listProjects, type ProjectSummary } from '@/lib/server/projects';
import { AccountNav } from '../_components/account-nav';
import { Refused } from '../_components/refused';
import { CreateProjectForm } from './_components/create-project-form';
import { DeleteProject } from './_components/delete-project';

export const metadata: Metadata = { title: 'Projects' };

export default async function ProjectsPage() {
  const answer = await listProjects();
  if (!answer.ok) return <Refused refusal={answer} from="/projects" />;
  const { projects } = answer;
  return (
    <PageFrame nav={<AccountNav />}>
      <div className="pt-7">
        <h1 className="mb-6">Projects</h1>
        {projects.length > 0 ? <ProjectTable projects={projects} /> : <NoProjectYet />}
        <section className="mt-10 max-w-[44rem] pt-4 rule-ink">
          <h2 className="mb-3">{projects.length > 0 ? 'Another house' : 'Your first house'}</h2>
          <CreateProjectForm defaultName="My house" first={projects.length === 0} />
        </section>
      </div>
    </PageFrame>
  );
}

function NoProjectYet() {
  return (
    <div className="max-w-[44rem]">
      <p className="mb-3">
        A project is one house and its place: the shell, the weather, prices, and the designs that you compare
        for it. There is none yet.
      </p>
      <p>
        Begin with a working house and change it piece by piece into yours: first the weather of your place,
        then walls and windows, then the levers of each design.
      </p>
    </div>
  );
}

const DAY = new Intl.DateTimeFormat('en-GB', { dateStyle: 'medium', timeStyle: 'short', timeZone: 'UTC' });

function ProjectTable({ projects }: { projects: ProjectSummary[] }) {
  return (
    <ul className="rule-ink">
      {projects.map(({ id, name, place, designs, updatedAt }) => (
        <li
          key={id}
          className="grid gap-x-6 gap-y-1 py-3 rule-hair sm:grid-cols-[minmax(0,2fr)_minmax(0,2fr)_minmax(0,1fr)]"
        >
          <div>
            <Link href={`/projects/${id}`} className="font-display text-h2">
              {name}
            </Link>
            <p className="text-note text-muted">
              {designs} {designs === 1 ? 'design' : 'designs'}
            </p>
          </div>
          <p>
            {place ?? 'no weather chosen'}
            <span className="block text-note text-muted">changed {DAY.format(new Date(updatedAt))} UTC</span>
          </p>
          <div className="sm:text-right">
            <DeleteProject projectId={id} name={name} />
          </div>
        </li>
      ))}
    </ul>
  );
}
