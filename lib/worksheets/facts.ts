/** A limit in force of a substance, as a worksheet needs it. */
export type LimitFact = {
  authority: string;
  basis: string;
  value: number;
  unit: string;
  source: string;
  provenance: string;
};

/** What a worksheet may ask of the library. Densities in g/cm3; `share` of a part, 0 to 1, the most that is stated. */
export type MaterialFact = {
  title: string;
  formula?: string;
  parts: { name: string; formula?: string; share?: number }[];
  concern: string[];
  density?: { min: number; max: number };
};
export type SubstanceFact = { title: string; formula?: string; molarMass?: number; limits: LimitFact[] };

/** The library by slug, handed in at the edge: a worksheet itself reads nothing. */
export type LibraryFacts = {
  material: (slug: string) => MaterialFact | undefined;
  substance: (slug: string) => SubstanceFact | undefined;
};

/** A library that holds nothing, for worksheets that ask nothing of one. */
export const NO_FACTS: LibraryFacts = { material: () => undefined, substance: () => undefined };
