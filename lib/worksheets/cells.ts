import { inUnit, TYPED_UNITS, unitOf, type Kind, type System } from '@/lib/units/kinds';

/** A number for a spreadsheet: five figures, in one unit for the whole column. */
export const cell = (kind: Kind, value: number, system: System) =>
  Number(inUnit(value, unitOf(kind, TYPED_UNITS[kind][system])).toPrecision(5));
