import 'server-only';
import { deleteDesignRow, findDesign, insertDesign, updateDesign } from '@/db/queries/designs';
import { findProject, touchProject } from '@/db/queries/projects';
import type { Answer, Conflict, Refusal } from '@/lib/schemas/answer';
import { designSchema, type DesignRecord } from '@/lib/schemas/design';
import type { RunSummary } from '@/lib/schemas/run-summary';
import { notFound, withDesign, withProject } from './authorise';
import { conflict } from './conflict';
import { database } from './database';
import { yearOfDesign } from './design-run';
import { parseInput, parseVersioned } from './parse-input';

/** Adds a design to the project. */
export function createDesign(
  projectId: string,
  data: unknown,
): Promise<Answer<{ designId: string; version: number }>> {
  return withProject(projectId, async (project) => {
    const input = parseInput(designSchema, data);
    if (!input.ok) return input;
    const { id, version } = await database()
      .transaction()
      .execute(async (trx) => {
        await touchProject(trx, project.id);
        return insertDesign(trx, project.id, input.data);
      });
    return { ok: true as const, designId: id, version };
  });
}

export interface SavedDesign {
  version: number;
  /** the server's own year; null when it could not be worked, see `runRefusal` */
  run: RunSummary | null;
  runRefusal?: Refusal;
}

/**
 * Stores the design, unless somebody has stored it since `version` was read; then works its year on the server.
 * A year that cannot be worked leaves the saved design as it is.
 */
export function saveDesign(
  designId: string,
  data: unknown,
  version: number,
): Promise<Answer<SavedDesign> | Conflict<DesignRecord>> {
  return withDesign(designId, async (design, account) => {
    const input = parseVersioned(designSchema, data, version);
    if (!input.ok) return input;
    const saved = await database()
      .transaction()
      .execute(async (trx) => {
        await touchProject(trx, design.project_id);
        return updateDesign(trx, design.id, input.data, version);
      });
    if (!saved) return conflict('design', (await findDesign(database(), design.id, account.id)) ?? design);
    const project = await findProject(database(), design.project_id, account.id);
    const year = project
      ? await yearOfDesign(project, { id: design.id, data: input.data })
      : notFound('project');
    return year.ok
      ? { ok: true as const, version: saved.version, run: year.summary }
      : { ok: true as const, version: saved.version, run: null, runRefusal: year };
  });
}

/** Removes the design and its runs. */
export function deleteDesign(designId: string): Promise<{ ok: true } | Refusal> {
  return withDesign(designId, async (design) => {
    await deleteDesignRow(database(), design.id);
    return { ok: true as const };
  });
}
