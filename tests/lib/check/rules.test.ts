import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { answerCheck } from '@/lib/check/answer-check';
import { rungOf } from '@/lib/check/rules';
import { CONTROLS, HEATS } from '@/lib/entries/vocabulary';
import { libraryOf, materialText, pairYaml, processText } from '../../factories';

const library = libraryOf({
  'material:reviewed-loose': materialText({ title: 'Loose', pairs: pairYaml('burning', 'general ventilation') }),
  'material:reviewed-chlorine': materialText({
    title: 'Chlorine',
    concern: ['Cl'],
    pairs: pairYaml('burning', 'local exhaust'),
  }),
  'material:banned': materialText({ title: 'Banned', pairs: pairYaml('burning', 'prohibited') }),
  'material:boxed': materialText({ title: 'Boxed', pairs: pairYaml('burning', 'enclosed exhaust') }),
  'material:chlorine': materialText({ title: 'Chlorine unseen', concern: ['Cl'] }),
  'material:fluorine': materialText({ title: 'Fluorine', concern: ['F'] }),
  'material:bromine': materialText({ title: 'Bromine', concern: ['Br'] }),
  'material:nitrogen': materialText({ title: 'Nitrogen', concern: ['N'] }),
  'material:arsenic': materialText({ title: 'Arsenic', concern: ['As'] }),
  'material:lead': materialText({ title: 'Lead', concern: ['Pb'] }),
  'material:plain': materialText({ title: 'Plain' }),
  'process:burning': processText('decomposes', 'Burning'),
  'process:rubbing': processText('abrades', 'Rubbing'),
  'process:melting': processText('melts', 'Melting'),
  'process:wiping': processText('dissolves', 'Wiping'),
  'process:cutting-cold': processText('cold', 'Cold cutting'),
});
const check = (materials: string | string[], process: string) => answerCheck(library, [materials].flat(), process);

describe('one material and one process', () => {
  it('answers with the reviewed pair, as reviewed', () => {
    expect(check('reviewed-loose', 'burning')).toMatchObject({ control: 'general ventilation', basis: 'reviewed' });
  });

  it('lets a reviewed pair stand against what composition would say', () => {
    expect(check('reviewed-chlorine', 'burning')).toMatchObject({ control: 'local exhaust', basis: 'reviewed' });
  });

  it.each([
    ['chlorine', 'burning', 'prohibited'],
    ['fluorine', 'burning', 'prohibited'],
    ['bromine', 'burning', 'prohibited'],
    ['arsenic', 'rubbing', 'prohibited'],
    ['nitrogen', 'burning', 'enclosed exhaust'],
    ['nitrogen', 'melting', 'enclosed exhaust'],
    ['lead', 'burning', 'enclosed exhaust'],
    ['lead', 'rubbing', 'local exhaust'],
    ['plain', 'burning', 'enclosed exhaust'],
    ['plain', 'rubbing', 'local exhaust'],
  ])('infers %s with %s as %s, and says that nobody reviewed it', (material, process, control) => {
    const answer = check(material, process);
    expect(answer).toMatchObject({ control, basis: 'inferred' });
    expect(answer.reasons[0]!.text).toContain('nobody has reviewed');
  });

  it.each([
    ['plain', 'wiping'],
    ['plain', 'cutting-cold'],
  ])('does not guess at %s with %s', (material, process) => {
    expect(check(material, process)).toMatchObject({ control: 'unknown', basis: 'none', capture: null });
  });

  it.each([
    ['unobtainium', 'burning'],
    ['plain', 'alchemy'],
    ['unobtainium', 'alchemy'],
    ['__proto__', 'constructor'],
  ])('treats %s with %s as prohibited until identified', (material, process) => {
    const answer = check(material, process);
    expect(answer).toMatchObject({ control: 'unknown', basis: 'none', releases: [], capture: null });
    expect(answer.reasons[0]!.text).toMatch(/Treat it as prohibited until it is identified/);
  });

  it('gives no airflow for what may not be run', () => {
    expect(check('banned', 'burning').capture).toBeNull();
    expect(check('boxed', 'burning').capture).toMatchObject({ hood: 'enclosure', airflow: { min: 0.05, max: 0.1 } });
  });
});

describe('several materials', () => {
  it('lets the strictest control win and keeps every reason, the strictest first', () => {
    const answer = check(['reviewed-loose', 'boxed', 'reviewed-chlorine'], 'burning');
    expect(answer).toMatchObject({ control: 'enclosed exhaust', basis: 'reviewed' });
    expect(answer.reasons.map(({ text }) => text.split(':')[0])).toEqual(['Boxed', 'Chlorine', 'Loose']);
  });

  it('is unknown when one of them is, however well the others are known', () => {
    expect(check(['reviewed-loose', 'unobtainium'], 'burning')).toMatchObject({ control: 'unknown', basis: 'none' });
  });

  it('says a known ban as a ban beside something unknown', () => {
    expect(check(['unobtainium', 'banned'], 'burning')).toMatchObject({ control: 'prohibited', basis: 'reviewed' });
  });

  it('is reviewed only when every pair is', () => {
    expect(check(['boxed', 'plain'], 'burning')).toMatchObject({ control: 'enclosed exhaust', basis: 'inferred' });
  });
});

describe('whatever is asked', () => {
  const slugs = [...library.byKey.keys()].filter((key) => key.startsWith('material:')).map((key) => key.slice(9));
  const processes = ['burning', 'rubbing', 'melting', 'wiping', 'cutting-cold', 'nothing'];

  it('never infers anything looser than local exhaust, and never reviews what has no pair', () => {
    fc.assert(
      fc.property(
        fc.subarray([...slugs, 'unheard-of'], { minLength: 1 }),
        fc.constantFrom(...processes),
        (materials, process) => {
          const answer = check(materials, process);
          if (answer.basis === 'inferred')
            expect(rungOf(answer.control)).toBeGreaterThanOrEqual(rungOf('local exhaust'));
          if (answer.basis === 'none' && answer.control !== 'prohibited') expect(answer.control).toBe('unknown');
          expect(answer.reasons.length).toBe(materials.length);
          expect(answer.cautions.length).toBeGreaterThanOrEqual(3);
        },
      ),
    );
  });

  it('never comes out looser for one more material', () => {
    fc.assert(
      fc.property(
        fc.subarray(slugs, { minLength: 1 }),
        fc.constantFrom(...slugs),
        fc.constantFrom(...processes),
        (materials, more, process) => {
          expect(rungOf(check([...materials, more], process).control)).toBeGreaterThanOrEqual(
            rungOf(check(materials, process).control),
          );
        },
      ),
    );
  });

  it('knows every control and every kind of heat', () => {
    expect(CONTROLS.map(rungOf).every((rung) => rung >= 0)).toBe(true);
    expect(HEATS.length).toBe(6);
  });
});
