import 'server-only';
import { createHash } from 'node:crypto';
import { type Connection, inTransaction } from '@/lib/database';
import { type Outcome, done, refuse } from '@/lib/outcome';
import { checkLibrary, type LibraryEntry, type LibraryFile } from './check-library';
import { projectEntry } from './project-entry';
import type { Source } from './schema';
import * as store from './store';

export type ImportedBy = { author: string; reviewer: string | null; invented: boolean; at: Date };
export type FileReport = { path: string; outcome: 'new' | 'changed' | 'unchanged'; revision: number };

export const hashOf = (text: string) => createHash('sha256').update(text).digest('hex');

/** The date a review falls due: `months` after the day of publishing, by the calendar in UTC. */
export function reviewDueAfter(published: Date, months: number): string {
  const day = published.getUTCDate();
  const due = new Date(Date.UTC(published.getUTCFullYear(), published.getUTCMonth() + months, 1));
  const last = new Date(Date.UTC(due.getUTCFullYear(), due.getUTCMonth() + 1, 0)).getUTCDate();
  due.setUTCDate(Math.min(day, last));
  return due.toISOString().slice(0, 10);
}

async function importEntry(
  transaction: Connection,
  entry: LibraryEntry,
  ids: { author: number; reviewer: number | null },
  at: Date,
): Promise<FileReport> {
  const found = await store.entryForUpdate(transaction, entry.kind, entry.slug);
  const hash = hashOf(entry.text);
  if (found?.hash === hash) return { path: entry.path, outcome: 'unchanged', revision: found.last };
  const entryId = found?.id ?? (await store.insertEntry(transaction, entry.kind, entry.slug));
  const number = (found?.last ?? 0) + 1;
  await store.publishRevision(transaction, entryId, {
    ...{ number, title: entry.frontMatter.title, markdown: entry.text, hash },
    ...{ author_id: ids.author, reviewer_id: ids.reviewer, published_at: at },
    review_due: reviewDueAfter(at, entry.frontMatter.reviewEvery),
  });
  await store.writeProjection(transaction, entryId, projectEntry(entry.frontMatter));
  return { path: entry.path, outcome: found ? 'changed' : 'new', revision: number };
}

async function importSources(transaction: Connection, sources: Source[]): Promise<boolean> {
  const before = await store.allSources(transaction);
  const keyed = (list: Source[]) => JSON.stringify(list.map((source) => Object.entries(source).sort()));
  if (keyed(before) === keyed(sources)) return false;
  await store.writeSources(transaction, sources);
  return true;
}

/**
 * Takes up a whole library of Markdown files: all of it or, when any file has a fault, nothing. Files that stand as published are
 * left alone, so that a second import changes nothing.
 * @returns a report per file, or 422 with every fault as `path:line field`
 */
export async function importLibrary(
  files: LibraryFile[],
  sourceFiles: LibraryFile[],
  by: ImportedBy,
  on?: Connection,
): Promise<Outcome<FileReport[]>> {
  const { entries, sources, faults } = checkLibrary(files, sourceFiles);
  if (faults.length > 0) {
    const errors = faults.map((it) => ({ path: `${it.path}:${it.line} ${it.field}`, message: it.message }));
    return refuse(422, 'Nothing was imported', `${faults.length} faults stand in the files.`, errors);
  }
  const reports = await inTransaction(async (transaction) => {
    const author = await store.personInRole(transaction, by.author, by.invented);
    const reviewer = by.reviewer ? await store.personInRole(transaction, by.reviewer, by.invented) : null;
    let changed = await importSources(transaction, sources);
    const made: FileReport[] = [];
    for (const entry of entries) made.push(await importEntry(transaction, entry, { author, reviewer }, by.at));
    changed ||= made.some(({ outcome }) => outcome !== 'unchanged');
    if (changed) await store.bumpLibrary(transaction, by.at);
    return made;
  }, on);
  return done(reports);
}
