import 'server-only';
import { findProject } from '@/db/queries/projects';
import { findLastRun } from '@/db/queries/runs';
import type { Answer } from '@/lib/schemas/answer';
import type { RunSummary } from '@/lib/schemas/run-summary';
import type { YearResult } from '@/lib/simulation/results';
import { yearDifferences } from '@/lib/study/year-difference';
import type { YearDifference } from '@/lib/study/year-difference';
import { notFound, withDesign } from './authorise';
import { database } from './database';
import { summaryOfRun, yearOfDesign } from './design-run';

/** The server's own year of the design as it is stored, with its hours. */
export function readRun(designId: string): Promise<Answer<{ summary: RunSummary; result: YearResult }>> {
  return withDesign(designId, async (design, account) => {
    const project = await findProject(database(), design.project_id, account.id);
    return project ? yearOfDesign(project, design) : notFound('project');
  });
}

/** An older year beside the one that the present engine works for the stored inputs. */
export interface RepeatedRun {
  /** null when no year was stored before */
  before: RunSummary | null;
  after: RunSummary;
  /** whether house, design and weather are still those of the older year: then the engine alone differs */
  sameInputs: boolean;
  differences: YearDifference[];
}

/** Works the stored design again and compares with the newest year that stood there before. */
export function repeatRun(designId: string): Promise<Answer<RepeatedRun>> {
  return withDesign(designId, async (design, account) => {
    const project = await findProject(database(), design.project_id, account.id);
    if (!project) return notFound('project');
    const last = await findLastRun(database(), design.id);
    const year = await yearOfDesign(project, design);
    if (!year.ok) return year;
    const before = last ? summaryOfRun(last, year.summary.inputsHash) : null;
    return {
      ok: true as const,
      before,
      after: year.summary,
      sameInputs: before?.inputsHash === year.summary.inputsHash,
      differences: before ? yearDifferences(before.year, year.result.year) : [],
    };
  });
}
