import { createHash } from 'node:crypto';

/** Everything but script-src, the same for every page. */
export const FIXED = [
  "default-src 'none'",
  "connect-src 'self'",
  "img-src 'self' data:",
  "font-src 'self'",
  "style-src 'self'",
  "manifest-src 'self'",
  "form-action 'self'",
  "base-uri 'none'",
  "object-src 'none'",
  "frame-ancestors 'none'",
].join('; ');

const LOOPBACK = ['127.0.0.1', 'localhost'];
const SCRIPT_PATHS = ['/_next/static/', '/settle.js'];

/**
 * Where scripts may come from: the site's own build output and settle.js, by path, because a bare 'self' would also run an uploaded
 * file. A loopback address is allowed in both its spellings.
 * @param {string} [base] the site's address; BASE_URL unless told
 */
export function scriptSources(base = process.env.BASE_URL) {
  const site = new URL(base || `http://127.0.0.1:${process.env.PORT || 3000}`);
  const hosts = LOOPBACK.includes(site.hostname) ? LOOPBACK : [site.hostname];
  const port = site.port && `:${site.port}`;
  return hosts.flatMap((host) => SCRIPT_PATHS.map((path) => `${site.protocol}//${host}${port}${path}`)).join(' ');
}

/** @param {string} text */
const hashOf = (text) => createHash('sha256').update(text).digest('base64');

/** Next's own inline scripts: a fixed opening and one JSON value, so they are data, not code. */
const OPENINGS = [
  '(self.__next_f=self.__next_f||[]).push(',
  'self.__next_f.push(',
  '(globalThis["TURBOPACK"] || (globalThis["TURBOPACK"] = [])).push(',
];

/** @param {string} script */
function isData(script) {
  const opening = OPENINGS.find((text) => script.startsWith(text));
  const body = script.replace(/;$/, '');
  if (!opening || !body.endsWith(')')) return false;
  try {
    JSON.parse(body.slice(opening.length, -1));
    return true;
  } catch {
    return false;
  }
}

/** React 19.3.1's own scripts that put a late Suspense part in its place, less their closing call. */
const REACT = new Set(['7mu4H06fwDCjmnxxr/xNHyuQC6pLTHr4M2E4jXw5WZs=', 'ejxEGil7Q2jnFo9T1EMjhzsRoWDTVn8tRpUYd4XCJkY=']);
const CALL = /\$RC\("B:[0-9a-f]+","S:[0-9a-f]+"\)$/;

/** @param {string} script */
const isReact = (script) => {
  const rest = script.replace(CALL, '');
  return rest === '' || REACT.has(hashOf(rest));
};

/**
 * The hash of each inline script that is provably the framework's own, and of no other. A script that somebody planted is never hashed,
 * so it does not run; one missed here fails closed.
 * @param {string} html
 */
function hashesOf(html) {
  const hashes = new Set();
  for (const [, attributes = '', script] of html.matchAll(/<script\b([^>]*)>([\s\S]*?)<\/script>/g)) {
    if (!script || /\ssrc=/.test(attributes)) continue;
    if (isData(script) || isReact(script)) hashes.add(`'sha256-${hashOf(script)}'`);
  }
  return [...hashes];
}

/** The policy of one stored page. @param {string} html */
export const policyOf = (html) => [`${FIXED}; script-src ${scriptSources()}`, ...hashesOf(html)].join(' ');

/**
 * The policy of a page rendered for one request.
 * @param {string} nonce
 * @param {string} [missing] the stored page that is sent instead where nothing is at the address; it has no nonce
 */
export const noncePolicy = (nonce, missing = '') =>
  [`${FIXED}; script-src 'nonce-${nonce}' ${scriptSources()}`, ...hashesOf(missing)].join(' ');
