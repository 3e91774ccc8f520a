import { mkdirSync, mkdtempSync, renameSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { dirname, join } from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { sourceHash } from '@/scripts/lib/source-hash.mjs';

let root: string;
let before: string;

const write = (path: string, text: string) => {
  mkdirSync(join(root, dirname(path)), { recursive: true });
  writeFileSync(join(root, path), text);
};

beforeEach(() => {
  root = mkdtempSync(join(tmpdir(), 'sources-'));
  write('app/page.tsx', 'one');
  write('lib/tests/kept.ts', 'two');
  write('package-lock.json', '{}');
  before = sourceHash(root);
});
afterEach(() => rmSync(root, { recursive: true }));

describe('the hash of the sources', () => {
  it('stays when nothing changes', () => {
    expect(sourceHash(root)).toBe(before);
  });

  it.each(['app/page.tsx', 'lib/tests/kept.ts', 'package-lock.json', 'next.config.mjs', 'public/new.svg'])(
    'changes with %s',
    (path) => {
      write(path, 'other');
      expect(sourceHash(root)).not.toBe(before);
    },
  );

  it('changes when a file is renamed', () => {
    renameSync(join(root, 'app/page.tsx'), join(root, 'app/other.tsx'));
    expect(sourceHash(root)).not.toBe(before);
  });

  it('changes with a setting that a build takes in', () => {
    expect(sourceHash(root, ['https://fumelore.example.org'])).not.toBe(sourceHash(root, ['']));
  });

  it.each([
    'node_modules/a.js',
    '.next/a.js',
    '.next-test/a.js',
    '.data/a',
    '.env',
    'tests/a.ts',
    'next-env.d.ts',
    'README.md',
  ])('stays with %s, which no build is made from', (path) => {
    write(path, 'other');
    expect(sourceHash(root)).toBe(before);
  });
});
