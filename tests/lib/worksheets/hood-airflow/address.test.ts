import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { SYSTEMS } from '@/lib/units/kinds';
import { addressOf, inUnits, isBlank, requestFrom, typedFrom, typedOf } from '@/lib/worksheets/hood-airflow/address';
import { hoodAirflow } from '@/lib/worksheets/hood-airflow/about';
import { questions } from './questions';

const typed = (query: string) => typedFrom(new URLSearchParams(query));
const request = (query: string) => {
  const read = requestFrom(typed(query));
  return read.ok ? read.value : read.errors;
};

describe('an address is read', () => {
  it('in SI when it names no units', () => {
    expect(request('hood=flanged-opening&velocity=0.5&distance=0.3&diameter=0.2')).toEqual({
      ...{ hood: 'flanged-opening', velocity: 0.5, distance: 0.3, diameter: 0.2 },
    });
  });

  it('in US units when it names them: fpm, inches, and feet round a tank', () => {
    const read = request('hood=canopy&velocity=200&distance=12&perimeter=16&units=us');
    const near = (value: number) => expect.closeTo(value, 12);
    expect(read).toEqual({ hood: 'canopy', velocity: near(1.016), distance: near(0.3048), perimeter: near(4.8768) });
  });

  it('with the work it names, in the order of the list and no other', () => {
    expect(request('hood=enclosure&work=hot&work=unidentified&work=cold')).toEqual({
      ...{ hood: 'enclosure', work: ['unidentified', 'hot'] },
    });
  });

  it('without what belongs to another hood, which the form keeps', () => {
    expect(request('hood=enclosure&velocity=0.5&openArea=0.06&diameter=wide')).toEqual({
      ...{ hood: 'enclosure', velocity: 0.5, openArea: 0.06 },
    });
    expect(typed('hood=enclosure&diameter=wide').diameter).toBe('wide');
  });

  it('with each field that holds no number named', () => {
    expect(request('hood=plain-opening&velocity=fast&distance=0,3&diameter=0.2')).toEqual([
      { path: 'velocity', message: 'Write a number, such as 0.3.' },
      { path: 'distance', message: 'Write a decimal point and no commas: 0.5, 1200.' },
    ]);
  });

  it('as blank when nothing was asked', () => {
    expect(isBlank(typed('units=us&utm=x'))).toBe(true);
    expect(isBlank(typed('velocity=0.5'))).toBe(false);
  });

  it('with texts cut before they fill a page', () =>
    expect(typed(`velocity=${'9'.repeat(5000)}`).velocity).toHaveLength(60));
});

describe('an address is written', () => {
  it('with the typed texts as they stand', () => {
    const query = 'hood=plain-slot&velocity=100+fpm&width=wide&work=hot&units=si';
    expect(addressOf(typed(query))).toBe(`/worksheets/hood-airflow?${query}`);
  });

  it('so that it reads back as the question it was made of, in either system', () => {
    fc.assert(
      fc.property(questions, fc.constantFrom(...SYSTEMS), (question, units) => {
        const address = addressOf(typedOf(question, units));
        const read = requestFrom(typed(address.split('?')[1]!));
        if (!read.ok) throw new Error(read.detail);
        for (const [field, value] of Object.entries(question))
          if (typeof value === 'number')
            expect(Math.abs(Number(read.value[field]) - value)).toBeLessThanOrEqual(value * 1e-4);
        expect(read.value.hood).toBe(question.hood);
      }),
    );
  });
});

describe('a change of units', () => {
  it('changes the typed numbers and not the question', () => {
    const si = typed('hood=flanged-opening&velocity=0.508&distance=0.3048&diameter=0.2&units=si');
    const us = inUnits(si, 'us');
    expect(us).toMatchObject({ velocity: '100', distance: '12', diameter: '7.874', units: 'us' });
    expect(inUnits(us, 'si')).toEqual(si);
  });

  it('leaves a text that holds no number', () => {
    expect(inUnits(typed('velocity=fast&units=si'), 'us').velocity).toBe('fast');
  });
});

it('makes of every address a question or a refusal', () => {
  const text = fc.oneof(fc.string(), fc.double().map(String));
  fc.assert(
    fc.property(
      fc.constantFrom('enclosure', 'canopy', 'plain-opening', 'tube'),
      text,
      text,
      (hood, velocity, other) => {
        const address = new URLSearchParams({ hood, velocity, distance: other, openArea: other, perimeter: other });
        const read = requestFrom(typedFrom(address));
        const answer = read.ok ? hoodAirflow.run(read.value) : read;
        expect(answer.ok || answer.status === 422).toBe(true);
      },
    ),
  );
});
