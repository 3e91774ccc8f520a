/**
 * What an element, or a whole repeat unit, can at most become when it is heated: `per` atoms of the element make one molecule of
 * `formula`. The share is never more than all of it; real yields are lower and are not guessed here.
 */
export type ReleaseRule = {
  element: string;
  substance: string;
  name: string;
  formula: string;
  per: number;
  source: string;
};

const BOUND = 'Stoichiometry with IUPAC 2021 atomic weights: all of the element';
const rule = (element: string, substance: string, name: string, formula: string, note = ''): ReleaseRule => ({
  ...{ element, substance, name, formula, per: 1 },
  source: `${BOUND} as ${name.toLowerCase()}${note}`,
});

/** One rule an element, the worst of its common products by mass. */
export const ELEMENT_RULES: readonly ReleaseRule[] = [
  rule('Cl', 'hydrogen-chloride', 'Hydrogen chloride', 'HCl'),
  rule('F', 'hydrogen-fluoride', 'Hydrogen fluoride', 'HF', '; the hydrogen comes from the air’s water'),
  rule('Br', 'hydrogen-bromide', 'Hydrogen bromide', 'HBr'),
  rule('N', 'hydrogen-cyanide', 'Hydrogen cyanide', 'HCN', '; fires give a few per cent of it to some tens'),
  rule('S', 'sulphur-dioxide', 'Sulphur dioxide', 'SO2'),
];

/** Repeat units that come apart into what they were made from: all of the mass, by rule. */
export type UnitRule = { formula: string; of: string; substance: string; name: string; source: string };
const unzips = (of: string, formula: string, substance: string, name: string): UnitRule => ({
  ...{ formula, of, substance, name },
  source: `Complete unzipping of ${of} back to its monomer: an upper bound`,
});

/** By the slug of the material: a formula alone does not tell isomers apart. */
export const UNIT_RULES: Readonly<Record<string, UnitRule>> = {
  acetal: unzips('acetal', 'CH2O', 'formaldehyde', 'Formaldehyde'),
  acrylic: unzips('acrylic', 'C5H8O2', 'methyl-methacrylate', 'Methyl methacrylate'),
  'acrylic-extruded': unzips('acrylic', 'C5H8O2', 'methyl-methacrylate', 'Methyl methacrylate'),
  polystyrene: unzips('polystyrene', 'C8H8', 'styrene', 'Styrene'),
  hips: unzips('polystyrene', 'C8H8', 'styrene', 'Styrene'),
  eps: unzips('polystyrene', 'C8H8', 'styrene', 'Styrene'),
  xps: unzips('polystyrene', 'C8H8', 'styrene', 'Styrene'),
};

/**
 * Free or re-formed diisocyanate from a urethane, at most: two urethane nitrogens make one molecule. By rule F05 of the composition
 * rules, urethanes come apart well below burning.
 */
export const ISOCYANATE_RULE: ReleaseRule = {
  ...{ element: 'N', substance: 'isocyanates', name: 'Isocyanates, as MDI', formula: 'C15H10N2O2', per: 2 },
  source: `${BOUND} as MDI: an upper bound`,
};
export const URETHANES: readonly string[] = [
  'polyurethane-foam',
  'polyurethane-resin',
  'tpu',
  'polyisocyanurate-foam',
  'two-pack-clear-coat',
];
