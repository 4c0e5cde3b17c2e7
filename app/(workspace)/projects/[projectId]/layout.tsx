import type { ReactNode } from 'react';
import { ProjectNav } from './_components/project-nav';
import { projectOf } from './_components/project-of';

interface ProjectLayoutProps {
  children: ReactNode;
  params: Promise<{ projectId: string }>;
}

/** The way around one project, above each of its pages. */
export default async function ProjectLayout({ children, params }: Readonly<ProjectLayoutProps>) {
  const { projectId } = await params;
  const answer = await projectOf(projectId);
  if (!answer.ok) return children;
  const { project, designs } = answer;
  return (
    <>
      <ProjectNav
        projectId={projectId}
        projectName={project.name}
        designs={designs.map(({ id, name }) => ({ id, name }))}
      />
      {children}
    </>
  );
}
