import type { Metres } from '@/lib/units/quantity';

export const DUCTS = [
  'galvanised-steel',
  'smooth-plastic',
  'semi-rigid-aluminium',
  'flexible-stretched',
  'flexible-slack',
] as const;
export type DuctKind = (typeof DUCTS)[number];

const ASHRAE = 'ASHRAE Fundamentals (2021), ch. 21, Table 1';

/**
 * What a duct is like inside. `roughness` in m, the value for design; `slack` is how far it is pushed together (1 is all of it) where
 * nothing is said.
 */
export type Duct = { name: string; roughness: Metres; flexible: boolean; slack: number; source: string };

export const DUCT_KINDS: Record<DuctKind, Duct> = {
  'galvanised-steel': {
    ...{ name: 'galvanised steel, round', roughness: 0.000_09 as Metres, flexible: false, slack: 0 },
    source: `${ASHRAE}: 0.09 mm for design, 0.049 to 0.098 measured`,
  },
  'smooth-plastic': {
    ...{ name: 'smooth plastic pipe', roughness: 0.000_046 as Metres, flexible: false, slack: 0 },
    source: `${ASHRAE}: 0.046 mm for design, 0.009 to 0.046 measured`,
  },
  'semi-rigid-aluminium': {
    ...{ name: 'semi-rigid aluminium, corrugated', roughness: 0.0021 as Metres, flexible: false, slack: 0 },
    source: `${ASHRAE}: 1.2 to 2.1 mm, the rougher end taken`,
  },
  'flexible-stretched': {
    ...{ name: 'flexible hose on a wire, fully stretched', roughness: 0.0009 as Metres, flexible: true, slack: 0 },
    source: `${ASHRAE}: 0.9 mm for design, 0.09 to 0.9 measured, fully extended`,
  },
  'flexible-slack': {
    ...{ name: 'flexible hose on a wire, slack', roughness: 0.0009 as Metres, flexible: true, slack: 0.15 },
    source: `${ASHRAE}: 0.9 mm for design; 15 % slack where nothing is said is common practice, no source`,
  },
};
