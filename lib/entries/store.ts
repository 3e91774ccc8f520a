import 'server-only';
import type { Connection } from '@/lib/database';
import type { Projection } from './project-entry';
import type { Source } from './schema';
import type { Kind } from './vocabulary';

export type StoredRevision = {
  kind: Kind;
  slug: string;
  number: number;
  title: string;
  markdown: string;
  hash: string;
  publishedAt: Date;
  reviewDue: string;
  reviewer: string | null;
  invented: boolean;
};

const REVISION = {
  kind: 'entries.kind',
  slug: 'entries.slug',
  number: 'revisions.number',
  title: 'revisions.title',
  markdown: 'revisions.markdown',
  hash: 'revisions.hash',
  publishedAt: 'revisions.published_at',
  reviewer: 'people.role',
  invented: 'people.invented',
};

const revisions = (connection: Connection) =>
  connection('revisions')
    .join('entries', 'entries.id', 'revisions.entry_id')
    .leftJoin('people', 'people.id', 'revisions.reviewer_id')
    .select(REVISION, connection.raw("date_format(revisions.review_due, '%Y-%m-%d') as reviewDue"));

const told = (row: StoredRevision): StoredRevision => ({ ...row, invented: Boolean(row.invented) });

/** Every published revision, in the order of kind and slug. */
export async function publishedRevisions(connection: Connection): Promise<StoredRevision[]> {
  const rows = await revisions(connection)
    .whereRaw('entries.published = revisions.number')
    .orderBy(['entries.kind', 'entries.slug']);
  return rows.map(told);
}

/** One revision by its number, published now or once. */
export async function revisionNumbered(connection: Connection, kind: Kind, slug: string, number: number) {
  const row = await revisions(connection).where({ kind, slug, 'revisions.number': number }).first();
  return row ? told(row) : undefined;
}

/** The identity of an entry and the hash that is published under it; the row stays locked until the transaction ends. */
export async function entryForUpdate(connection: Connection, kind: Kind, slug: string) {
  const entry = await connection('entries').where({ kind, slug }).forUpdate().first('id', 'published');
  if (!entry) return undefined;
  const last = await connection('revisions').where({ entry_id: entry.id }).max({ number: 'number' }).first();
  const published = await connection('revisions').where({ entry_id: entry.id, number: entry.published }).first('hash');
  return { id: entry.id as number, last: Number(last?.number ?? 0), hash: published?.hash as string | undefined };
}

export async function insertEntry(connection: Connection, kind: Kind, slug: string): Promise<number> {
  const [id] = await connection('entries').insert({ kind, slug });
  return id!;
}

type NewRevision = {
  number: number;
  title: string;
  markdown: string;
  hash: string;
  author_id: number;
  reviewer_id: number | null;
  published_at: Date;
  review_due: string;
};

/** Adds a revision and makes it the one that readers see. */
export async function publishRevision(connection: Connection, entryId: number, revision: NewRevision): Promise<void> {
  await connection('revisions').insert({ entry_id: entryId, ...revision });
  await connection('entries').where({ id: entryId }).update({ published: revision.number });
}

const TABLES = { names: 'entry_names', pairs: 'pairs', releases: 'releases', limits: 'limits' } as const;
const ORDER: Record<keyof Projection, string[]> = {
  names: ['position'],
  pairs: ['position'],
  releases: ['process', 'position'],
  limits: ['position'],
};

/** Replaces the projection of one entry. */
export async function writeProjection(connection: Connection, entryId: number, projection: Projection): Promise<void> {
  for (const key of Object.keys(TABLES) as (keyof Projection)[]) {
    await connection(TABLES[key]).where({ entry_id: entryId }).delete();
    const rows = projection[key].map((row) => ({ entry_id: entryId, ...row }));
    if (rows.length > 0) await connection(TABLES[key]).insert(rows);
  }
}

/** The whole projection as it stands in the tables, by table, with kind and slug in place of ids. */
export async function readProjection(connection: Connection): Promise<Record<keyof Projection, unknown[]>> {
  const all: Partial<Record<keyof Projection, unknown[]>> = {};
  for (const key of Object.keys(TABLES) as (keyof Projection)[]) {
    const rows = await connection(TABLES[key])
      .join('entries', 'entries.id', `${TABLES[key]}.entry_id`)
      .orderBy(['kind', 'slug', ...ORDER[key]])
      .select(`${TABLES[key]}.*`, 'kind', 'slug');
    all[key] = rows.map(({ entry_id: _, ...row }) => ({ ...row }));
  }
  return all as Record<keyof Projection, unknown[]>;
}

export const entryIds = (connection: Connection): Promise<{ id: number; kind: Kind; slug: string }[]> =>
  connection('entries').orderBy(['kind', 'slug']).select('id', 'kind', 'slug');

const sourceOf = ({ position: _, ...row }: Record<string, unknown>): Source =>
  Object.fromEntries(Object.entries(row).filter(([, value]) => value !== null)) as Source;

export async function allSources(connection: Connection): Promise<Source[]> {
  return (await connection('sources').orderBy('position')).map(sourceOf);
}

/** Replaces the list of sources whole. */
export async function writeSources(connection: Connection, sources: Source[]): Promise<void> {
  await connection('sources').delete();
  if (sources.length > 0)
    await connection('sources').insert(sources.map((source, position) => ({ ...source, position })));
}

export async function libraryVersion(connection: Connection): Promise<number> {
  const row = await connection('library_state').where({ id: 1 }).first('version');
  return Number(row?.version ?? 0);
}

/** Counts the library up by one; every running process sees it within its next look. */
export async function bumpLibrary(connection: Connection, at: Date): Promise<void> {
  await connection('library_state').insert({ id: 1, version: 0, changed_at: at }).onConflict('id').ignore();
  await connection('library_state')
    .where({ id: 1 })
    .update({ version: connection.raw('version + 1'), changed_at: at });
}

/** The id of the person in a role, made when there is none. */
export async function personInRole(connection: Connection, role: string, invented: boolean): Promise<number> {
  await connection('people').insert({ role, invented }).onConflict('role').ignore();
  return (await connection('people').where({ role }).first('id')).id as number;
}
