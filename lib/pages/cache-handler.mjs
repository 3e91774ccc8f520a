import { BoundedMap } from './bounded-map.mjs';
import { policyOf } from './csp.mjs';
import { expiredAt, expireTags } from './expiry.mjs';
import { missingPage, readEntry, writeEntry } from './folder.mjs';

export { expireAll } from './expiry.mjs';

const HEADER = 'content-security-policy';
const TAGS_HEADER = 'x-next-cache-tags';
const MEBIBYTE = 1024 * 1024;
/** How far back an entry is dated whose beginning nobody noted: longer than a render takes. */
const GRACE_MS = 5000;

/** @param {any} entry */
const weigh = ({ value }) =>
  (value?.html?.length ?? 0) * 2 + (value?.rscData?.length ?? 0) + (value?.body?.length ?? 0);

const pages = new BoundedMap(2000, 96 * MEBIBYTE, weigh);
/** Pages that say nothing is there: never on disk, and few, because anybody can make up an address. */
const missing = new BoundedMap(200, 8 * MEBIBYTE, weigh);
/** When the render of an absent entry began: an entry is as old as its beginning, or a change made meanwhile would be lost. */
const begun = new BoundedMap(5000);

/** Every tag of an entry, as stored and as asked. @param {any} value @param {any} ctx @returns {string[]} */
const tagsOf = (value, ctx) =>
  [
    ...String(value?.headers?.[TAGS_HEADER] ?? '').split(','),
    ...(value?.tags ?? []),
    ...(ctx?.tags ?? []),
    ...(ctx?.softTags ?? []),
  ].filter(Boolean);

/** @param {any} entry @param {any} ctx */
function fresh(entry, ctx) {
  if (!entry) return false;
  return [...new Set(tagsOf(entry.value, ctx))].every((tag) => expiredAt(tag) < entry.lastModified);
}

/** Whether this is the page for addresses no route matches; Next sends it with 404 and its own Cache-Control. @param {any} value */
const isUnmatched = (value) => tagsOf(value, undefined).includes('_N_T_/_not-found/page');

/**
 * Puts the page's own policy among the headers Next stores and sends with it. Whoever else keeps a copy must ask again each time: Next's
 * own answer would let a cache in front show a withdrawn entry for a year.
 * @param {any} value
 */
function seal(value) {
  if (value?.kind !== 'APP_PAGE' || typeof value.html !== 'string' || !value.headers) return;
  value.headers[HEADER] = policyOf(value.html);
  if (!isUnmatched(value)) value.headers['cache-control'] = 'public, max-age=0, must-revalidate';
}

/** Whether a visitor's own policy header put a nonce into the page: shown to that visitor, kept for nobody. @param {any} value */
const isMarked = (value) => typeof value?.html === 'string' && /<script\b[^>]*\snonce=/.test(value.html);

/** @param {any} value */
const isMissing = (value) => !value || value.status === 404;

/**
 * A page that finds nothing leaves an empty document which only scripts can fill. Readers without them get the words too: the page that
 * the build made for addresses that lead nowhere. It is the same to the byte at every such address, so that proxy.ts knows its hashes.
 * @param {any} value
 */
function fill(value) {
  if (value?.kind !== 'APP_PAGE') return;
  if (value.status === 404 || isUnmatched(value)) value.html = missingPage() ?? value.html;
}

/** Pages and data kept in one folder, so that every process sees the same; each page carries its own policy. */
export default class SharedCache {
  /** @param {string} key @param {any} [ctx] */
  async get(key, ctx) {
    const held = pages.get(key) ?? missing.get(key);
    if (fresh(held, ctx)) return held;
    const stored = await readEntry(key);
    if (!fresh(stored, ctx)) {
      if (!begun.get(key)) begun.set(key, Date.now());
      return null;
    }
    // The address of the site may have changed since it was stored, and the policy names it.
    seal(stored.value);
    pages.set(key, stored);
    return stored;
  }

  /** @param {string} key @param {any} value @param {any} [ctx] */
  async set(key, value, ctx) {
    // In place: the reply to the visitor who caused the render uses this object.
    fill(value);
    seal(value);
    const lastModified = begun.get(key) ?? Date.now() - GRACE_MS;
    begun.delete(key);
    if (isMarked(value)) return;
    const entry = {
      value: value && ctx?.tags ? { ...value, tags: ctx.tags } : value,
      lastModified,
      cacheControl: ctx?.fetchCache ? undefined : ctx?.cacheControl,
    };
    pages.delete(key);
    missing.delete(key);
    if (isMissing(value)) return missing.set(key, entry);
    pages.set(key, entry);
    await writeEntry(key, entry);
  }

  /** @param {string | string[]} tags */
  async revalidateTag(tags) {
    await expireTags([tags].flat());
  }

  resetRequestCache() {}
}
