import 'server-only';
import type { Refusal } from '@/lib/schemas/answer';

/** Socket errors and SQLSTATE codes that mean: the database cannot be reached now. */
const UNREACHABLE = /^(ECONN|EPIPE|ETIMEDOUT|ENOTFOUND|EHOSTUNREACH|EAI_|08|57P|53300|28|3D000)/;
const DROPPED =
  /connection terminated|timeout exceeded when trying to connect|connection error and is not queryable/i;

function means(error: Error): boolean {
  const code = (error as Error & { code?: unknown }).code;
  return (typeof code === 'string' && UNREACHABLE.test(code)) || DROPPED.test(error.message);
}

const REFUSAL: Refusal = {
  ok: false,
  code: 'database unavailable',
  message: 'The database does not answer. Nothing was changed or lost: try again in a moment.',
};

/** Runs the work; a database that cannot be reached becomes a value, every other fault is thrown on. */
export async function unlessDatabaseFails<A>(work: () => Promise<A>): Promise<A | Refusal> {
  try {
    return await work();
  } catch (error) {
    if (error instanceof Error && means(error)) return REFUSAL;
    throw error;
  }
}
