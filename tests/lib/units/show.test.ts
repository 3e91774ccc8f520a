import fc from 'fast-check';
import { unit } from 'mathjs';
import { describe, expect, it } from 'vitest';
import { fromCfm, fromFeet, fromFpm, fromInches, fromInchesOfWater } from '@/lib/units/convert';
import { figure, show, showRange, told, toldBoth } from '@/lib/units/show';

describe('a figure', () => {
  it.each([
    [0.508, '0.508'],
    [0.5, '0.5'],
    [4480, '4480'],
    [1019.4, '1020'],
    [0, '0'],
    [-0, '0'],
    [-12.34, '−12.3'],
    [0.000123, '0.000123'],
    [0.0000123, '1.23 × 10⁻⁵'],
    [4526000, '4\u202f530\u202f000'],
    [12000000, '1.2 × 10⁷'],
    [999.6, '1000'],
    [Number.NaN, '—'],
    [Number.POSITIVE_INFINITY, '—'],
  ])('%d is written %s', (value, text) => expect(figure(value)).toBe(text));

  it('is within half of the third digit of the number', () => {
    fc.assert(
      fc.property(fc.double({ min: 1e-4, max: 9.9e6, noNaN: true }), (value) => {
        const read = Number(figure(value).replaceAll('\u202f', ''));
        expect(Math.abs(read - value)).toBeLessThanOrEqual(Math.abs(value) * 0.00501);
      }),
    );
  });
});

describe('a shown value', () => {
  it.each([
    ['velocity', 0.508, 'si', '0.508', 'm/s'],
    ['velocity', fromFpm(100), 'us', '100', 'fpm'],
    ['airflow', fromCfm(600), 'si', '1020', 'm³/h'],
    ['airflow', fromCfm(600), 'us', '600', 'cfm'],
    ['length', 0.2, 'si', '200', 'mm'],
    ['length', 1, 'si', '1', 'm'],
    ['length', fromInches(12), 'us', '12', 'in'],
    ['length', fromFeet(3), 'us', '3', 'ft'],
    ['area', 0.5, 'si', '0.5', 'm²'],
    ['volume', 40, 'us', '1410', 'ft³'],
    ['pressure', fromInchesOfWater(0.25), 'us', '0.25', 'in. w.g.'],
    ['pressure', fromInchesOfWater(1), 'si', '249', 'Pa'],
    ['temperature', 20, 'us', '68', '°F'],
    ['temperature', -40, 'us', '−40', '°F'],
    ['density', 1.41, 'si', '1.41', 'g/cm³'],
  ] as const)('%s %d in %s', (kind, value, system, text, symbol) => {
    expect(show(kind, value, system)).toEqual({ text, unit: symbol });
  });

  it('agrees with mathjs for a density in pounds per cubic foot', () => {
    const theirs = unit(1.41, 'g/cm^3').toNumber('lbm/cuft');
    expect(show('density', 1.41, 'us')).toEqual({ text: figure(theirs), unit: 'lb/ft³' });
  });

  it('leaves a concentration in the unit it carries', () => {
    expect(show('concentration', 0.75, 'us', 'ppm')).toEqual({ text: '0.75', unit: 'ppm' });
    expect(told('concentration', 2, 'si')).toBe('2');
  });
});

describe('a range', () => {
  it('stands in the unit of its larger end', () => {
    expect(showRange('velocity', 0.508, 1.016, 'us')).toEqual({ text: '100–200', unit: 'fpm' });
    expect(showRange('length', 0.5, 1.5, 'si')).toEqual({ text: '0.5–1.5', unit: 'm' });
    expect(showRange('concentration', 1, 2, 'us', 'mg/m3')).toEqual({ text: '1–2', unit: 'mg/m3' });
  });

  it('is one figure where both ends round to the same', () => {
    expect(showRange('airflow', 0.1, 0.10001, 'si')).toEqual({ text: '360', unit: 'm³/h' });
  });
});

it('tells a value in both systems', () => expect(toldBoth('velocity', 0.1016)).toBe('0.102\u00a0m/s (20\u00a0fpm)'));
