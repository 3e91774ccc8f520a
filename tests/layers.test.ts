import { readdirSync, readFileSync } from 'node:fs';
import { dirname, join, relative, resolve } from 'node:path';
import { describe, expect, it } from 'vitest';

/** The rules of the house, read off the files themselves. */
const ROOT = resolve(__dirname, '..');
const FOLDERS = ['app', 'components', 'lib', 'db'];
const CODE = /\.(ts|tsx|mjs)$/;

const walk = (folder: string): string[] =>
  readdirSync(join(ROOT, folder), { withFileTypes: true }).flatMap((item) => {
    const path = join(folder, item.name);
    if (item.isDirectory()) return walk(path);
    return CODE.test(item.name) ? [path] : [];
  });

type File = { path: string; text: string; imports: string[] };

function importsOf(path: string, text: string): string[] {
  const found = [...text.matchAll(/(?:from\s+|import\s+|import\()\s*'([^']+)'/g)].map((match) => match[1]!);
  return found.map((target) => {
    if (target.startsWith('@/')) return target.slice(2);
    return target.startsWith('.') ? relative(ROOT, resolve(ROOT, dirname(path), target)) : target;
  });
}

const files: File[] = [...FOLDERS.flatMap(walk), 'proxy.ts', 'instrumentation.ts'].map((path) => {
  const text = readFileSync(join(ROOT, path), 'utf8');
  return { path, text, imports: importsOf(path, text) };
});
const under = (...folders: string[]) =>
  files.filter(({ path }) => folders.some((folder) => path.startsWith(`${folder}/`)));
const breaches = (some: File[], isWrong: (target: string, file: File) => boolean) =>
  some.flatMap((file) =>
    file.imports.filter((target) => isWrong(target, file)).map((target) => `${file.path} → ${target}`),
  );
const isIn = (target: string, folder: string) => target === folder || target.startsWith(`${folder}/`);

describe('the layers', () => {
  it('reads a tree that is really there', () => {
    expect(files.length).toBeGreaterThan(150);
    expect(breaches(files, (target) => isIn(target, 'lib')).length).toBeGreaterThan(100);
  });

  it('lets components import no routes', () => {
    expect(breaches(under('components'), (target) => isIn(target, 'app'))).toEqual([]);
  });

  it('lets lib import neither routes nor components', () => {
    expect(breaches(under('lib'), (target) => isIn(target, 'app') || isIn(target, 'components'))).toEqual([]);
  });

  it('lets db import nothing above it', () => {
    expect(
      breaches(under('db'), (target) => ['app', 'components', 'lib'].some((folder) => isIn(target, folder))),
    ).toEqual([]);
  });

  it('opens db/ by one door', () => {
    const rest = files.filter(({ path }) => path !== 'lib/database.ts' && !path.startsWith('db/'));
    expect(breaches(rest, (target) => isIn(target, 'db') || target === 'knex' || target === 'mysql2')).toEqual([]);
  });

  it('keeps stores, sessions and the door on the server', () => {
    const server = under('lib').filter(({ path }) => /\/(database|store|session|storage)\.ts$/.test(`/${path}`));
    expect(server.length).toBeGreaterThan(1);
    expect(server.filter(({ text }) => !text.startsWith("import 'server-only';")).map(({ path }) => path)).toEqual([]);
  });

  it('keeps rules, schemas and arithmetic pure', () => {
    const pure = under('lib').filter(
      ({ path }) =>
        /^lib\/(units|air|chemistry|worksheets)\//.test(path) || /\/(schema|rules|present|ranking)\.ts$/.test(path),
    );
    expect(pure.length).toBeGreaterThan(20);
    const impure = (target: string) =>
      /^(next|react|knex|mysql2|node:fs|fs|server-only)(\/|$)/.test(target) || target === 'lib/database';
    expect(breaches(pure, impure)).toEqual([]);
    expect(pure.filter(({ text }) => /\bDate\.now\(\)|new Date\(\)/.test(text)).map(({ path }) => path)).toEqual([]);
  });

  it('runs the domains one way', () => {
    const above: Record<string, string[]> = {
      units: ['air', 'chemistry', 'worksheets', 'entries', 'check', 'search'],
      air: ['worksheets', 'check', 'search'],
      chemistry: ['worksheets', 'entries', 'check', 'search'],
      entries: ['check', 'search', 'workshops'],
      check: ['search'],
    };
    const wrong = Object.entries(above).flatMap(([domain, higher]) =>
      breaches(under(`lib/${domain}`), (target) => higher.some((each) => isIn(target, `lib/${each}`))),
    );
    expect(wrong).toEqual([]);
  });
});

describe('the files', () => {
  const lengths = files
    .map(({ path, text }) => ({ path, lines: text.split('\n').length - 1 }))
    .sort((a, b) => a.lines - b.lines);

  it('has none above 300 lines', () => {
    expect(lengths.filter(({ lines }) => lines > 300)).toEqual([]);
  });

  it('stays at a median of 60 lines, and 150 for nine in ten', () => {
    expect(lengths[Math.floor(lengths.length / 2)]!.lines).toBeLessThanOrEqual(60);
    expect(lengths[Math.floor(lengths.length * 0.9)]!.lines).toBeLessThanOrEqual(150);
  });

  it('keeps a page within 60 lines', () => {
    expect(lengths.filter(({ path, lines }) => /\/page\.tsx$/.test(`/${path}`) && lines > 60)).toEqual([]);
  });

  it('names files in kebab-case and has no barrels', () => {
    const names = files.map(({ path }) => path.split('/').at(-1)!);
    expect(names.filter((name) => !/^[a-z0-9.-]+$/.test(name) || /^index\./.test(name))).toEqual([]);
  });

  it('renders raw HTML in one place only', () => {
    expect(files.filter(({ text }) => text.includes('dangerouslySetInnerHTML=')).map(({ path }) => path)).toEqual([
      'components/entries/prose.tsx',
    ]);
  });

  it('never calls anything safe', () => {
    const verdict = /\b(is|are|be|as|perfectly|completely|now|quite) safe\b/i;
    const content = ['materials', 'processes', 'substances', 'guides'].flatMap((kind) =>
      readdirSync(join(ROOT, 'content', kind)).map((name) => ({
        path: `content/${kind}/${name}`,
        text: readFileSync(join(ROOT, 'content', kind, name), 'utf8'),
      })),
    );
    const said = [...under('app', 'components'), ...content]
      .filter(({ text }) => verdict.test(text))
      .map(({ path }) => path);
    expect(said).toEqual([]);
  });
});
