import { describe, expect, it } from 'vitest';
import { checkLibrary } from '@/lib/entries/check-library';
import { contentFiles, contentSources } from '../../content';
import { materialText, pairYaml, processText } from '../../factories';

const sources = [
  {
    path: 'sources.yaml',
    text: '- id: one\n  title: One\n  publisher: P\n  year: "2020"\n  type: study\n  seen: full text\n',
  },
];
const messages = (files: { path: string; text: string }[], from = sources) =>
  checkLibrary(files, from).faults.map(({ path, field, message }) => `${path} ${field}: ${message}`);

describe('the starter library', () => {
  const library = checkLibrary(contentFiles(), contentSources());

  it('has no fault', () => {
    expect(library.faults).toEqual([]);
  });

  it('is as large as promised', () => {
    expect(library.counts.materials).toBeGreaterThanOrEqual(32);
    expect(library.counts.processes).toBeGreaterThanOrEqual(12);
    expect(library.counts.substances).toBeGreaterThanOrEqual(40);
    expect(library.counts.guides).toBeGreaterThanOrEqual(8);
    expect(library.counts.pairs).toBeGreaterThanOrEqual(130);
  });

  it('gives every entry other names to be found by', () => {
    expect(
      library.entries.filter(({ frontMatter }) => frontMatter.otherNames.length < 3).map(({ slug }) => slug),
    ).toEqual([]);
  });

  it('types no hazard statement into an entry', () => {
    expect(
      library.entries.filter(({ text }) => /\bH[234]\d\d[A-Za-z]{0,2}\b/.test(text)).map(({ slug }) => slug),
    ).toEqual([]);
  });

  it('cites no source that nothing uses', () => {
    const used = new Set(library.entries.flatMap(({ frontMatter }) => frontMatter.sources));
    expect(library.sources.filter(({ id }) => !used.has(id)).map(({ id }) => id)).toEqual([]);
  });
});

describe('what only shows between files', () => {
  it('names a process, substance or source that is not there', () => {
    const found = messages([
      { path: 'materials/a.md', text: materialText({ pairs: pairYaml('nothing', 'prohibited') }) },
    ]);
    expect(found).toEqual(['materials/a.md pairs.process: there is no process nothing']);
    expect(messages([{ path: 'materials/a.md', text: materialText() }], [])).toEqual([
      'materials/a.md sources: there is no source one',
    ]);
  });

  it('names a file in the wrong folder or with a wrong name', () => {
    expect(messages([{ path: 'guides/a.md', text: materialText() }])).toEqual([
      'guides/a.md kind: a material belongs in materials',
    ]);
    expect(messages([{ path: 'processes/A_b.md', text: processText('cold') }])).toEqual([
      'processes/A_b.md file: the file name must be lower-case words joined by hyphens, ending in .md',
    ]);
  });

  it('names a process that stands twice in one material', () => {
    const twice = materialText({
      pairs: `${pairYaml('p', 'prohibited')}\n${pairYaml('p', 'local exhaust').split('\n').slice(1).join('\n')}`,
    });
    const files = [
      { path: 'materials/a.md', text: twice },
      { path: 'processes/p.md', text: processText('cold') },
    ];
    expect(messages(files)).toEqual(['materials/a.md pairs: p stands twice']);
  });
});
