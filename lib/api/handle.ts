import { createHash, randomUUID } from 'node:crypto';
import { log } from '@/lib/log';
import { type Outcome, refuse } from '@/lib/outcome';
import { problem } from './problem';

/** The most a JSON body may weigh; a larger one is refused before it is read whole. */
export const MAX_JSON_BYTES = 256 * 1024;

type Handler<C> = (request: Request, context: C) => Promise<Response>;

/** Wraps a route handler: a request id, one log line, and one calm sentence for what nobody expected. */
export function handle<C = unknown>(name: string, handler: Handler<C>): Handler<C> {
  return async (request, context) => {
    const requestId = randomUUID();
    const begun = performance.now();
    let response: Response;
    try {
      response = await handler(request, context);
    } catch (error) {
      log.error({ requestId, route: name, error }, 'request failed');
      response = problem({
        status: 500,
        title: 'Something went wrong here',
        detail: 'The fault is ours and has been logged. Try again in a moment.',
      });
    }
    response.headers.set('x-request-id', requestId);
    log.info({ requestId, route: name, status: response.status, ms: Math.round(performance.now() - begun) }, 'request');
    return response;
  };
}

const sameTag = (given: string, tag: string) =>
  given === '*' || given.split(',').some((part) => part.trim().replace(/^W\//, '') === tag);

/** JSON with a strong ETag of its own bytes; answers 304 when the client holds them already. */
export function jsonWithEtag(request: Request, value: unknown, headers: HeadersInit = {}): Response {
  return textWithEtag(request, JSON.stringify(value), {
    'content-type': 'application/json; charset=utf-8',
    ...headers,
  });
}

/** Text of any type with a strong ETag; `vary` must be among `headers` where the type was negotiated. */
export function textWithEtag(request: Request, text: string, headers: HeadersInit): Response {
  const etag = `"${createHash('sha256').update(text).digest('base64url').slice(0, 32)}"`;
  const all = { 'cache-control': 'public, max-age=0, must-revalidate', etag, ...headers };
  const given = request.headers.get('if-none-match');
  if (given && sameTag(given, etag)) return new Response(null, { status: 304, headers: all });
  return new Response(text, { headers: all });
}

/** Reads a JSON object body: 415 for another type, 413 when too large, 400 when malformed. */
export async function readJson(request: Request): Promise<Outcome<unknown>> {
  const type = request.headers.get('content-type')?.split(';')[0]?.trim().toLowerCase();
  if (type !== 'application/json') return refuse(415, 'Wrong media type', 'Send application/json.');
  const tooLarge = refuse(413, 'Too large', `A body may weigh at most ${MAX_JSON_BYTES} bytes.`);
  if (Number(request.headers.get('content-length') ?? 0) > MAX_JSON_BYTES) return tooLarge;
  const reader = request.body?.getReader();
  const chunks: Uint8Array[] = [];
  for (let size = 0; reader;) {
    const { done, value } = await reader.read();
    if (done) break;
    size += value.byteLength;
    if (size > MAX_JSON_BYTES) return (await reader.cancel(), tooLarge);
    chunks.push(value);
  }
  try {
    const text = new TextDecoder('utf-8', { fatal: true }).decode(Buffer.concat(chunks));
    return { ok: true, value: JSON.parse(text) };
  } catch {
    return refuse(400, 'Malformed', 'The body is not well-formed JSON in UTF-8.');
  }
}
