import type { Metres, SquareMetres } from '@/lib/units/quantity';
import { aboveZero, finite } from './domain';

/** The shape of an opening: round, or as wide as it is long with the height across. Lengths in m. */
export type Face = { diameter: Metres } | { width: Metres; height: Metres };

/** Height over width, the shorter side over the longer: a slot has at most this (ACGIH, 24th ed., hood-type figure). */
export const SLOT_RATIO = 0.2;

/**
 * Area of an opening in m2: π D²/4, or width × height.
 * @throws RangeError for a side of zero or below
 */
export function areaOf(face: Face): SquareMetres {
  aboveZero(face);
  return finite('diameter' in face ? (Math.PI * face.diameter ** 2) / 4 : face.width * face.height) as SquareMetres;
}

/** Diameter in m of a round opening of the same area, for rules that are stated in diameters. */
export const diameterOf = (face: Face): Metres =>
  'diameter' in face ? face.diameter : (Math.sqrt((4 * areaOf(face)) / Math.PI) as Metres);

/** Shorter side over longer, 1 for a round opening. */
export const ratioOf = (face: Face): number =>
  'diameter' in face ? 1 : Math.min(face.width, face.height) / Math.max(face.width, face.height);
