/** The words an entry may use: every list here is closed, and the schema refuses anything else. */

export const KINDS = ['material', 'process', 'substance', 'guide'] as const;
export type Kind = (typeof KINDS)[number];

/** Folder under content/ and first part of the address, by kind. */
export const FOLDERS: Record<Kind, string> = {
  material: 'materials',
  process: 'processes',
  substance: 'substances',
  guide: 'guides',
};

/** From loosest to tightest; `unknown` is not a control but the absence of an answer. */
export const CONTROLS = ['general ventilation', 'local exhaust', 'enclosed exhaust', 'prohibited'] as const;
export type Control = (typeof CONTROLS)[number];
export type ControlAnswer = Control | 'unknown';

/** How a value or claim is known. */
export const PROVENANCES = ['published', 'common practice', 'from memory'] as const;
export type Provenance = (typeof PROVENANCES)[number];

/** How a released substance is known for a pair. */
export const BASES = ['measured in a study', 'official guidance', 'inferred from composition'] as const;
export const FORMS = ['gas', 'vapour', 'particle'] as const;
export const HOODS = [
  'plain-opening',
  'flanged-opening',
  'bench-opening',
  'plain-slot',
  'flanged-slot',
  'enclosure',
  'canopy',
] as const;
export type Hood = (typeof HOODS)[number];

export const AUTHORITIES = ['OSHA', 'NIOSH', 'HSE', 'EU', 'ACGIH', 'OEHHA', 'WHO', 'EPA'] as const;
export const LIMIT_BASES = ['TWA', 'STEL', 'ceiling', 'IDLH'] as const;
export const LIMIT_UNITS = ['ppm', 'mg/m3', 'fibres/cm3'] as const;

export const FAMILIES = [
  'plastic',
  'foam',
  'rubber',
  'wood',
  'paper',
  'leather',
  'textile',
  'composite',
  'metal',
  'solder and flux',
  'resin',
  'adhesive',
  'coating',
  'mineral',
] as const;

/** What a process does to the material: the ground for inference from composition. */
export const HEATS = ['decomposes', 'melts', 'warms', 'abrades', 'cold', 'dissolves'] as const;
