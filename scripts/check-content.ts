import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { checkLibrary } from '@/lib/entries/check-library';
import { FOLDERS } from '@/lib/entries/vocabulary';

/** Checks the files under content/ as an import would, and prints a line per fault. Arguments narrow what is printed. */
const read = (folder: string) =>
  readdirSync(folder)
    .filter((name) => !name.startsWith('.'))
    .sort()
    .map((name) => ({ path: join(folder, name), text: readFileSync(join(folder, name), 'utf8') }));

const files = Object.values(FOLDERS).flatMap((folder) => read(join('content', folder)));
const sources = [{ path: 'content/sources.yaml', text: readFileSync('content/sources.yaml', 'utf8') }];
const wanted = process.argv.slice(2);
const { faults, counts } = checkLibrary(files, sources);
const shown = faults.filter((fault) => wanted.length === 0 || wanted.some((part) => fault.path.includes(part)));
for (const { path, line, field, message } of shown) console.log(`${path}:${line}: ${field}: ${message}`);
console.log(JSON.stringify(counts));
process.exitCode = shown.length ? 1 : 0;
