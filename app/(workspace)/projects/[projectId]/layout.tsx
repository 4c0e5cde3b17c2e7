import type { ReactNode } from 'react';
import { PageFrame } from '@/components/page-frame';
import { AccountNav } from '../../_components/account-nav';
import { DesignStrip } from './_components/design-strip';
import { ProjectNav } from './_components/project-nav';
import { projectOf } from './_components/project-of';

interface ProjectLayoutProps {
  children: ReactNode;
  params: Promise<{ projectId: string }>;
}

/** The frame of one project's pages: its name and the way around in the running head. */
export default async function ProjectLayout({ children, params }: Readonly<ProjectLayoutProps>) {
  const { projectId } = await params;
  const answer = await projectOf(projectId);
  if (!answer.ok) return <PageFrame nav={<AccountNav />}>{children}</PageFrame>;
  const designs = answer.designs.map(({ id, name }) => ({ id, name }));
  return (
    <PageFrame
      nav={
        <>
          <ProjectNav projectId={projectId} projectName={answer.project.name} designs={designs} />
          <AccountNav />
        </>
      }
    >
      <DesignStrip projectId={projectId} designs={designs} />
      {children}
    </PageFrame>
  );
}
