import { createHash } from 'node:crypto';
import { expect, test } from '@playwright/test';
import { createConnection } from 'mysql2/promise';

/** Publishes one more revision of an entry with `from` replaced by `to`, as one transaction. */
async function publish(kind: string, slug: string, from: string, to: string) {
  const connection = await createConnection(process.env.SITE_DATABASE_URL!);
  await connection.beginTransaction();
  const [rows] = await connection.query(
    'select r.* from revisions r join entries e on e.id = r.entry_id where e.kind = ? and e.slug = ? and r.number = e.published',
    [kind, slug],
  );
  const before = (rows as Record<string, unknown>[])[0]!;
  const markdown = String(before.markdown).replace(from, to);
  const { id: _, ...rest } = before;
  const next = {
    ...rest,
    number: Number(before.number) + 1,
    markdown,
    hash: createHash('sha256').update(markdown).digest('hex'),
  };
  await connection.query('insert into revisions set ?', [next]);
  await connection.query('update entries set published = ? where id = ?', [next.number, before.entry_id]);
  await connection.query('update library_state set version = version + 1');
  await connection.commit();
  await connection.end();
}

test('a publish shows on the page, in the search and in the API, without a restart', async ({ page, request }) => {
  const mark = `Freshly reviewed ${Date.now()}.`;
  await page.goto('/materials/cork');
  const summary = await page.locator('article header p').nth(1).innerText();
  await publish('material', 'cork', summary, `${summary.slice(0, 200)} ${mark}`);
  await expect(async () => {
    expect((await (await request.get('/api/entries/material/cork')).json()).frontMatter.summary).toContain(mark);
    expect((await (await request.get('/api/search?q=cork%20sheet')).json()).hits[0].summary).toContain(mark);
    expect(await (await request.get('/materials/cork')).text()).toContain(mark);
  }).toPass({ timeout: 60_000 });
  await page.reload();
  await expect(page.getByText(mark).first()).toBeVisible();
  await publish('material', 'cork', `${summary.slice(0, 200)} ${mark}`, summary);
});
