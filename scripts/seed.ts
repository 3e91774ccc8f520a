import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { seedDemo } from '@/db/seeds/demo';
import { connection } from '@/lib/database';
import { importLibrary } from '@/lib/entries/import-library';
import { FOLDERS } from '@/lib/entries/vocabulary';

/** Takes up the starter library from content/ and, in the demo, the invented workshop. Changes nothing the second time. */
const read = (folder: string) =>
  readdirSync(join('content', folder))
    .sort()
    .map((name) => ({ path: `${folder}/${name}`, text: readFileSync(join('content', folder, name), 'utf8') }));

const files = Object.values(FOLDERS).flatMap(read);
const sources = [{ path: 'sources.yaml', text: readFileSync('content/sources.yaml', 'utf8') }];
const demo = process.env.FUMELORE_DEMO !== 'off';
const by = { author: 'editor', reviewer: demo ? 'reviewer' : null, invented: demo, at: new Date() };

const outcome = await importLibrary(files, sources, by);
if (outcome.ok) {
  const count = (wanted: string) => outcome.value.filter((report) => report.outcome === wanted).length;
  console.log(`library: ${count('new')} new, ${count('changed')} changed, ${count('unchanged')} unchanged`);
  if (demo) await seedDemo(connection());
} else {
  console.log(outcome.detail);
  for (const { path, message } of outcome.errors ?? []) console.log(`${path}: ${message}`);
  process.exitCode = 1;
}
await connection().destroy();
