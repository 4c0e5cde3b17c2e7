import 'server-only';
import type { Refusal, RefusalCode } from '@/lib/schemas/answer';

const STATUS: Record<RefusalCode, number> = {
  'signed out': 401,
  'not found': 404,
  conflict: 409,
  invalid: 422,
  engine: 500,
  busy: 503,
  'too slow': 503,
  'database unavailable': 503,
};

/** A refusal as the answer of a route handler. */
export function refusalResponse(refusal: Refusal): Response {
  return Response.json(refusal, {
    status: STATUS[refusal.code],
    headers: { 'cache-control': 'private, no-store' },
  });
}
