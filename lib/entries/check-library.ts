import { parse } from 'yaml';
import { parseEntry, type Fault, type ParsedEntry } from './parse-entry';
import { sourceSchema, type Source } from './schema';
import { FOLDERS, type Kind } from './vocabulary';

export type LibraryFile = { path: string; text: string };
export type FileFault = Fault & { path: string };
export type LibraryEntry = ParsedEntry & { kind: Kind; slug: string; path: string; text: string };
export type CheckedLibrary = {
  entries: LibraryEntry[];
  sources: Source[];
  faults: FileFault[];
  counts: Record<string, number>;
};

const slugOf = (path: string) => path.split('/').at(-1)!.replace(/\.md$/, '');
const folderOf = (path: string) => path.split('/').at(-2)!;

function readSources(files: LibraryFile[], faults: FileFault[]): Source[] {
  const sources: Source[] = [];
  for (const { path, text } of files) {
    let items: unknown;
    try {
      items = parse(text, { schema: 'failsafe', maxAliasCount: 0 });
    } catch (error) {
      faults.push({ path, line: 1, field: 'sources', message: (error as Error).message.split('\n')[0]! });
      continue;
    }
    for (const [index, item] of (Array.isArray(items) ? items : []).entries()) {
      const result = sourceSchema.safeParse(item);
      if (result.success) sources.push(result.data);
      else
        faults.push({
          path,
          line: 1,
          field: `${index}.${result.error.issues[0]!.path.join('.')}`,
          message: `${String((item as { id?: unknown })?.id)}: ${result.error.issues[0]!.message}`,
        });
    }
  }
  return sources;
}

/** Faults that only show between entries: names of things that do not exist. */
function linkFaults(entries: LibraryEntry[], sources: Source[]): FileFault[] {
  const known = new Set(entries.map((entry) => `${entry.kind}:${entry.slug}`));
  const ids = new Set(sources.map((source) => source.id));
  const faults: FileFault[] = [];
  for (const { path, frontMatter, text } of entries) {
    const lineOf = (needle: string) => Math.max(1, text.split('\n').findIndex((line) => line.includes(needle)) + 1);
    const need = (key: string, field: string) => {
      if (!known.has(key))
        faults.push({ path, line: lineOf(key.split(':')[1]!), field, message: `there is no ${key.replace(':', ' ')}` });
    };
    for (const id of frontMatter.sources)
      if (!ids.has(id)) faults.push({ path, line: lineOf(id), field: 'sources', message: `there is no source ${id}` });
    for (const link of frontMatter.related ?? []) if (!link.startsWith('worksheet:')) need(link, 'related');
    if (frontMatter.kind !== 'material') continue;
    const processes = new Set<string>();
    for (const pair of frontMatter.pairs) {
      need(`process:${pair.process}`, 'pairs.process');
      if (processes.has(pair.process))
        faults.push({ path, line: lineOf(pair.process), field: 'pairs', message: `${pair.process} stands twice` });
      processes.add(pair.process);
      for (const released of pair.releases) need(`substance:${released.substance}`, 'pairs.releases');
    }
    for (const other of [...(frontMatter.lookAlikes ?? []), ...(frontMatter.insteadOf ?? [])])
      need(`material:${other.material}`, 'lookAlikes or insteadOf');
    for (const emission of frontMatter.emissions ?? []) need(`process:${emission.process}`, 'emissions');
  }
  return faults;
}

/**
 * Checks a whole library at once: each file by the schema, each link against the others, each citation against the sources.
 * Pure: takes the files' texts, gives back entries, sources and every fault with path, line and field.
 */
export function checkLibrary(files: LibraryFile[], sourceFiles: LibraryFile[]): CheckedLibrary {
  const faults: FileFault[] = [];
  const entries: LibraryEntry[] = [];
  const sources = readSources(sourceFiles, faults);
  const seen = new Set<string>();
  for (const source of sources) {
    if (seen.has(source.id))
      faults.push({
        path: sourceFiles[0]?.path ?? 'sources',
        line: 1,
        field: 'id',
        message: `${source.id} stands twice`,
      });
    seen.add(source.id);
  }
  for (const { path, text } of files) {
    const parsed = parseEntry(text);
    if (!parsed.ok) {
      faults.push(...parsed.faults.map((fault) => ({ ...fault, path })));
      continue;
    }
    const { kind } = parsed.entry.frontMatter;
    if (FOLDERS[kind] !== folderOf(path))
      faults.push({ path, line: 2, field: 'kind', message: `a ${kind} belongs in ${FOLDERS[kind]}` });
    if (!/^[a-z0-9]+(-[a-z0-9]+)*\.md$/.test(path.split('/').at(-1)!))
      faults.push({
        path,
        line: 1,
        field: 'file',
        message: 'the file name must be lower-case words joined by hyphens, ending in .md',
      });
    entries.push({ ...parsed.entry, kind, slug: slugOf(path), path, text });
  }
  faults.push(...linkFaults(entries, sources));
  const count = (kind: Kind) => entries.filter((entry) => entry.kind === kind).length;
  const pairs = entries.reduce(
    (sum, { frontMatter }) => sum + (frontMatter.kind === 'material' ? frontMatter.pairs.length : 0),
    0,
  );
  return {
    entries,
    sources,
    faults,
    counts: {
      materials: count('material'),
      processes: count('process'),
      substances: count('substance'),
      guides: count('guide'),
      pairs,
      sources: sources.length,
      faults: faults.length,
    },
  };
}
