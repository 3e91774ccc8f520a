import type { Warning } from './worksheet';

/** Molar mass of air, g/mol. Source: US Standard Atmosphere, 1976 (28.9644). */
const AIR = 28.96;

/** What every sum of a room as one even body of air leaves out. */
export const EVEN_AIR: Warning = {
  code: 'even-mixing',
  text: 'Reckoned as if the whole room held one even air. Corners, pits, the far side of a shelf and whatever the air passes by stay worse and clear later, and nothing here tells by how much.',
};

export const MIXING_CONVENTION: Warning = {
  code: 'mixing-convention',
  text: 'Here the mixing factor is 1 for perfect mixing and 10 for very poor, and multiplies the air or the time. Some tables give a share of at most 1 instead, by which air changes are multiplied: never carry a number from one to the other.',
};

export const LIMIT_IS_NO_LINE: Warning = {
  code: 'limit-is-no-line',
  text: 'A limit is set for healthy adult workers over a shift. It is no line between harm and none, and no measure for children, homes or the whole day.',
};

/** Where a vapour lies, by its molar mass in g/mol if that is known. */
export const heavyVapour = (molarMass?: number): Warning[] =>
  molarMass !== undefined && molarMass <= AIR
    ? []
    : [
        {
          code: 'heavy-vapour',
          text: 'Most solvent vapours are heavier than air: undisturbed they creep along the floor and lie in pits, drains and low cupboards, where an average of the room says nothing.',
        },
      ];
