'use server';

import { revalidatePath } from 'next/cache';
import { redirect } from 'next/navigation';
import { createDesign, deleteDesign, saveDesign } from '@/lib/server/designs';
import { readProject, saveHouse, savePrices } from '@/lib/server/projects';
import { repeatRun } from '@/lib/server/runs';

/** Stores the house of a project. */
export async function saveHouseAction(projectId: string, data: unknown, version: number) {
  const answer = await saveHouse(projectId, data, version);
  if (answer.ok) revalidatePath(`/projects/${projectId}`, 'layout');
  return answer;
}

/** Stores the prices of a project. */
export async function savePricesAction(projectId: string, data: unknown, version: number) {
  const answer = await savePrices(projectId, data, version);
  if (answer.ok) revalidatePath(`/projects/${projectId}`, 'layout');
  return answer;
}

/** Stores a design and has its year worked on the server. */
export async function saveDesignAction(projectId: string, designId: string, data: unknown, version: number) {
  const answer = await saveDesign(designId, data, version);
  if (answer.ok) revalidatePath(`/projects/${projectId}`, 'layout');
  return answer;
}

/** Has a stored design worked again by the present engine, beside its older year. */
export async function repeatRunAction(projectId: string, designId: string) {
  const answer = await repeatRun(designId);
  if (answer.ok) revalidatePath(`/projects/${projectId}`, 'layout');
  return answer;
}

export interface DesignActionState {
  message?: string;
}

/** Copies a design under another name and opens the copy. */
export async function copyDesignAction(
  _before: DesignActionState,
  form: FormData,
): Promise<DesignActionState> {
  const projectId = String(form.get('projectId') ?? '');
  const project = await readProject(projectId);
  if (!project.ok) return { message: project.message };
  const model = project.designs.find(({ id }) => id === form.get('from'));
  if (!model) return { message: 'Choose the design to begin with.' };
  const answer = await createDesign(projectId, { ...model.data, name: form.get('name') });
  if (!answer.ok) return { message: answer.message };
  revalidatePath(`/projects/${projectId}`, 'layout');
  redirect(`/projects/${projectId}/designs/${answer.designId}`);
}

/** Removes a design and its runs. */
export async function deleteDesignAction(
  _before: DesignActionState,
  form: FormData,
): Promise<DesignActionState> {
  const answer = await deleteDesign(String(form.get('designId') ?? ''));
  if (!answer.ok) return { message: answer.message };
  revalidatePath(`/projects/${String(form.get('projectId') ?? '')}`, 'layout');
  return {};
}
