import { describe, expect, it } from 'vitest';
import { MAX_BYTES, parseEntry } from '@/lib/entries/parse-entry';
import { materialText } from '../../factories';

const faultsOf = (text: string) => {
  const parsed = parseEntry(text);
  return parsed.ok ? [] : parsed.faults;
};
const firstFault = (text: string) => faultsOf(text)[0];
const front = (yaml: string) => `---\n${yaml}\n---\nText.\n`;

describe('reading an entry', () => {
  it('reads a whole one', () => {
    const parsed = parseEntry(materialText());
    expect(parsed).toMatchObject({
      ok: true,
      entry: { frontMatter: { kind: 'material', title: 'Testite', reviewEvery: 12 } },
    });
  });

  it('names the line and field of a fault', () => {
    const text = materialText().replace('family: plastic', 'family: cheese');
    expect(firstFault(text)).toMatchObject({ line: text.split('\n').indexOf('family: cheese') + 1, field: 'family' });
  });

  it('names a field that it does not know', () => {
    expect(firstFault(materialText().replace('family: plastic', 'family: plastic\ncolour: red'))!.message).toContain(
      'colour',
    );
  });

  it('refuses a CAS number whose check digit is wrong', () => {
    expect(firstFault(materialText().replace('family: plastic', 'family: plastic\ncas: 50-00-1'))).toMatchObject({
      field: 'cas',
    });
    expect(faultsOf(materialText().replace('family: plastic', 'family: plastic\ncas: 50-00-0'))).toEqual([]);
  });

  it('refuses a published value that names no source', () => {
    const text = materialText().replace(
      'family: plastic',
      'family: plastic\ndensity:\n  value: 1\n  unit: g/cm3\n  provenance: published',
    );
    expect(firstFault(text)).toMatchObject({ field: 'density.source' });
  });

  it('refuses a source that is cited and not listed, and one that is listed and not cited', () => {
    expect(firstFault(materialText({ body: 'Text[^one] and more[^two].' }))!.message).toContain(
      'two is cited but not listed',
    );
    expect(
      firstFault(materialText().replace('  - one\nreviewEvery', '  - one\n  - two\nreviewEvery'))!.message,
    ).toContain('two is listed but never cited');
  });

  it('reads every scalar as text, so that nothing turns into a number or a date by itself', () => {
    const text = materialText({ names: ['0127', '1:30', '2020-01-01', 'no', 'null'] });
    const parsed = parseEntry(text);
    expect(parsed.ok && parsed.entry.frontMatter.otherNames).toEqual(['0127', '1:30', '2020-01-01', 'no', 'null']);
  });
});

describe('what an attacker may send as an entry', () => {
  it.each([
    ['code in the front matter', '---js\n{ a: (globalThis.pwned = 1) }\n---\n'],
    ['code under its long name', '---javascript\n{ a: (globalThis.pwned = 1) }\n---\n'],
    ['code after a space', '--- js\n{ a: (globalThis.pwned = 1) }\n---\n'],
    ['a byte order mark first', `\ufeff${materialText()}`],
    ['carriage returns', materialText().replaceAll('\n', '\r\n')],
    ['an alias', front('a: &x [1]\nb: *x')],
    [
      'a chain of aliases',
      front(
        [
          'a0: &a0 ["lol"]',
          ...Array.from({ length: 7 }, (_, i) => `a${i + 1}: &a${i + 1} [${Array(9).fill(`*a${i}`).join(', ')}]`),
        ].join('\n'),
      ),
    ],
    ['a merge key', front('<<: {a: 1}')],
    ['brackets without end', front(`a: ${'['.repeat(20_000)}`)],
    ['braces without end', front(`a: ${'{a: '.repeat(20_000)}`)],
    ['a prototype', front('__proto__: {polluted: yes}')],
    ['a constructor', front('constructor: {prototype: {polluted: yes}}')],
    ['a function tag', front('a: !!js/function "function () {}"')],
    ['the same key twice', materialText().replace('family: plastic', 'family: plastic\nfamily: foam')],
    ['a broken list', front('title: [unclosed')],
    ['a tab for a space', front('a:\n\t- b')],
    ['a NUL', materialText({ title: 'a\u0000b' })],
    ['half a surrogate pair', materialText({ title: 'a\ud800b' })],
    ['text turned around', materialText({ title: 'a\u202eb' })],
    ['an invisible character', materialText({ title: 'a\u200bb' })],
    ['letters not in form C', materialText({ title: 'cafe\u0301' })],
    ['no front matter', 'Only text.\n'],
    ['front matter without an end', '---\nkind: material\n'],
    ['quotes a thousand deep', materialText({ body: `${'>'.repeat(1000)} text[^one]` })],
    ['a file above the limit', materialText({ body: `Text[^one].\n${'word\n'.repeat(MAX_BYTES / 4)}` })],
    ['a line above the limit', materialText({ body: `Text[^one]. ${'word '.repeat(500)}` })],
  ])('refuses %s with a line and a field', (_, text) => {
    const faults = faultsOf(text);
    expect(faults.length).toBeGreaterThan(0);
    for (const fault of faults)
      expect(fault).toMatchObject({
        line: expect.any(Number),
        field: expect.any(String),
        message: expect.stringMatching(/\S/),
      });
    expect('pwned' in globalThis).toBe(false);
    expect('polluted' in {}).toBe(false);
  });

  it('refuses the same broken text the second time as the first', () => {
    const broken = front('title: [unclosed');
    expect(parseEntry(broken)).toEqual(parseEntry(broken));
    expect(parseEntry(broken).ok).toBe(false);
  });
});
