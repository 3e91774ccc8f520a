import type { Refusal } from '@/lib/outcome';

const TYPES: Record<number, string> = {
  400: 'malformed',
  401: 'not-signed-in',
  403: 'not-allowed',
  404: 'not-found',
  405: 'method-not-allowed',
  409: 'changed-meanwhile',
  413: 'too-large',
  415: 'wrong-media-type',
  422: 'impossible',
  429: 'too-many',
  500: 'fault',
  503: 'not-ready',
};

/** The RFC 9457 body of a refusal. */
export function problemOf(refusal: Omit<Refusal, 'ok' | 'status'> & { status: number }) {
  const { status, title, detail, errors } = refusal;
  return {
    type: `urn:fumelore:problem:${TYPES[status] ?? 'fault'}`,
    title,
    status,
    detail,
    ...(errors ? { errors } : {}),
  };
}

/** A refusal as an `application/problem+json` response. */
export function problem(refusal: Omit<Refusal, 'ok' | 'status'> & { status: number }, headers?: HeadersInit): Response {
  return new Response(JSON.stringify(problemOf(refusal)), {
    status: refusal.status,
    headers: { 'content-type': 'application/problem+json; charset=utf-8', 'cache-control': 'no-store', ...headers },
  });
}
