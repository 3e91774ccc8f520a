import { describe, expect, it } from 'vitest';
import { documentsOf } from '@/lib/search/documents';
import { plainText } from '@/lib/search/plain-text';
import { WORKSHEETS } from '@/lib/worksheets/list';
import { contentLibrary } from './content-library';

const library = contentLibrary();
const documents = documentsOf(library, WORKSHEETS);
const byId = new Map(documents.map((document) => [document.id, document]));

describe('what the search knows of a library', () => {
  it('holds one document a page', () => {
    expect(documents).toHaveLength(library.entries.length + WORKSHEETS.length);
    expect(byId.size).toBe(documents.length);
  });

  it('knows a material by its abbreviation, its CAS number and the strictest control of its pairs', () => {
    const acetal = byId.get('material:acetal');
    expect(acetal).toMatchObject({ url: '/materials/acetal', title: 'Acetal', control: 'enclosed exhaust' });
    expect(acetal?.names).toEqual(expect.arrayContaining(['POM', 'polyoxymethylene']));
    expect(acetal?.codes[0]).toBe('9002-81-7');
    expect(acetal?.related).toEqual(expect.arrayContaining(['Laser cutting', 'Formaldehyde']));
    expect(acetal?.corrections[0]?.truth).toContain('no fluorine');
  });

  it('keeps a material’s own formula as running text and a substance’s as a code', () => {
    expect(byId.get('material:acetal')?.codes).not.toContain('CH2O');
    expect(byId.get('material:acetal')?.text).toContain('CH2O');
    expect(byId.get('substance:formaldehyde')?.codes).toEqual(expect.arrayContaining(['50-00-0', 'CH2O']));
  });

  it('takes symptoms and effects for everyday words', () => {
    const { everyday } = byId.get('substance:formaldehyde')!;
    expect(everyday.join(' ')).toMatch(/eyes/i);
    expect(everyday.length).toBeGreaterThan(4);
  });

  it('knows a process by the machine that does it', () => {
    expect(byId.get('process:laser-cutting')?.names).toEqual(expect.arrayContaining(['laser', 'laser cutter']));
  });

  it('states no control for what has no pairs', () => {
    expect(byId.get('process:laser-cutting')).not.toHaveProperty('control');
    expect(byId.get('substance:formaldehyde')).not.toHaveProperty('control');
  });

  it('holds the worksheets it is given', () => {
    expect(byId.get('worksheet:hood-airflow')).toMatchObject({ kind: 'worksheet', url: '/worksheets/hood-airflow' });
  });

  it('holds neither citation marks nor front matter in running text', () => {
    for (const { text, id } of documents) {
      expect(text, id).not.toContain('[^');
      expect(text, id).not.toContain('reviewEvery');
    }
  });
});

describe('Markdown as running text', () => {
  it('keeps words and drops marks', () => {
    expect(
      plainText('## Control\n\nA *closed* [cabinet](/guides/enclosures), `lid` shut[^memory].\n\n[^memory]: x'),
    ).toBe('Control A closed cabinet, lid shut . x');
  });

  it('drops table rules', () => {
    expect(plainText('| gas | ppm |\n|-----|-----|\n| CO | 50 |')).toBe('gas ppm CO 50');
  });
});
