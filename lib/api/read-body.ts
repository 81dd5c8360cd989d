import 'server-only';
import { RequestRefusal } from './replies';

/** What a form or a device sends is small; more is a mistake or an attack. */
const largestBody = 64 * 1024;

/** The JSON that a request carries. Errors: 413, 415, and 422 for what is no JSON. */
export async function readJson(request: Request, most = largestBody): Promise<unknown> {
  if (!/^application\/json\b/i.test(request.headers.get('content-type') ?? ''))
    throw new RequestRefusal(415, 'invalid-input', 'Send JSON, with the content type application/json.');
  const text = (await readBytes(request, most, 'That is too much to send at once.')).toString('utf8');
  try {
    return JSON.parse(text) as unknown;
  } catch {
    throw new RequestRefusal(422, 'invalid-input', 'What was sent is no complete JSON. Send it again.');
  }
}

/** The file that a request carries. Errors: 413, and 415 for what is declared as no file. */
export async function readFile(request: Request, most: number): Promise<Uint8Array> {
  if (!/^(image\/[\w.+-]+|application\/octet-stream)\b/i.test(request.headers.get('content-type') ?? ''))
    throw new RequestRefusal(415, 'invalid-input', 'Send a picture, with its content type.');
  return readBytes(request, most, `A picture may have ${Math.floor(most / 1024 ** 2)} MB. Send a smaller one.`);
}

async function readBytes(request: Request, most: number, tooMuch: string): Promise<Buffer> {
  const reader: ReadableStreamDefaultReader<Uint8Array> | undefined = request.body?.getReader();
  const pieces: Uint8Array[] = [];
  let size = 0;
  // Counted while it comes in: what a header says about the size is only a claim.
  for (let piece = await reader?.read(); piece && !piece.done; piece = await reader?.read()) {
    size += piece.value.byteLength;
    if (size > most) {
      await reader?.cancel();
      throw new RequestRefusal(413, 'invalid-input', tooMuch);
    }
    pieces.push(piece.value);
  }
  return Buffer.concat(pieces);
}
