import type { HoodName } from '@/lib/air/hood-airflow';
import { fromFpm } from '@/lib/units/convert';
import type { NumberField, Work } from './fields';

/** What a reader calls each hood, and how to know it. */
export const HOOD_WORDS: Record<HoodName, { name: string; tell: string }> = {
  'plain-opening': { name: 'Plain opening', tell: 'a duct or hose end with nothing around it' },
  'flanged-opening': { name: 'Flanged opening', tell: 'a duct end with a flat rim all round' },
  'bench-opening': { name: 'Opening on a bench', tell: 'a duct end that lies on the bench or floor' },
  'plain-slot': { name: 'Plain slot', tell: 'long and narrow, without a rim' },
  'flanged-slot': { name: 'Flanged slot', tell: 'long and narrow, in a flat wall or rim' },
  enclosure: { name: 'Enclosure or booth', tell: 'the work is inside, air enters by the gaps' },
  canopy: { name: 'Canopy', tell: 'hangs above the work, open all round' },
};

const FIELD_WORDS: Record<NumberField, string> = {
  velocity: 'Velocity wanted',
  distance: 'Distance from the hood to the source',
  diameter: 'Diameter, if it is round',
  width: 'Width, or the length of a slot',
  height: 'Height',
  openArea: 'Open area, all gaps together',
  perimeter: 'Perimeter of the work',
};

const FIELD_HINTS: Partial<Record<NumberField, string>> = {
  velocity: 'At the source; through the gaps of an enclosure; between canopy and work.',
  distance: 'A canopy: its height above the work.',
  openArea: 'Doors, cable holes, air inlets.',
  perimeter: 'Once round the tank or bench below.',
};

/** What each number is called beside its input, and what more there is to say of it. */
export const fieldWords = (field: NumberField) => FIELD_WORDS[field];
export const fieldHint = (field: NumberField) => FIELD_HINTS[field];

export const WORK_WORDS: Record<Work, string> = {
  unidentified: 'The material is not identified',
  'sprayed-isocyanates': 'Two-pack paint or foam is sprayed (isocyanates)',
  combustible: 'The dust or vapour can burn',
  hot: 'The work is hot',
  welding: 'It is welding',
};

/**
 * Capture velocities in use, in m/s, by how the air is released. Source: Heating and Ventilating 42(5), 1945, as reprinted in national
 * air-pollution guidance, Annex 2; 100, 200, 500 and 2000 fpm.
 */
export const CAPTURE_CLASSES = [
  { release: 'without speed, into quiet air: tanks, degreasing', min: fromFpm(100), max: fromFpm(100) },
  { release: 'slowly, into air that hardly moves: booths, filling, welding', min: fromFpm(100), max: fromFpm(200) },
  { release: 'with speed, into moving air: spraying, crushing', min: fromFpm(200), max: fromFpm(500) },
  { release: 'at high speed: grinding, blasting', min: fromFpm(500), max: fromFpm(2000) },
] as const;
