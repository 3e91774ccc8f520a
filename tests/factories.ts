import type { Library, PublishedEntry } from '@/lib/entries/library';
import { parseEntry } from '@/lib/entries/parse-entry';
import type { Source } from '@/lib/entries/schema';

export const source = (id: string): Source => ({
  ...{ id, title: `Title of ${id}`, publisher: 'A publisher', year: '2020' },
  ...{ type: 'study', seen: 'full text' },
});

type MaterialParts = { title?: string; concern?: string[]; pairs?: string; names?: string[]; body?: string };

/** A material as a file. `pairs` is YAML, two spaces in. */
export const materialText = ({
  title = 'Testite',
  concern = [],
  pairs = 'pairs: []',
  names = ['testite sheet'],
  body = 'Text[^one].',
}: MaterialParts = {}) =>
  [
    ...['---', 'kind: material', `title: ${title}`, 'summary: It is made up. Nothing is known of it.', 'otherNames:'],
    ...names.map((name) => `  - ${name}`),
    ...['family: plastic', 'composition:'],
    ...(concern.length > 0 ? ['  concern:', ...concern.map((element) => `    - ${element}`)] : ['  concern: []']),
    ...[
      '  source: one',
      '  provenance: published',
      pairs,
      'sources:',
      '  - one',
      'reviewEvery: 12',
      '---',
      '',
      body,
      '',
    ],
  ].join('\n');

export const pairYaml = (process: string, control: string) =>
  [
    ...[
      'pairs:',
      `  - process: ${process}`,
      `    control: ${control}`,
      '    reason: Because of a test.',
      '    releases: []',
    ],
    ...['    sources:', '      - one', '    provenance: published'],
  ].join('\n');

export const processText = (heat: string, title = 'Testing') =>
  [
    ...[
      '---',
      'kind: process',
      `title: ${title}`,
      'summary: It is made up. It does nothing.',
      'otherNames:',
      '  - a test',
    ],
    ...[`heat: ${heat}`, 'usual: a box', 'capture:', '  velocity:', '    min: 0.5', '    max: 1', '    unit: m/s'],
    ...['    provenance: common practice', '  hood: enclosure', '  openArea:', '    value: 0.1', '    unit: m2'],
    ...['    provenance: common practice', 'cautions:', '  - text: Mind it.', '    provenance: common practice'],
    ...['protection: []', 'waste: []', 'mishap:', '  - text: Leave.', '    provenance: common practice'],
    ...['sources:', '  - one', 'reviewEvery: 12', '---', '', 'Text[^one].', ''],
  ].join('\n');

/** A library of files by `kind:slug`. */
export function libraryOf(texts: Record<string, string>): Library {
  const entries = Object.entries(texts).map(([key, text]): PublishedEntry => {
    const parsed = parseEntry(text);
    if (!parsed.ok) throw new Error(`${key}: ${JSON.stringify(parsed.faults)}`);
    const [kind, slug] = key.split(':') as [PublishedEntry['kind'], string];
    return {
      ...{ kind, slug, title: parsed.entry.frontMatter.title, revision: 1, publishedAt: '2026-01-02T03:04:05.000Z' },
      ...{ reviewedBy: 'nobody', reviewDue: '2027-01-02', hash: key, text, ...parsed.entry },
    };
  });
  return {
    ...{ version: 1, entries, sources: new Map([['one', source('one')]]) },
    byKey: new Map(entries.map((entry) => [`${entry.kind}:${entry.slug}`, entry])),
  };
}
