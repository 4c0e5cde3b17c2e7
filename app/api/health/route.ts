/** Says that the server answers; knows nothing of the database, so that a start can be told from a fault. */
export function GET(): Response {
  return Response.json({ ok: true }, { headers: { 'cache-control': 'no-store' } });
}
