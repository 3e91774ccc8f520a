import { beforeEach, describe, expect, it } from 'vitest';
import type { Connection } from '@/lib/database';
import { checkLibrary, type LibraryFile } from '@/lib/entries/check-library';
import { exportLibrary } from '@/lib/entries/export-library';
import { importLibrary, reviewDueAfter } from '@/lib/entries/import-library';
import { loadLibrary } from '@/lib/entries/load-library';
import { rebuildProjection } from '@/lib/entries/rebuild-projection';
import { libraryVersion, readProjection } from '@/lib/entries/store';
import { contentFiles, contentSources } from '../../content';
import { freshDatabase } from '../../database';
import { materialText, pairYaml, processText } from '../../factories';

const ONE = '- id: one\n  title: One\n  publisher: P\n  year: "2020"\n  type: study\n  seen: full text\n';
const sources = [{ path: 'sources.yaml', text: ONE }];
const by = { author: 'editor', reviewer: 'reviewer', invented: true, at: new Date('2026-03-31T12:00:00Z') };
const small: LibraryFile[] = [
  { path: 'materials/testite.md', text: materialText({ pairs: pairYaml('testing', 'prohibited') }) },
  { path: 'processes/testing.md', text: processText('decomposes') },
];

let db: Connection;
beforeEach(async () => {
  db = await freshDatabase();
});

const counts = async () => ({
  entries: (await db('entries')).length,
  revisions: (await db('revisions')).length,
  pairs: (await db('pairs')).length,
  sources: (await db('sources')).length,
});

describe('importing files', () => {
  it('publishes each, reports on each, and counts the library up once', async () => {
    const outcome = await importLibrary(small, sources, by);
    expect(outcome).toEqual({
      ok: true,
      value: [
        { path: 'materials/testite.md', outcome: 'new', revision: 1 },
        { path: 'processes/testing.md', outcome: 'new', revision: 1 },
      ],
    });
    expect(await counts()).toEqual({ entries: 2, revisions: 2, pairs: 1, sources: 1 });
    expect(await libraryVersion(db)).toBe(1);
  });

  it('changes nothing the second time', async () => {
    await importLibrary(small, sources, by);
    const again = await importLibrary(small, sources, { ...by, at: new Date('2027-01-01T00:00:00Z') });
    expect(again.ok && again.value.map(({ outcome }) => outcome)).toEqual(['unchanged', 'unchanged']);
    expect(await counts()).toEqual({ entries: 2, revisions: 2, pairs: 1, sources: 1 });
    expect(await libraryVersion(db)).toBe(1);
  });

  it('adds a numbered revision for a changed file and keeps the earlier one', async () => {
    await importLibrary(small, sources, by);
    const changed = [
      { ...small[0]!, text: materialText({ title: 'Testite two', pairs: pairYaml('testing', 'local exhaust') }) },
      small[1]!,
    ];
    const outcome = await importLibrary(changed, sources, by);
    expect(outcome.ok && outcome.value[0]).toEqual({ path: 'materials/testite.md', outcome: 'changed', revision: 2 });
    expect(await db('revisions').where({ title: 'Testite' })).toHaveLength(1);
    expect(await db('pairs').pluck('control')).toEqual(['local exhaust']);
    expect((await loadLibrary(db)).byKey.get('material:testite')).toMatchObject({ revision: 2, title: 'Testite two' });
  });

  it('imports nothing at all when one file has a fault, and says where', async () => {
    const broken = [
      ...small,
      { path: 'materials/broken.md', text: materialText().replace('family: plastic', 'family: cheese') },
    ];
    const outcome = await importLibrary(broken, sources, by);
    expect(outcome).toMatchObject({ ok: false, status: 422 });
    expect(!outcome.ok && outcome.errors![0]!.path).toMatch(/^materials\/broken\.md:\d+ family$/);
    expect(await counts()).toEqual({ entries: 0, revisions: 0, pairs: 0, sources: 0 });
    expect(await libraryVersion(db)).toBe(0);
  });

  it('undoes everything when the database fails half-way', async () => {
    await db.schema.raw('create trigger stop_pairs before insert on pairs for each row signal sqlstate "45000"');
    await expect(importLibrary(small, sources, by)).rejects.toThrow();
    await db.schema.raw('drop trigger stop_pairs');
    expect(await counts()).toEqual({ entries: 0, revisions: 0, pairs: 0, sources: 0 });
    expect(await libraryVersion(db)).toBe(0);
  });

  it('dates the next review by the calendar, also from the end of a long month', () => {
    expect(reviewDueAfter(new Date('2026-01-31T23:00:00Z'), 1)).toBe('2026-02-28');
    expect(reviewDueAfter(new Date('2024-02-29T00:00:00Z'), 12)).toBe('2025-02-28');
    expect(reviewDueAfter(new Date('2026-12-01T00:00:00Z'), 24)).toBe('2028-12-01');
  });
});

describe('the starter library in the database', () => {
  it('comes back out byte for byte, every file', async () => {
    expect((await importLibrary(contentFiles(), contentSources(), by)).ok).toBe(true);
    const sorted = (files: LibraryFile[]) => [...files].sort((a, b) => (a.path < b.path ? -1 : 1));
    expect(sorted(await exportLibrary(db))).toEqual(sorted([...contentFiles(), ...contentSources()]));
  });

  it('has a projection that equals its own rebuild, row for row', async () => {
    await importLibrary(contentFiles(), contentSources(), by);
    const before = await readProjection(db);
    const pairs = checkLibrary(contentFiles(), contentSources()).counts.pairs!;
    expect(before.pairs).toHaveLength(pairs);
    for (const table of ['entry_names', 'pairs', 'releases', 'limits']) await db(table).delete();
    await rebuildProjection();
    expect(await readProjection(db)).toEqual(before);
  });

  it('loads at one version, with the reviewer marked as invented', async () => {
    await importLibrary(contentFiles(), contentSources(), by);
    const library = await loadLibrary(db);
    expect(library.version).toBe(1);
    expect(library.entries.length).toBe(contentFiles().length);
    expect(library.byKey.get('material:pvc')!.reviewedBy).toBe('reviewer (invented demo role)');
  });
});
