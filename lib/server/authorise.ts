import 'server-only';
import { z } from 'zod';
import { findDesign } from '@/db/queries/designs';
import { findProject } from '@/db/queries/projects';
import type { DesignRow, ProjectRow } from '@/db/schema';
import type { Refusal } from '@/lib/schemas/answer';
import { currentAccount, type Account } from './current-account';
import { database } from './database';
import { unlessDatabaseFails } from './database-failure';

/** The same words for what is not there and for what belongs to somebody else. */
export function notFound(thing: string): Refusal {
  return { ok: false, code: 'not found', message: `This ${thing} is not there, or it is not yours.` };
}

/** Runs the work for the signed-in account; a database that fails on the way becomes a refusal. */
export function asAccount<A>(work: (account: Account) => Promise<A>): Promise<A | Refusal> {
  return unlessDatabaseFails(async () => {
    const answer = await currentAccount();
    return answer.ok ? work(answer.account) : answer;
  });
}

/** Runs the work on a project that the signed-in account may change. */
export function withProject<A>(
  projectId: string,
  work: (project: ProjectRow, account: Account) => Promise<A>,
): Promise<A | Refusal> {
  return asAccount(async (account) => {
    const id = z.uuid().safeParse(projectId);
    const project = id.success ? await findProject(database(), id.data, account.id) : undefined;
    return project ? work(project, account) : notFound('project');
  });
}

/** Runs the work on a design of a project that the signed-in account may change. */
export function withDesign<A>(
  designId: string,
  work: (design: DesignRow, account: Account) => Promise<A>,
): Promise<A | Refusal> {
  return asAccount(async (account) => {
    const id = z.uuid().safeParse(designId);
    const design = id.success ? await findDesign(database(), id.data, account.id) : undefined;
    return design ? work(design, account) : notFound('design');
  });
}
