'use server';

import { revalidatePath } from 'next/cache';
import { releaseLoss, saveBills, takeLossFromBills } from '@/lib/server/bills';

/** Stores the bills of a project. */
export async function saveBillsAction(projectId: string, data: unknown, version: number) {
  const answer = await saveBills(projectId, data, version);
  if (answer.ok) revalidatePath(`/projects/${projectId}`, 'layout');
  return answer;
}

/** Scales the loss of the house to its bills. */
export async function takeLossAction(projectId: string, houseVersion: number) {
  const answer = await takeLossFromBills(projectId, houseVersion);
  revalidatePath(`/projects/${projectId}`, 'layout');
  return answer;
}

/** Takes the shell as entered again. */
export async function releaseLossAction(projectId: string, houseVersion: number) {
  const answer = await releaseLoss(projectId, houseVersion);
  revalidatePath(`/projects/${projectId}`, 'layout');
  return answer;
}
