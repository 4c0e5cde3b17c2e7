import { refusalResponse } from '@/lib/server/refusal-response';
import { readUpload } from '@/lib/server/upload';
import { storeWeatherYear } from '@/lib/server/weather-years';

interface Context {
  params: Promise<{ projectId: string }>;
}

/** Takes a weather file as the body; its name and whether to repair it stand in the address. */
export async function POST(request: Request, { params }: Context): Promise<Response> {
  const upload = await readUpload(request);
  if (!upload.ok) return refusalResponse(upload);
  const query = new URL(request.url).searchParams;
  const fileName = query.get('fileName') ?? '';
  const repair = query.get('repair') === 'yes';
  const answer = await storeWeatherYear((await params).projectId, fileName, upload.bytes, { repair });
  return answer.ok ? Response.json(answer, { status: 201 }) : refusalResponse(answer);
}
