/** The duct section: a square of half-side `HALF` with rounded corners, drawn about the middle of a 32 × 32 field. */
const MIDDLE = 16;
const HALF = 12;
const CORNER = 7;
const DIAGONAL = Math.SQRT2;

/** Half the length of the chord that crosses the section at 45°, `offset` away from its middle; 0 outside. */
export function halfChord(offset: number, half = HALF, corner = CORNER): number {
  const v = Math.abs(offset);
  const inner = DIAGONAL * (half - corner);
  if (v <= corner / DIAGONAL) return inner + Math.sqrt(corner ** 2 - v ** 2);
  if (v <= inner + corner / DIAGONAL) return DIAGONAL * half - v;
  return Math.sqrt(Math.max(0, corner ** 2 - (v - inner) ** 2));
}

const point = (u: number, v: number) =>
  `${(MIDDLE + (u + v) / DIAGONAL).toFixed(2)} ${(MIDDLE + (v - u) / DIAGONAL).toFixed(2)}`;

const offsets = (step: number, reach: number) =>
  Array.from({ length: 2 * Math.floor(reach / step) + 1 }, (_, i) => (i - Math.floor(reach / step)) * step);

/** Rising diagonals `step` apart. Real lines, not a pattern: a pattern needs an id, and a repeated id can show another glyph's fill. */
export const hatch = (step: number) =>
  offsets(step, 14)
    .filter((v) => halfChord(v) > 0)
    .map((v) => `M${point(-halfChord(v), v)}L${point(halfChord(v), v)}`)
    .join('');

/** Rising and falling diagonals; the falling ones are the rising ones mirrored. */
export const crossHatch = (step: number) =>
  hatch(step) +
  offsets(step, 14)
    .filter((u) => halfChord(u) > 0)
    .map((u) => `M${point(u, -halfChord(u))}L${point(u, halfChord(u))}`)
    .join('');

/** Dots on a wide grid, as strokes of no length with round ends. */
export const dots = [-6.5, 0, 6.5].flatMap((y) => [-6.5, 0, 6.5].map((x) => `M${MIDDLE + x} ${MIDDLE + y}h0`)).join('');

/** The section with a bar left out of its middle. */
export const cutOut =
  'M11 4H21A7 7 0 0 1 28 11V21A7 7 0 0 1 21 28H11A7 7 0 0 1 4 21V11A7 7 0 0 1 11 4ZM8.5 13.4H23.5V18.6H8.5Z';
