import { kerfMass, molarMassOfFormula } from '@/lib/chemistry/release';
import { done, refuse, type Outcome } from '@/lib/outcome';
import { cautionsOf } from '@/lib/worksheets/circumstances';
import type { LibraryFacts } from '@/lib/worksheets/facts';
import { limitWords } from '@/lib/worksheets/limit-words';
import { GEOMETRY, n, step } from '@/lib/worksheets/steps';
import type { Answer, Step } from '@/lib/worksheets/worksheet';
import { inRoom, productsOf, type Product } from './releases';
import type { ReleaseQuestion, ReleaseResult } from './schema';
import { stuffOf, type Stuff } from './stuff';
import { releaseWarnings } from './warnings';

function lostOf({ cut, massLost }: ReleaseQuestion, { density }: Stuff): Outcome<number> {
  if (!cut) return done(massLost ?? 0);
  const used = cut.density ?? density;
  if (used === undefined)
    return refuse(422, 'Impossible', 'A cut needs a density.', [
      { path: 'cut.density', message: 'is missing: the library states none for it' },
    ]);
  return done(kerfMass(cut.length, cut.kerf, cut.thickness, used / 1000));
}

function massSteps({ cut }: ReleaseQuestion, stuff: Stuff, lost: number): Step[] {
  if (!cut) return [step('Mass lost', 'as given', lost, 'g', 'As given')];
  const density = cut.density ?? stuff.density!;
  const from = cut.density === undefined ? 'density: the highest in the library' : 'density as given';
  return [
    step(
      'Mass lost',
      `length × kerf × thickness × ρ = ${n(cut.length)} × ${n(cut.kerf)} × ${n(cut.thickness)} × ${n(density)} × 1000`,
      lost,
      'g',
      `${GEOMETRY}; ${from}`,
    ),
  ];
}

const productStep = (product: Product, lost: number): Step =>
  step(
    `${product.name}, at most`,
    `mass of the element in ${n(lost)} g × M / (atoms × Ar), M = ${n(molarMassOfFormula(product.formula))}`,
    product.mass,
    'g',
    product.source,
  );

function roomSteps({ room }: ReleaseQuestion, { releases }: ReleaseResult): Step[] {
  return releases.flatMap(({ name, massAtMost, concentrationAtMost, ofLimit, limit }) => [
    ...(concentrationAtMost
      ? [
          step(
            `${name} in the room, at most`,
            `C = 1000 m / V = 1000 × ${n(massAtMost)} / ${n(room!.volume)}`,
            concentrationAtMost.value,
            'mg/m3',
            'All at once, evenly, no air changed',
          ),
        ]
      : []),
    ...(limit
      ? [step(`${name} against its limit`, `C / limit, ${limitWords(limit)}`, ofLimit!, '', limit.source)]
      : []),
  ]);
}

/**
 * What a heated material can at most give off, by its elements, and what that comes to in a room. SI in, SI out; masses in g.
 * @param question admitted by `releaseRequest`
 * @param facts the library: compositions and limits
 * @returns the answer, or a refusal (422) for what the library does not know
 */
export function solveRelease(question: ReleaseQuestion, facts: LibraryFacts): Outcome<Answer<ReleaseResult>> {
  const stuff = stuffOf(question, facts);
  if (!stuff.ok) return stuff;
  const lost = lostOf(question, stuff.value);
  if (!lost.ok) return lost;
  const products = productsOf(stuff.value, lost.value);
  const result: ReleaseResult = {
    massLost: lost.value,
    elements: stuff.value.elements,
    releases: products.map((product) => inRoom(product, question.room, facts)),
  };
  return done({
    result,
    steps: [
      ...massSteps(question, stuff.value, lost.value),
      ...result.elements.map(({ symbol, massFraction }) =>
        step(`Share of ${symbol}`, 'count × Ar / M', massFraction, '', stuff.value.known),
      ),
      ...products.map((product) => productStep(product, lost.value)),
      ...roomSteps(question, result),
    ],
    warnings: [...cautionsOf(question.circumstances), ...releaseWarnings(stuff.value, result)],
  });
}
