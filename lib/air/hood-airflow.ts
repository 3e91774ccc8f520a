import type { CubicMetresPerSecond, Metres, MetresPerSecond, SquareMetres } from '@/lib/units/quantity';
import { benchOpeningAirflow, benchOpeningVelocity } from './bench-opening';
import { canopyAirflow, canopyVelocity } from './canopy';
import { enclosureAirflow, faceVelocity } from './enclosure';
import { areaOf, type Face } from './face';
import { flangedOpeningAirflow, flangedOpeningVelocity } from './flanged-opening';
import { flangedSlotAirflow, flangedSlotVelocity } from './flanged-slot';
import { plainOpeningAirflow, plainOpeningVelocity } from './plain-opening';
import { plainSlotAirflow, plainSlotVelocity } from './plain-slot';

export const OPENINGS = ['plain-opening', 'flanged-opening', 'bench-opening'] as const;
export const SLOTS = ['plain-slot', 'flanged-slot'] as const;
export const HOODS = [...OPENINGS, ...SLOTS, 'enclosure', 'canopy'] as const;
export type HoodName = (typeof HOODS)[number];

/** A hood and its sizes in m and m2. A slot's `width` is its length. */
export type Hood =
  | { hood: (typeof OPENINGS)[number]; face: Face }
  | { hood: (typeof SLOTS)[number]; face: { width: Metres; height: Metres } }
  | { hood: 'enclosure'; openArea: SquareMetres }
  | { hood: 'canopy'; perimeter: Metres };

const OPENING = {
  'plain-opening': { airflow: plainOpeningAirflow, velocity: plainOpeningVelocity },
  'flanged-opening': { airflow: flangedOpeningAirflow, velocity: flangedOpeningVelocity },
  'bench-opening': { airflow: benchOpeningAirflow, velocity: benchOpeningVelocity },
};
const SLOT = {
  'plain-slot': { airflow: plainSlotAirflow, velocity: plainSlotVelocity },
  'flanged-slot': { airflow: flangedSlotAirflow, velocity: flangedSlotVelocity },
};

/** True for both slots: they are reckoned from their length and not from an area. */
export const isSlot = (hood: Hood): hood is Extract<Hood, { hood: (typeof SLOTS)[number] }> => hood.hood in SLOT;

/**
 * The airflow in m3/s that gives `velocity` (m/s) at `distance` (m) from a hood. An enclosure holds at its openings, whatever the
 * distance within. Each equation and its source stand in the file of the hood.
 * @throws RangeError for a negative or endless amount, or an opening without a size
 */
export function airflowOf(hood: Hood, velocity: MetresPerSecond, distance: Metres): CubicMetresPerSecond {
  if (hood.hood === 'enclosure') return enclosureAirflow(velocity, hood.openArea);
  if (hood.hood === 'canopy') return canopyAirflow(velocity, distance, hood.perimeter);
  if (isSlot(hood)) return SLOT[hood.hood].airflow(velocity, distance, hood.face.width);
  return OPENING[hood.hood].airflow(velocity, distance, areaOf(hood.face));
}

/**
 * The velocity in m/s that `airflow` (m3/s) gives at `distance` (m): airflowOf turned round.
 * @throws RangeError as airflowOf, and for a slot or canopy at no distance
 */
export function velocityAt(hood: Hood, airflow: CubicMetresPerSecond, distance: Metres): MetresPerSecond {
  if (hood.hood === 'enclosure') return faceVelocity(airflow, hood.openArea);
  if (hood.hood === 'canopy') return canopyVelocity(airflow, distance, hood.perimeter);
  if (isSlot(hood)) return SLOT[hood.hood].velocity(airflow, distance, hood.face.width);
  return OPENING[hood.hood].velocity(airflow, distance, areaOf(hood.face));
}

/**
 * The area in m2 the air enters through: the opening, the slot, all openings of an enclosure; for a canopy the open sides between it
 * and the work, P × D, since its own size is not asked.
 */
export function faceAreaOf(hood: Hood, distance: Metres): SquareMetres {
  if (hood.hood === 'enclosure') return hood.openArea;
  if (hood.hood === 'canopy') return (hood.perimeter * distance) as SquareMetres;
  return areaOf(hood.face);
}
