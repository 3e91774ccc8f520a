import 'server-only';
import { type Connection, inTransaction } from '@/lib/database';
import { parseEntry } from './parse-entry';
import { projectEntry } from './project-entry';
import { entryIds, publishedRevisions, writeProjection } from './store';

/** Writes every projected row anew from the published texts, in one transaction. @throws when a stored text no longer parses */
export function rebuildProjection(on?: Connection): Promise<number> {
  return inTransaction(async (transaction) => {
    const ids = new Map((await entryIds(transaction)).map(({ id, kind, slug }) => [`${kind}:${slug}`, id]));
    const revisions = await publishedRevisions(transaction);
    for (const { kind, slug, markdown } of revisions) {
      const parsed = parseEntry(markdown);
      if (!parsed.ok) throw new Error(`${kind} ${slug}: ${parsed.faults[0]!.message}`);
      await writeProjection(transaction, ids.get(`${kind}:${slug}`)!, projectEntry(parsed.entry.frontMatter));
    }
    return revisions.length;
  }, on);
}
