import 'server-only';
import type { Connection } from '@/lib/database';
import type { Library, PublishedEntry } from './library';
import { parseEntry } from './parse-entry';
import { allSources, libraryVersion, publishedRevisions, type StoredRevision } from './store';

const breathe = () => new Promise<void>((resolve) => setImmediate(resolve));

const reviewerOf = ({ reviewer, invented }: StoredRevision) => {
  if (!reviewer) return 'not independently reviewed';
  return invented ? `${reviewer} (invented demo role)` : reviewer;
};

function publishedOf(revision: StoredRevision): PublishedEntry {
  const parsed = parseEntry(revision.markdown);
  if (!parsed.ok) throw new Error(`${revision.kind} ${revision.slug}: ${parsed.faults[0]!.message}`);
  return {
    ...{ kind: revision.kind, slug: revision.slug, title: revision.title, revision: revision.number },
    ...{
      publishedAt: revision.publishedAt.toISOString(),
      reviewedBy: reviewerOf(revision),
      reviewDue: revision.reviewDue,
    },
    ...{ hash: revision.hash, text: revision.markdown, ...parsed.entry },
  };
}

/**
 * Reads all that is published, at one version: inside one snapshot, so that a publish meanwhile is seen whole or not at all. Entries
 * that `before` holds under the same hash and revision are taken from there. Lets other work through between entries.
 */
export async function loadLibrary(connection: Connection, before?: Library): Promise<Library> {
  const [version, revisions, sources] = await connection.transaction(
    async (snapshot) =>
      [await libraryVersion(snapshot), await publishedRevisions(snapshot), await allSources(snapshot)] as const,
    { readOnly: true },
  );
  const entries: PublishedEntry[] = [];
  for (const revision of revisions) {
    const held = before?.byKey.get(`${revision.kind}:${revision.slug}`);
    const same =
      held?.hash === revision.hash && held.revision === revision.number && held.reviewDue === revision.reviewDue;
    if (!same) await breathe();
    entries.push(same ? held : publishedOf(revision));
  }
  return {
    ...{ version, entries },
    byKey: new Map(entries.map((entry) => [`${entry.kind}:${entry.slug}`, entry])),
    sources: new Map(sources.map((source) => [source.id, source])),
  };
}

/** One earlier published revision, as `loadLibrary` would have shown it. */
export const publishedFrom = publishedOf;
