import { describe, expect, it } from 'vitest';
import { joined, indexWordsOf, wordsOf } from '@/lib/search/tokens';

const terms = (text: string) => wordsOf(text).map((word) => word.term);
const indexed = (text: string) => indexWordsOf(text).map((word) => word.term);

describe('words of a text', () => {
  it('keeps a CAS number as one word, whatever its dashes', () => {
    expect(terms('CAS 50-00-0.')).toContain('50-00-0');
    expect(terms('7664\u201339\u20113')).toEqual(['7664-39-3']);
  });

  it('reads subscripts as plain digits', () => {
    expect(terms('CO₂ and H₂SO₄')).toEqual(['co2', 'and', 'h2so4']);
  });

  it.each(['Cr(VI)', 'cr vi', 'Cr 6+', 'Cr-6', 'CR6', 'Cr (vi)'])('reads %s as the same oxidation state', (text) => {
    expect(terms(text)).toEqual(['cr6']);
  });

  it('keeps the metal’s name beside its oxidation state', () => {
    expect(terms('chromium(VI) compounds').slice(0, 2)).toEqual(['chromium', 'cr6']);
    expect(terms('iron(III) oxide').slice(0, 2)).toEqual(['iron', 'fe3']);
  });

  it('does not read the word I as a number', () => {
    expect(terms('can lead I melt')).not.toContain('pb1');
  });

  it('parts a number from its unit, and keeps decimals whole', () => {
    expect(terms('150mm duct at 0.75ppm')).toEqual(['150', 'mm', 'duct', 'at', '0.75', 'ppm']);
  });

  it('leaves names with digits alone', () => {
    expect(terms('2K 316L FR4 3D')).toEqual(['2k', '316', 'l', 'fr4', '3d']);
  });

  it('drops accents, full width and capitals', () => {
    expect(terms('Ｎｏｖｏｌａｃ Béton')).toEqual(['novolac', 'beton']);
  });

  it('indexes a hyphenated compound by its parts and whole', () => {
    expect(indexed('make-up air-flow').sort()).toEqual(['air', 'airflow', 'flow', 'make', 'makeup']);
  });

  it('leaves asking words out of the index', () => {
    expect(indexed('what can I do with the saw')).toEqual(['saw']);
  });

  it.each([
    ['laser cutting', 'lasercut'],
    ['Laser-cutting', 'laser cut'],
    ['air flow', 'Airflow'],
    ['make up air', 'makeup-air'],
    ['galvanised steel', 'galvanized-steels'],
  ])('compares %s and %s as one name', (one, other) => {
    expect(joined(wordsOf(one))).toBe(joined(wordsOf(other)));
  });
});

describe('one word in its forms', () => {
  it.each([
    ['cutting', 'cut'],
    ['boxes', 'box'],
    ['glasses', 'glass'],
    ['hoses', 'hose'],
    ['gases', 'gas'],
    ['batteries', 'battery'],
    ['cured', 'curing'],
    ['cures', 'cure'],
    ['engraved', 'engraving'],
    ['glued', 'gluing'],
    ['processes', 'process'],
    ['controlled', 'controls'],
    ['headaches', 'headache'],
    ['dried', 'drying'],
    ['phosgenes', 'phosgene'],
    ['plating', 'plate'],
    ['sanded', 'sands'],
  ])('compares %s and %s alike', (one, other) => {
    expect(terms(one)).toEqual(terms(other));
  });

  it.each([
    ['ABS', 'ab'],
    ['gas', 'ga'],
    ['brass', 'bras'],
    ['dust', 'dus'],
    ['string', 'str'],
    ['tape', 'tap'],
    ['pine', 'pin'],
    ['printer', 'print'],
  ])('keeps %s apart from %s', (one, other) => {
    expect(terms(one)).not.toEqual(terms(other));
  });
});

/** British and American forms as the style guides of both give them. */
describe('both spellings', () => {
  it.each([
    ['aluminium', 'aluminum'],
    ['vapour', 'vapor'],
    ['vapours', 'vapors'],
    ['odour', 'odor'],
    ['fibreglass', 'fiberglass'],
    ['galvanised', 'galvanized'],
    ['anodising', 'anodizing'],
    ['vaporise', 'vaporize'],
    ['sulphuric', 'sulfuric'],
    ['mould', 'mold'],
    ['moulding', 'molding'],
    ['draught', 'draft'],
    ['draughty', 'drafty'],
    ['neighbours', 'neighbors'],
    ['colour', 'color'],
    ['grey', 'gray'],
    ['centre', 'center'],
    ['litres', 'liters'],
    ['oedema', 'edema'],
    ['gauge', 'gage'],
    ['pyrolyse', 'pyrolyze'],
    ['sensitiser', 'sensitizer'],
    ['plasticised', 'plasticized'],
  ])('compares %s and %s alike', (british, american) => {
    expect(terms(british)).toEqual(terms(american));
  });
});
