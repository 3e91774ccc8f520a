import type { HoodName } from '@/lib/air/hood-airflow';
import { TYPED_UNITS, type Kind, type System } from '@/lib/units/kinds';

/** The numbers the worksheet may ask for, in the order it asks. */
export const NUMBERS = ['velocity', 'distance', 'diameter', 'width', 'height', 'openArea', 'perimeter'] as const;
export type NumberField = (typeof NUMBERS)[number];

/** What may be true of the work and changes what must be said before any number. */
export const WORK = ['unidentified', 'sprayed-isocyanates', 'combustible', 'hot', 'welding'] as const;
export type Work = (typeof WORK)[number];

const OPENING: readonly NumberField[] = ['velocity', 'distance', 'diameter', 'width', 'height'];
const SLOT: readonly NumberField[] = ['velocity', 'distance', 'width', 'height'];

/** The numbers each hood is reckoned from. An opening has a diameter, or a width and a height. */
export const FIELDS_OF: Record<HoodName, readonly NumberField[]> = {
  'plain-opening': OPENING,
  'flanged-opening': OPENING,
  'bench-opening': OPENING,
  'plain-slot': SLOT,
  'flanged-slot': SLOT,
  enclosure: ['velocity', 'openArea'],
  canopy: ['velocity', 'distance', 'perimeter'],
};

const KINDS: Record<NumberField, Kind> = {
  ...{ velocity: 'velocity', distance: 'length', diameter: 'length', width: 'length', height: 'length' },
  ...{ openArea: 'area', perimeter: 'length' },
};

/** What kind of quantity a field is and the unit a bare number in it has. The rim of a tank is measured in feet, a hood in inches. */
export const kindOf = (field: NumberField): Kind => KINDS[field];
export const typedUnitOf = (field: NumberField, system: System): string =>
  field === 'perimeter' && system === 'us' ? 'ft' : TYPED_UNITS[KINDS[field]][system];
