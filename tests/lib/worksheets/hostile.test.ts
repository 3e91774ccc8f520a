import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { EXAMPLES } from '@/lib/worksheets/examples';
import { WORKSHEETS } from '@/lib/worksheets/list';
import { libraryFacts } from './library-facts';

const asked = WORKSHEETS.filter(({ name }) => EXAMPLES[name]);
type Tree = Record<string, unknown>;

/** Every path to a number in a question. */
function numbersIn(value: unknown, path: string[] = []): string[][] {
  if (typeof value === 'number') return [path];
  return value && typeof value === 'object'
    ? Object.entries(value).flatMap(([key, inner]) => numbersIn(inner, [...path, key]))
    : [];
}
function changed(question: object, path: string[], value: unknown): object {
  const copy = structuredClone(question) as Tree;
  let at = copy;
  for (const key of path.slice(0, -1)) at = at[key] as Tree;
  at[path.at(-1)!] = value;
  return copy;
}
const finite = (value: unknown): boolean =>
  typeof value === 'number'
    ? Number.isFinite(value)
    : value && typeof value === 'object'
      ? Object.values(value).every(finite)
      : true;

describe.each(asked)('$name', ({ name, run, answer }) => {
  const example = EXAMPLES[name]!;

  it('answers its example as its schema says', () => {
    const answered = run(example, libraryFacts);
    expect(answered.ok && answer.safeParse(answered.value).error).toBeUndefined();
    expect(answered.ok).toBe(true);
  });

  it('gives the working of its result, with a source to every line', () => {
    const answered = run(example, libraryFacts);
    const { steps } = (answered as { value: { steps: { label: string; source: string; equation: string }[] } }).value;
    expect(steps.length).toBeGreaterThan(1);
    for (const { label, source, equation } of steps)
      expect(
        [label, source, equation].every((text) => text.length > 2),
        label,
      ).toBe(true);
  });

  it('answers any finite number in any place, or says which field is wrong: never no number, never a throw', () => {
    fc.assert(
      fc.property(
        fc.constantFrom(...numbersIn(example)),
        fc.oneof(
          fc.double({ noNaN: true, noDefaultInfinity: true }),
          fc.double({ min: 0, max: 5, noNaN: true }),
          fc.integer({ min: -5, max: 400 }),
        ),
        (path, value) => {
          const answered = run(changed(example, path, value), libraryFacts);
          if (answered.ok) expect(finite(answered.value)).toBe(true);
          else {
            expect([400, 422]).toContain(answered.status);
            expect(answered.errors?.[0]?.path).toEqual(expect.any(String));
          }
        },
      ),
      { numRuns: 300 },
    );
  });

  it.each([
    ['no object', 7, 400],
    ['nothing', {}, 422],
    ['an unknown field', { ...example, colour: 'red' }, 400],
    ['a number as text', changed(example, numbersIn(example)[0]!, '1'), 400],
    ['a negative number', changed(example, numbersIn(example).at(-1)!, -1e9), 422],
    ['a circumstance nobody knows', { ...example, circumstances: ['sunshine'] }, 422],
  ])('refuses %s', (_, body, status) => expect(run(body, libraryFacts)).toMatchObject({ ok: false, status }));

  it('leads with the caution that is ticked, the worst first', () => {
    const answered = run({ ...example, circumstances: ['combustible', 'carbon-monoxide'] }, libraryFacts);
    const { warnings } = (answered as { value: { warnings: { code: string }[] } }).value;
    const codes = warnings.map(({ code }) => code);
    expect(codes[0]).toBe('carbon-monoxide');
    expect(codes.indexOf('combustible')).toBeLessThan(3);
  });

  it('never calls anything safe', () => {
    const answered = run(example, libraryFacts);
    expect(JSON.stringify(answered)).not.toMatch(/\bsafe(ly)?\b/i);
  });
});
