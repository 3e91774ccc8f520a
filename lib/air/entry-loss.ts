const ACGIH = 'ACGIH Industrial Ventilation, 24th ed. (2001), Fig. 3-16, seen reprinted';

/** A hood's entry as the loss sees it. `factor` is F, the loss over the velocity pressure in the duct behind. */
export type Entry = { code: string; name: string; factor: number; source: string };

const round = (angle: number, factor: number): Entry => ({
  code: `tapered-${angle}`,
  name: `tapered hood, round or square, ${angle}° between its sides`,
  factor,
  source: `${ACGIH}; that the angle is the one between the sides is our reading`,
});

/** Entry loss factors by kind of hood. A tapered one has a face of at least twice the area of its duct. */
export const ENTRIES: readonly Entry[] = [
  { code: 'plain-end', name: 'plain end of a duct', factor: 0.93, source: ACGIH },
  { code: 'flanged-end', name: 'end of a duct with a flange', factor: 0.49, source: ACGIH },
  { code: 'bellmouth', name: 'bellmouth', factor: 0.04, source: ACGIH },
  { code: 'grinder-straight', name: 'grinding hood, straight take-off', factor: 0.65, source: ACGIH },
  { code: 'grinder-tapered', name: 'grinding hood, tapered take-off', factor: 0.4, source: ACGIH },
  { code: 'sharp-orifice', name: 'sharp-edged hole', factor: 1.78, source: ACGIH },
  ...(
    [20, 0.11, 40, 0.06, 60, 0.08, 80, 0.12, 90, 0.15, 100, 0.18, 120, 0.25, 140, 0.34, 160, 0.44, 180, 0.56] as const
  )
    .map((value, i, all) => (i % 2 === 0 ? round(value, all[i + 1]!) : undefined))
    .filter((entry) => entry !== undefined),
];

/** The entry of that code, if there is one. */
export const entryOf = (code: string) => ENTRIES.find((each) => each.code === code);
