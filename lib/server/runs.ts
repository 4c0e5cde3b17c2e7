import 'server-only';
import { findProject } from '@/db/queries/projects';
import type { Answer } from '@/lib/schemas/answer';
import type { RunSummary } from '@/lib/schemas/run-summary';
import type { YearResult } from '@/lib/simulation/results';
import { notFound, withDesign } from './authorise';
import { database } from './database';
import { yearOfDesign } from './design-run';

/** The server's own year of the design as it is stored, with its hours. */
export function readRun(designId: string): Promise<Answer<{ summary: RunSummary; result: YearResult }>> {
  return withDesign(designId, async (design, account) => {
    const project = await findProject(database(), design.project_id, account.id);
    return project ? yearOfDesign(project, design) : notFound('project');
  });
}
