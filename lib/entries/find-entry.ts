import 'server-only';
import { connection } from '@/lib/database';
import { type Outcome, done, refuse } from '@/lib/outcome';
import type { Library, PublishedEntry } from './library';
import { publishedFrom } from './load-library';
import { revisionNumbered } from './store';
import { KINDS, type Kind } from './vocabulary';

const isKind = (text: string): text is Kind => (KINDS as readonly string[]).includes(text);

/** A published entry, the one in force or an earlier revision of it; 404 when there is none. */
export async function findEntry(
  library: Library,
  kind: string,
  slug: string,
  revision?: number,
): Promise<Outcome<PublishedEntry>> {
  const current = isKind(kind) ? library.byKey.get(`${kind}:${slug}`) : undefined;
  if (!current) return refuse(404, 'No such entry', 'Nothing is published under that kind and name.');
  if (revision === undefined || revision === current.revision) return done(current);
  const earlier = await revisionNumbered(connection(), current.kind, slug, revision);
  return earlier
    ? done(publishedFrom(earlier))
    : refuse(404, 'No such revision', `There is no published revision ${revision}.`);
}
