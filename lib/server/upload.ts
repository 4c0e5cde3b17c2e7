import 'server-only';
import type { Answer } from '@/lib/schemas/answer';

/** Twenty times the size of a common weather file. */
const LARGEST_UPLOAD_BYTES = 32 * 1024 * 1024;

/** Whether the request comes from a page of this application: no other site may send a file in a visitor's name. */
function fromOwnPage(request: Request): boolean {
  const origin = request.headers.get('origin');
  return origin !== null && URL.canParse(origin) && new URL(origin).host === request.headers.get('host');
}

/** Reads the body while counting, so that a stream without an end is cut off. */
export async function readUpload(request: Request): Promise<Answer<{ bytes: Uint8Array }>> {
  if (!fromOwnPage(request)) {
    return {
      ok: false,
      code: 'invalid',
      message: 'Files are taken from the pages of this application only.',
    };
  }
  const chunks: Uint8Array[] = [];
  let size = 0;
  for await (const chunk of request.body ?? []) {
    size += chunk.byteLength;
    if (size > LARGEST_UPLOAD_BYTES) {
      return {
        ok: false,
        code: 'invalid',
        message: 'The file is larger than 32 MB: no hourly year is. Choose another one.',
      };
    }
    chunks.push(chunk);
  }
  return { ok: true, bytes: new Uint8Array(Buffer.concat(chunks)) };
}
