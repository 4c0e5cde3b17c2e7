'use server';

import { revalidatePath } from 'next/cache';
import { redirect } from 'next/navigation';
import { createProjectFromDemonstration, deleteProject } from '@/lib/server/projects';

export interface ProjectFormState {
  message?: string;
  /** what was typed, given back to the form */
  name?: string;
}

/** Lays out the demonstration under the typed name and opens it. */
export async function createProjectAction(
  _before: ProjectFormState,
  form: FormData,
): Promise<ProjectFormState> {
  const name = String(form.get('name') ?? '');
  const answer = await createProjectFromDemonstration(name);
  if (!answer.ok) return { message: answer.message, name };
  redirect(`/projects/${answer.projectId}`);
}

/** Removes a project for good. */
export async function deleteProjectAction(
  _before: ProjectFormState,
  form: FormData,
): Promise<ProjectFormState> {
  const answer = await deleteProject(String(form.get('projectId') ?? ''));
  revalidatePath('/projects');
  return answer.ok ? {} : { message: answer.message };
}
