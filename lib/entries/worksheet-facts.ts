import type { LibraryFacts, MaterialFact, SubstanceFact } from '@/lib/worksheets/facts';
import type { Library } from './library';
import type { Material, Substance } from './schema';

/** The most that a stated share says, 0 to 1: “15 to 35 %” is 0.35; undefined where it holds no percentage. */
export function shareAtMost(text?: string): number | undefined {
  if (!text || !/%/.test(text)) return undefined;
  const numbers = [...text.matchAll(/\d+(?:\.\d+)?/g)].map(([number]) => Number(number) / 100);
  return numbers.length > 0 ? Math.min(1, Math.max(...numbers)) : undefined;
}

function materialFact(title: string, { composition, density }: Material): MaterialFact {
  const parts = (composition.parts ?? []).map(({ name, formula, share }) => ({
    name,
    formula,
    share: shareAtMost(share),
  }));
  const [min, max] = density ? [density.min ?? density.value, density.max ?? density.value] : [];
  return {
    ...{ title, formula: composition.formula, parts, concern: composition.concern },
    ...(min !== undefined && max !== undefined ? { density: { min, max } } : {}),
  };
}

const substanceFact = (title: string, { formula, molarMass, limits }: Substance): SubstanceFact => ({
  ...{ title, formula, molarMass },
  limits: limits
    .filter(({ supersededBy }) => supersededBy === undefined)
    .map(({ authority, basis, value, unit, source, provenance }) => ({
      ...{ authority, basis, value, unit, source, provenance },
    })),
});

/** What the library tells a worksheet: compositions, and the limits in force. */
export const factsOf = ({ byKey }: Library): LibraryFacts => ({
  material: (slug) => {
    const entry = byKey.get(`material:${slug}`);
    return entry && materialFact(entry.title, entry.frontMatter as Material);
  },
  substance: (slug) => {
    const entry = byKey.get(`substance:${slug}`);
    return entry && substanceFact(entry.title, entry.frontMatter as Substance);
  },
});
