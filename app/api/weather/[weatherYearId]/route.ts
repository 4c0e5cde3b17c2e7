import { refusalResponse } from '@/lib/server/refusal-response';
import { readWeatherYear } from '@/lib/server/weather-years';
import { encodeWeatherYear } from '@/lib/weather/packed-weather';

interface Context {
  params: Promise<{ weatherYearId: string }>;
}

/** A weather year as packed bytes; asked again each time, but sent only when it has changed. */
export async function GET(request: Request, { params }: Context): Promise<Response> {
  const answer = await readWeatherYear((await params).weatherYearId);
  if (!answer.ok) return refusalResponse(answer);
  const etag = `"${answer.weatherYear.sha256}"`;
  const headers = { 'cache-control': 'private, no-cache', etag };
  if (request.headers.get('if-none-match') === etag) return new Response(null, { status: 304, headers });
  return new Response(encodeWeatherYear(answer.weatherYear), {
    headers: { ...headers, 'content-type': 'application/octet-stream' },
  });
}
