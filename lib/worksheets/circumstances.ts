import type { Warning } from './worksheet';

/** What may be true of a room or of the work in it, and must be answered before any number. */
export const CIRCUMSTANCES = [
  'flued-appliance',
  'isocyanate-spray',
  'chlorinated-solvent',
  'combustible',
  'carbon-monoxide',
  'confined-space',
] as const;
export type Circumstance = (typeof CIRCUMSTANCES)[number];

/** How each is asked of the reader. */
export const CIRCUMSTANCE_WORDS: Record<Circumstance, string> = {
  'flued-appliance':
    'A boiler, water heater, stove or hearth with a flue draws its air from this room or from one open to it',
  'isocyanate-spray': 'Paint, varnish or foam with isocyanates is sprayed',
  'chlorinated-solvent':
    'A chlorinated solvent is about, with an arc, a flame, a glowing wire or an ultraviolet lamp near',
  combustible: 'Dust, vapour or gas that can burn is given off',
  'carbon-monoxide': 'A carbon monoxide alarm has sounded, or somebody has a headache, dizziness or nausea here',
  'confined-space': 'The work is in a tank, a pit, a duct or another confined space',
};

const TEXTS: Record<Circumstance, string> = {
  'carbon-monoxide':
    'An alarm or symptoms come before any sum: everybody out into fresh air, call the emergency number from there, do not go back in, and have the appliances and the flue looked at by a licensed person before anything is lit again.',
  'confined-space':
    'A confined space is not reckoned here: people die in them by the minute. It needs a permit, a gas test, a watcher outside and trained people, and this answer is not for it.',
  'flued-appliance':
    'A fan that takes air from a room with a flue can turn the flue: combustion gas with carbon monoxide then comes into the room. Work out the room with every fan on, fit a carbon monoxide alarm, and have a licensed person test the draught in the worst case before relying on any result.',
  'isocyanate-spray':
    'Sprayed isocyanates are not controlled by a sum of air: they need a booth, trained people, supplied air and health checks, and nobody enters unprotected until a smoke test has shown that the booth has cleared. Do not spray them in a shared room.',
  'chlorinated-solvent':
    'Chlorinated vapour that meets an arc, a flame, a glowing surface or strong ultraviolet light can form phosgene and hydrogen chloride. Keep them in different rooms and times: no airflow makes the two together acceptable.',
  combustible:
    'Dust or vapour that can burn sets other rules than these sums: the share of the lower explosive limit, a fan and motor that cannot ignite it, earthing, cleaning. A fire code and a competent person decide.',
};

/** The worst first. */
const ORDER: readonly Circumstance[] = [
  'carbon-monoxide',
  'confined-space',
  'isocyanate-spray',
  'chlorinated-solvent',
  'flued-appliance',
  'combustible',
];

/** The cautions that must come before the numbers, the worst first; none for none. */
export const cautionsOf = (given: readonly Circumstance[] = []): Warning[] =>
  ORDER.filter((each) => given.includes(each)).map((code) => ({ code, text: TEXTS[code] }));
