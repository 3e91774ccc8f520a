import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { SYSTEMS, TYPED_UNITS, UNITS, unitOf, type Kind } from '@/lib/units/kinds';
import { MAX_TYPED, parseQuantity, typedText } from '@/lib/units/parse-quantity';

describe('a typed quantity is read', () => {
  it.each([
    ['length', '0.3', 'si', 0.3],
    ['length', ' .3 ', 'si', 0.3],
    ['length', '300 mm', 'us', 0.3],
    ['length', '12', 'us', 0.3048],
    ['length', '12"', 'si', 0.3048],
    ['length', '1 ft', 'si', 0.3048],
    ['velocity', '100', 'us', 0.508],
    ['velocity', '100 FPM', 'si', 0.508],
    ['airflow', '3600', 'si', 1],
    ['airflow', '1 m3/s', 'us', 1],
    ['airflow', '1\u202f200 m³/h', 'si', 1 / 3],
    ['area', '4 sq ft', 'si', 0.37161216],
    ['temperature', '68', 'us', 20],
    ['temperature', '−40 °F', 'si', -40],
    ['density', '1410 kg/m3', 'si', 1.41],
    ['pressure', '1 in wg', 'si', 249.08891],
    ['length', '1e-2', 'si', 0.01],
  ] as const)('%s %s in %s', (kind, text, system, value) => {
    const read = parseQuantity(kind, text, system);
    expect(read.ok).toBe(true);
    if (read.ok) expect(read.value).toBeCloseTo(value, 12);
  });

  it('in another unit than the usual when the field asks for one', () => {
    expect(parseQuantity('length', '16', 'us', 'ft')).toEqual({ ok: true, value: 16 * 0.3048 });
  });
});

describe('a typed quantity is refused', () => {
  it.each([
    ['nothing', '', 'Write a number.'],
    ['a word', 'wide', 'Write a number, such as 0.3.'],
    ['a decimal comma', '0,5', 'Write a decimal point and no commas: 0.5, 1200.'],
    ['a unit of another kind', '3 kg', '“kg” is not understood here. Write m, cm, mm, in, ft.'],
    ['two numbers', '3 4', '“4” is not understood here. Write m, cm, mm, in, ft.'],
    ['a number beyond a double', '1e999', 'That number is too large.'],
    ['hexadecimal', '0x10', '“x10” is not understood here. Write m, cm, mm, in, ft.'],
  ])('%s', (_, text, message) => expect(parseQuantity('length', text, 'si')).toEqual({ ok: false, message }));

  it('when it is longer than a number can be, and read at the longest', () => {
    expect(parseQuantity('length', '1'.padEnd(MAX_TYPED, '0'), 'si').ok).toBe(true);
    expect(parseQuantity('length', '1'.padEnd(MAX_TYPED + 1, '0'), 'si').ok).toBe(false);
  });

  it('whatever the text, without throwing', () => {
    fc.assert(
      fc.property(fc.string({ unit: 'grapheme' }), fc.constantFrom(...SYSTEMS), (text, system) => {
        const read = parseQuantity('length', text, system);
        if (read.ok) expect(Number.isFinite(read.value)).toBe(true);
        else expect(read.message).not.toBe('');
      }),
    );
  });
});

const kinds = Object.keys(UNITS) as Kind[];

it('reads back every unit it prints', () => {
  for (const kind of kinds)
    for (const { symbol, size } of UNITS[kind].filter((unit) => !('zero' in unit)))
      expect(parseQuantity(kind, `1 ${symbol}`, 'si')).toEqual({ ok: true, value: size });
});

it('returns what was typed after a change of units and back', () => {
  const typed = fc.integer({ min: 1, max: 9999 }).map((digits) => digits / 1000);
  fc.assert(
    fc.property(typed, fc.constantFrom(...kinds), (value, kind) => {
      const there = parseQuantity(kind, typedText(kind, value, 'us'), 'us');
      // A temperature has its zero elsewhere, so its last digit is worth a fixed step.
      const step = kind === 'temperature' ? 0.001 : value * 2e-4;
      expect(there.ok && Math.abs(there.value - value)).toBeLessThan(step);
    }),
  );
  expect(typedText('length', 11.811 * 0.0254, 'si')).toBe('0.3');
});

it('names a usual unit of its own kind for each kind and system', () => {
  for (const kind of kinds) for (const system of SYSTEMS) expect(unitOf(kind, TYPED_UNITS[kind][system])).toBeDefined();
  expect(() => unitOf('length', 'furlong')).toThrow(RangeError);
});
