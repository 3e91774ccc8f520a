import { ATOMIC_WEIGHTS } from '@/lib/chemistry/elements';
import { parseFormula } from '@/lib/chemistry/formula';
import { massFractionOf, molarMassOf } from '@/lib/chemistry/molar-mass';
import { ISOCYANATE_RULE, UNIT_RULES, URETHANES } from '@/lib/chemistry/release-rules';
import { done, refuse, type Outcome } from '@/lib/outcome';
import type { LibraryFacts, MaterialFact } from '@/lib/worksheets/facts';
import type { ReleaseQuestion } from './schema';

/** Nitrogen of a urethane at most, as a share of its mass. From memory: 4 to 7 % by the formulation. */
export const URETHANE_NITROGEN = 0.07;

/** What is heated, as far as it is known. `known` says where its element shares are from; `density` in kg/m3. */
export type Stuff = {
  slug?: string;
  title: string;
  formula?: string;
  elements: { symbol: string; massFraction: number }[];
  unbounded: string[];
  density?: number;
  known: string;
};

const no = (path: string, message: string) =>
  refuse(422, 'Impossible', 'The release cannot be bounded as it stands.', [{ path, message }]);

function ofFormula(text: string, path: string): Outcome<Stuff['elements']> {
  const atoms = parseFormula(text);
  if (!atoms.ok) return no(path, atoms.detail);
  return done([...atoms.value.keys()].map((symbol) => ({ symbol, massFraction: massFractionOf(atoms.value, symbol) })));
}

/** The most of each element that the stated shares of the parts can hold. */
function ofParts({ parts }: MaterialFact): Stuff['elements'] {
  const most = new Map<string, number>();
  for (const { formula, share } of parts) {
    const atoms = formula && share !== undefined ? parseFormula(formula) : undefined;
    if (atoms?.ok)
      for (const [symbol, count] of atoms.value)
        most.set(
          symbol,
          (most.get(symbol) ?? 0) + (share! * count * ATOMIC_WEIGHTS[symbol]!) / molarMassOf(atoms.value),
        );
  }
  return [...most].map(([symbol, massFraction]) => ({ symbol, massFraction: Math.min(1, massFraction) }));
}

function ofMaterial(slug: string, fact: MaterialFact): Outcome<Stuff> {
  const density = fact.density && fact.density.max * 1000;
  const common = { slug, title: fact.title, density };
  if (URETHANES.includes(slug) && !fact.formula)
    return done({
      ...common,
      elements: [{ symbol: ISOCYANATE_RULE.element, massFraction: URETHANE_NITROGEN }],
      unbounded: fact.concern.filter((symbol) => symbol !== 'N'),
      known: 'Nitrogen of a urethane, 4 to 7 %: from memory',
    });
  const read = fact.formula ? ofFormula(fact.formula, 'material') : done(ofParts(fact));
  if (!read.ok) return read;
  const unbounded = fact.concern.filter((symbol) => !read.value.some((each) => each.symbol === symbol));
  if (read.value.length === 0 && !UNIT_RULES[slug])
    return no(
      'material',
      `${fact.title}: the library holds no formula and no shares to bound it by. Give a formula. Until it is known, take it that it gives off the worst.`,
    );
  const known = fact.formula
    ? 'Formula of the repeat unit, IUPAC 2021 weights'
    : 'Shares of its parts in the library, the highest of each';
  return done({ ...common, formula: fact.formula, elements: read.value, unbounded, known });
}

/** What the question heats, from the library or from its formula; refuses (422) what neither knows. */
export function stuffOf({ material, formula }: ReleaseQuestion, facts: LibraryFacts): Outcome<Stuff> {
  if (material !== undefined) {
    const fact = facts.material(material);
    return fact
      ? ofMaterial(material, fact)
      : no('material', 'is not in the library. What nobody can name is not run.');
  }
  const read = ofFormula(formula ?? '', 'formula');
  if (!read.ok) return read;
  return done({
    title: formula ?? '',
    formula,
    elements: read.value,
    unbounded: [],
    known: 'Formula as given, IUPAC 2021 weights',
  });
}
