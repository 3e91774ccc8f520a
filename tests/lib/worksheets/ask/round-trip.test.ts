import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { asks } from '@/components/worksheets/asked/live-results';
import { fieldAt, fieldsOf, type Ask } from '@/lib/worksheets/ask/fields';
import { requestFrom, typedOf } from '@/lib/worksheets/ask/request';
import { paramsOf, typedFrom } from '@/lib/worksheets/ask/typed';
import { EXAMPLES } from '@/lib/worksheets/examples';

/** Any question a form can hold: some of the fields that an example fills in, some emptied, any texts in them. */
const anyTyped = (ask: Ask, name: string) => {
  const paths = [...typedOf(ask, EXAMPLES[name]!).texts.keys()];
  const text = fc.oneof(fc.double({ noNaN: true }).map(String), fc.string({ minLength: 1, maxLength: 80 }));
  return fc.record({
    texts: fc.dictionary(
      fc.constantFrom(...paths),
      text.filter((each) => each.trim() !== ''),
      { minKeys: 1 },
    ),
    units: fc.constantFrom('si' as const, 'us' as const),
  });
};

describe.each(Object.entries(asks))('any question of %s', (name, ask) => {
  it('comes back from its address as it was typed', () => {
    fc.assert(
      fc.property(anyTyped(ask, name), ({ texts, units }) => {
        const once = typedFrom(ask, new URLSearchParams({ ...texts, units }));
        const again = typedFrom(ask, new URLSearchParams(paramsOf(once).toString()));
        expect([...again.texts]).toEqual([...once.texts]);
        expect(again.units).toBe(units);
        for (const [path, text] of Object.entries(texts)) expect(once.texts.get(path)).toEqual([text.trim()]);
      }),
    );
  });

  it('asks for the numbers that were typed, in whatever units it is written', () => {
    const numbers = [...typedOf(ask, EXAMPLES[name]!).texts.keys()].filter(
      (path) => fieldAt(fieldsOf(ask), path)!.field.as === 'number',
    );
    const valueAt = (request: unknown, path: string) =>
      path.split('.').reduce((at, key) => (at as Record<string, unknown>)[key], request) as number;
    fc.assert(
      fc.property(
        fc.constantFrom(...numbers),
        fc.double({ min: 1e-6, max: 1e6, noNaN: true }),
        fc.constantFrom('si' as const, 'us' as const),
        (path, value, units) => {
          const first = requestFrom(ask, typedFrom(ask, new URLSearchParams({ [path]: String(value), units })));
          const request = (first as { value: object }).value;
          const second = requestFrom(ask, typedFrom(ask, paramsOf(typedOf(ask, request, units))));
          // A number is written to five figures.
          expect(valueAt((second as { value: object }).value, path) / valueAt(request, path)).toBeCloseTo(1, 3);
        },
      ),
    );
  });
});
